/**
 * Exact facts about codes: how far apart their words are, how many words there are at each distance, and which error
 * rates follow from that by formula. Everything here is computed, nothing is simulated; a figure that is a bound or an
 * estimate says so. How a decoder works on received values belongs to the decoders room.
 */
package dev.nearlimit.algebra;
