/**
 * The inner loops that carry the cost of making noise and of decoding, behind an interface whose implementation is chosen once. Every
 * implementation gives the same bits. Kernels check nothing and keep no state; their callers do.
 */
package dev.nearlimit.numerics.kernels;
