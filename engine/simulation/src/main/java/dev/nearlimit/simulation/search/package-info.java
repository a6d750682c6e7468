/**
 * The search for the Eb/N0 at which a scheme's frame error rate meets a target: bracket with few frames, then refine.
 * It asks a meter for counts and knows neither code nor channel. Every decision depends on counts alone, never on time,
 * so that a search gives the same answer on any machine.
 */
package dev.nearlimit.simulation.search;
