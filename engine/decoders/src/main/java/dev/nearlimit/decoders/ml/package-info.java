/**
 * Maximum-likelihood decoding by looking at every codeword: the yardstick for all others on codes small enough for it.
 * Sums of LLRs are formed in a stated order. Anything that looks at some codewords only belongs elsewhere.
 */
package dev.nearlimit.decoders.ml;
