/**
 * Error rates after decoding that follow from a code by formula: exactly for hard-decision decoders, as union bounds for
 * soft maximum likelihood. Every figure says whether it is exact, a bound or an estimate, and is computed as a logarithm
 * so that the far tail keeps its accuracy. Measured error rates belong to the simulation room.
 */
package dev.nearlimit.algebra.errorrate;
