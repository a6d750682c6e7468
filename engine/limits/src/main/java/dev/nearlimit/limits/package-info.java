/**
 * What physics and information theory allow: constellations, capacities of channels, limits at a rate, limits at a
 * finite length, and the error rates of uncoded transmission. Every limit is taken per real dimension in use. No code
 * is known here.
 */
package dev.nearlimit.limits;
