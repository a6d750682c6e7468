/**
 * Quantisers: how an LLR becomes the integer that a product's decoder sees, specified to the last operation. Each is an
 * immutable record and part of a scheme. What a decoder does with the levels is its own business.
 */
package dev.nearlimit.decoders.quantiser;
