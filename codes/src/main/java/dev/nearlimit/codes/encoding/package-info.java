/**
 * How codewords are computed: straight-line programs of XORs over batches of 64 frames, made from a generator matrix or
 * from a sparse parity-check matrix. Which program a code runs is decided by counting words read, and never changes a
 * codeword. Nothing here knows families or standards: structure is found in the matrix itself.
 */
package dev.nearlimit.codes.encoding;
