/**
 * Published values with their sources, one row a value, and the reader for them. Whoever checks a row brings the
 * computed value; the row says whether they agree. Vector sets and anything that computes the values stay out.
 */
package dev.nearlimit.testvectors.published;
