package dev.nearlimit.simulation;

/**
 * All that was seen at one point, up to the exact frame at which the stopping rule ended it.
 *
 * @param counts the sums
 * @param iterations how many frames took how many iterations; empty for a decoder that does not iterate
 * @param bitErrors how many failed frames had how many wrong information bits, 0 where the decoder declared a failure
 *     although all were right
 * @param failures which frames failed
 */
public record PointOutcome(PointCounts counts, Histogram iterations, Histogram bitErrors, FailedFrames failures) {}
