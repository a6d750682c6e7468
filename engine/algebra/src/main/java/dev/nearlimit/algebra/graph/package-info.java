/**
 * Tanner graphs of parity-check matrices: degrees, short cycles, girth. They describe a matrix, not a code: another
 * matrix of the same code has another graph. Message passing along a graph belongs to the decoders room.
 */
package dev.nearlimit.algebra.graph;
