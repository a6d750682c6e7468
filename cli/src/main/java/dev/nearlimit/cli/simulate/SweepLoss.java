package dev.nearlimit.cli.simulate;

import java.util.List;

/**
 * How much Eb/N0 a combination loses against the best: how far below a point the best has the FER that the combination
 * has there. Read off the line through log FER of the best at neighbouring points, and never beyond them.
 */
final class SweepLoss {
    private final List<SweepPoint> points;

    /** @param points ascending in Eb/N0 */
    SweepLoss(List<SweepPoint> points) {
        this.points = points;
    }

    /** The loss [dB] of a combination at a point; not a number where the points measured do not show it. */
    double ofCombination(int combination, int point) {
        SweepPoint here = points.get(point);
        int best = here.best();
        if (combination == best) {
            return 0;
        }
        double fer = here.measured().get(combination).fer();
        for (int upper = point; upper > 0; upper--) {
            MeasuredPoint right = points.get(upper).measured().get(best);
            MeasuredPoint left = points.get(upper - 1).measured().get(best);
            if (right.fer() > 0 && right.fer() <= fer && fer <= left.fer() && left.fer() > right.fer()) {
                double share = Math.log(fer / right.fer()) / Math.log(left.fer() / right.fer());
                double sameFer = right.ebn0Db() + share * (left.ebn0Db() - right.ebn0Db());
                return here.measured().get(combination).ebn0Db() - sameFer;
            }
        }
        return Double.NaN;
    }
}
