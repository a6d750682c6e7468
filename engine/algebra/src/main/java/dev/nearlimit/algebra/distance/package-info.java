/**
 * What is known of a code's minimum distance: the exact value where an enumeration reaches or a theorem gives it, an
 * interval otherwise, and the classical upper bounds for orientation. Searches for words of low weight will join here.
 * Counting all words by weight belongs to the weight package.
 */
package dev.nearlimit.algebra.distance;
