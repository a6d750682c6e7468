/**
 * Random streams that belong to a frame and not to a thread: counter-based starting states and the generator that runs
 * from them, 64 frames side by side. Distributions other than uniform bits are made elsewhere.
 */
package dev.nearlimit.numerics.random;
