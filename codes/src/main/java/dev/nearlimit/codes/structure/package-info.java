/**
 * What is known about a code beyond its matrices, and what a decoder may ask for: the zeros of a BCH code, the shifts
 * of a quasi-cyclic one. Each structure is an immutable record. How a code came by it is the business of its family.
 */
package dev.nearlimit.codes.structure;
