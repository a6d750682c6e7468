package dev.nearlimit.shortlist.result;

import java.util.List;

/**
 * The answer to a requirement.
 *
 * @param seed the seed of every random number behind it
 * @param operatingPoints one entry per operating point
 * @param complete false if the run was interrupted
 * @param framesSimulated codewords sent through the simulated channel
 */
public record ShortlistResult(long seed, List<OperatingPoint> operatingPoints, boolean complete, long framesSimulated) {
    public ShortlistResult {
        operatingPoints = List.copyOf(operatingPoints);
    }
}
