/**
 * Weight enumerators: the numbers of codewords of each weight, in exact integers, by enumeration of the code or of its
 * dual and the MacWilliams identity. Enumerations that would not end are refused with their size. What follows from the
 * weights (distances, error rates) belongs to the neighbouring packages.
 */
package dev.nearlimit.algebra.weight;
