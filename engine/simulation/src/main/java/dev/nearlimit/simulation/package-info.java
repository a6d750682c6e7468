/**
 * Measured facts: a scheme is sent through a channel frame by frame, and frames, errors and iterations are counted.
 * Counts are a pure function of scheme, channel, point, seed and stopping rule. What the counts mean for a requirement
 * is the shortlist's business.
 */
package dev.nearlimit.simulation;
