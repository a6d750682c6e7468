/**
 * What users type, turned into values: fractions, ranges, lists of Eb/N0, durations. Each type says exactly what it
 * accepts and refuses the rest in one line. Designators of codes, decoders and channels are read by their own rooms.
 */
package dev.nearlimit.cli.input;
