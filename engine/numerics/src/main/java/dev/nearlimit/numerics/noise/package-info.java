/**
 * Random numbers as channels use them, 64 frames at a time, position-major: Gaussian samples and uniform draws. What a
 * channel does with them is the simulation's business.
 */
package dev.nearlimit.numerics.noise;
