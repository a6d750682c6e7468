/**
 * Belief propagation on the Tanner graph of a parity-check matrix: sum-product and min-sum, layered and flooding, in
 * single precision and in fixed point. All 64 frames of a batch advance together; check rules are interchangeable
 * parts. Decoders that need more of a code than its parity-check matrix belong elsewhere.
 */
package dev.nearlimit.decoders.ldpc;
