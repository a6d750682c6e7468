/**
 * Finished pieces of work, kept under a content hash of everything that fixes their bits, so that any long job can go
 * on where it stood. The file that keeps them, its faults and its upkeep belong here. What a piece means does not: that
 * is known to the caller alone.
 */
package dev.nearlimit.journal;
