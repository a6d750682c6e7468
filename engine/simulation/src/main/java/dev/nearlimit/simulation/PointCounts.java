package dev.nearlimit.simulation;

/**
 * What was counted at one point, up to the exact frame at which the stopping rule ended it.
 *
 * @param frames frames counted
 * @param frameErrors frames with a wrong information bit or a declared failure
 * @param bitErrors wrong information bits
 * @param bitErrorSquares sum over frames of the square of the frame's wrong information bits, for the interval on BER
 * @param undetectedErrors frames with a wrong information bit of which the decoder did not say that it failed
 * @param iterations sum over frames of the decoder's iterations
 * @param complete whether the stopping rule was met; false after an interrupt or a time limit
 */
public record PointCounts(
        long frames,
        long frameErrors,
        long bitErrors,
        long bitErrorSquares,
        long undetectedErrors,
        long iterations,
        boolean complete) {
    /** Frames of which the decoder said that it failed. */
    public long detectedErrors() {
        return frameErrors - undetectedErrors;
    }
}
