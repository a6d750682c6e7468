/**
 * Decoders that look at nothing but the signs of the LLRs: complete decoding by coset leaders, and bounded-distance
 * decoding by table or by Berlekamp-Massey. They count operations of one frame at a time. Soft decoders, whatever they
 * start from, belong elsewhere.
 */
package dev.nearlimit.decoders.hard;
