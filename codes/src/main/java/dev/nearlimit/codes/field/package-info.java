/**
 * Finite fields of characteristic 2 and polynomials over GF(2): the arithmetic that cyclic codes and their decoders stand
 * on. Fields carry tables and are meant for degrees up to 16. What a code does with its zeros belongs to its family, not
 * here.
 */
package dev.nearlimit.codes.field;
