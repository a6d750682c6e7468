package dev.nearlimit.algebra.weight;

/**
 * What an enumeration adds up; index w of both arrays is for the words of weight w.
 *
 * @param counts number of words
 * @param messageWeights number of basis words that make up those words, added up
 */
record WordTotals(long[] counts, long[] messageWeights) {}
