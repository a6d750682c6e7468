/**
 * Between the encoder and the decoder: information bits from a frame's payload stream, the mapping of code bits to real
 * dimensions, what the channel does, and the demapping to log-likelihood ratios. Arithmetic here is exactly rounded, in
 * a stated order. Quantising and decoding come after and live with the decoders.
 */
package dev.nearlimit.simulation.link;
