/**
 * Linear algebra over GF(2): packed dense matrices, sparse matrices and elimination. Everything is exact. Nothing here
 * knows what a code is.
 */
package dev.nearlimit.codes.gf2;
