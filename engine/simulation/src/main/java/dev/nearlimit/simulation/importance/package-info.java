/**
 * Importance sampling: the part of a low error rate that is due to given sets of positions, from noise that is biased
 * towards them and weighted back. An estimate speaks of these sets with one decoder and quantiser, and never of the
 * whole error rate. Where the sets come from is their finder's business.
 */
package dev.nearlimit.simulation.importance;
