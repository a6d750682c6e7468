/**
 * The frame batch: 64 frames handled together, bit {@code f} of word {@code i} being bit {@code i} of frame {@code f}.
 * Encoders, decoders and error counters share this layout. Soft values follow the same order but live with the
 * decoders.
 */
package dev.nearlimit.codes.batch;
