/**
 * {@code simulate}: one scheme, or a sweep over settings of its decoder, quantiser and channel, measured point by point.
 * What was measured shows itself in every format, each rate beside its interval. Counting and statistics are the
 * simulation room's; here it is decided what runs, in which order, and how it reads.
 */
package dev.nearlimit.cli.simulate;
