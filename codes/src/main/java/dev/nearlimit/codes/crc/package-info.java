/**
 * Cyclic redundancy checks over batches of 64 frames: what a check is, the polynomials of a standard, and how checks are
 * computed, appended and verified 64 frames at a time. Checks detect errors and correct none; concatenating one with a
 * code is the business of families, and what a failed check means is that of decoders.
 */
package dev.nearlimit.codes.crc;
