package dev.nearlimit.cli.shortlist;

import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.OperatingPoint;
import dev.nearlimit.shortlist.result.ShortlistResult;
import dev.nearlimit.simulation.BlockOrigins;

/**
 * A requirement with its answer and what was needed for it.
 *
 * @param file the requirement file as the user named it
 * @param command the command line that gives this answer again
 * @param threads worker threads
 * @param elapsedS time taken [s]
 * @param blocks where the blocks of frames came from
 * @param kept whether blocks are kept in a journal that outlives the run
 */
record ShortlistRun(
        Requirement requirement,
        ShortlistResult result,
        String file,
        String command,
        int threads,
        double elapsedS,
        BlockOrigins blocks,
        boolean kept) {
    OperatingPoint point() {
        return result.operatingPoints().get(0);
    }
}
