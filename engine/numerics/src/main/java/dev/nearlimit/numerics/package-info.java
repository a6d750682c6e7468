/**
 * The arithmetic that every simulated number rests on: random streams, noise, and functions built of exactly rounded
 * operations only, so that results are the same to the last bit on every machine. Whether plain or vector code does the
 * work is chosen here and visible nowhere else. No code, decoder or channel is known here.
 */
package dev.nearlimit.numerics;
