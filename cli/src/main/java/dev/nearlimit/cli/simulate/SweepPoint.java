package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.statistics.PairedFailures;
import java.util.List;

/**
 * All combinations of a sweep at one point, on common noise.
 *
 * @param measured in the order of the combinations; fewer of them if the run was ended
 */
record SweepPoint(Point point, List<MeasuredPoint> measured) {
    /** Below this a difference is one. */
    private static final double SIGNIFICANCE = 0.05;

    SweepPoint {
        measured = List.copyOf(measured);
    }

    /** Which combination has the lowest FER, the first of several; there must be one. */
    int best() {
        int best = 0;
        for (int i = 1; i < measured.size(); i++) {
            if (measured.get(i).fer() < measured.get(best).fer()) {
                best = i;
            }
        }
        return best;
    }

    /** A combination (first) against the best (second), frame by frame. */
    PairedFailures againstBest(int combination) {
        return PairedFailures.of(
                measured.get(combination).outcome(), measured.get(best()).outcome());
    }

    /**
     * Whether a combination cannot be told apart from the best. Which is best was found from the same frames, so any pair
     * may have come to be looked at: the sign test's result is multiplied by the number of pairs (Bonferroni).
     */
    boolean tied(int combination) {
        double pairs = measured.size() * (measured.size() - 1) / 2.0;
        return combination == best() || againstBest(combination).signTest() * pairs > SIGNIFICANCE;
    }

    /** FER over that of the best; not a number where the best has none. */
    double timesBest(int combination) {
        return combination == best()
                ? 1
                : measured.get(combination).fer()
                        / (measured.get(best()).fer() == 0
                                ? Double.NaN
                                : measured.get(best()).fer());
    }
}
