package dev.nearlimit.simulation;

/**
 * When a point is finished: at the frame that brings the frame errors to {@code frameErrors}, or at frame
 * {@code maxFrames}, whichever comes first in frame order. There is always a limit on frames, so every rule is met in the
 * end, errors or none. A demand on the width of the interval is turned into frame errors beforehand ({@link
 * dev.nearlimit.simulation.statistics.RelativeWidth}).
 *
 * @param maxFrames frames at most, at least 1
 * @param frameErrors frame errors that suffice, at least 1
 */
public record StoppingRule(long maxFrames, long frameErrors) {
    public StoppingRule {
        if (maxFrames < 1) {
            throw new InvalidSimulationException("frames is " + maxFrames + ", must be at least 1");
        }
        if (frameErrors < 1) {
            throw new InvalidSimulationException("frame errors is " + frameErrors + ", must be at least 1");
        }
    }
}
