/**
 * Finished pieces of work, kept under a content hash of everything that fixes their bits, so that any long job can go
 * on where it stood. What a piece means is known to the caller alone.
 */
package dev.nearlimit.journal;
