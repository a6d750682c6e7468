/**
 * What a shortlist answers, as immutable records whose component names are the field names of the results file. Units
 * stand in the names; a value that does not exist is null. Nothing here computes.
 */
package dev.nearlimit.shortlist.result;
