package dev.nearlimit.simulation.search;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;

/**
 * Finds the Eb/N0 at which the frame error rate meets a target, spending frames where they matter.
 *
 * <p>{@link #bracket} climbs from below, where errors are plentiful and points are cheap: a point ends after
 * {@code errors} frame errors, or after {@code errors / target} frames, which is enough to know on which side of the
 * target it lies. {@link #refine} then measures two points 0.2 dB apart around the estimate with more errors.
 *
 * <p>The estimate interpolates log10 FER linearly between the two points that bracket the target. Its interval is where
 * the broken lines through the upper and through the lower ends of all points' FER intervals cross the target; where no
 * measured point lies surely below the target, points are added until one does. Each point's interval holds with 99 %,
 * so that those of the five points around the target, which alone can move a crossing, hold together with 95 %
 * (Bonferroni), and with them the crossing of the true curve, as far as it is straight between points. What a straight
 * line misses of a curve's bend is not in it: below 0.01 dB over the 0.2 dB of a refined bracket for waterfalls bending
 * by less than 5 decades a squared dB. A point that was cut short decides nothing.
 */
public final class NeededEbn0Search {
    private static final ErrorRateIntervals INTERVALS = new ErrorRateIntervals(0.99);
    private static final long BRACKET_GRID_MICRO_DB = 250_000;
    private static final long REFINED_GRID_MICRO_DB = 50_000;
    private static final long REFINED_WIDTH_MICRO_DB = 200_000;
    private static final int MOST_REFINED_SHIFTS = 12;
    private static final int MOST_POINTS_BEYOND = 6;

    private final ErrorRateMeter meter;
    private final double targetFer;
    private final long mostFrames;
    private final TreeMap<Long, MeasuredPoint> measured = new TreeMap<>();
    private boolean cutShort;

    /**
     * @param meter what counts errors
     * @param targetFer target frame error rate, in (0, 1)
     * @param mostFrames frames that one point may take at most
     */
    public NeededEbn0Search(ErrorRateMeter meter, double targetFer, long mostFrames) {
        if (!(targetFer > 0 && targetFer < 1)) {
            throw new InvalidSimulationException("target FER is " + targetFer + ", must lie between 0 and 1");
        }
        this.meter = meter;
        this.targetFer = targetFer;
        this.mostFrames = mostFrames;
    }

    /**
     * Brackets the target. Called again with a higher {@code giveUpDb}, it goes on where it gave up.
     *
     * @param startDb where to begin [dB]; best a little below the answer
     * @param giveUpDb highest Eb/N0 to try [dB]
     * @param errors frame errors that end a point
     */
    public NeededEbn0 bracket(double startDb, double giveUpDb, long errors) {
        long floor = onGrid(startDb - 6, BRACKET_GRID_MICRO_DB);
        long ceiling = Math.round(giveUpDb * 1e6);
        long at = Math.min(onGrid(startDb, BRACKET_GRID_MICRO_DB), ceiling);
        MeasuredPoint point = measure(at, errors);
        while (!cutShort && point.fer() <= targetFer && at > floor) {
            at -= 2 * BRACKET_GRID_MICRO_DB;
            point = measure(at, errors);
        }
        while (!cutShort && point.fer() > targetFer && at < ceiling) {
            at = Math.min(ceiling, at + climb(point));
            point = measure(at, errors);
        }
        while (!cutShort && above() != null && below() != null) {
            long width = above().microDb() - below().microDb();
            if (width <= BRACKET_GRID_MICRO_DB) {
                break;
            }
            measure(onGrid((above().microDb() + below().microDb()) / 2e6, BRACKET_GRID_MICRO_DB), errors);
        }
        makeSureOfBothSides(errors);
        return answer();
    }

    /** Adds points outwards until one is surely above the target and one surely below it. */
    private void makeSureOfBothSides(long errors) {
        for (int added = 0; !cutShort && above() != null && below() != null && added < MOST_POINTS_BEYOND; added++) {
            MeasuredPoint first = measured.firstEntry().getValue();
            MeasuredPoint last = measured.lastEntry().getValue();
            if (interval(first).low() <= targetFer) {
                measure(first.microDb() - BRACKET_GRID_MICRO_DB, errors);
            } else if (interval(last).high() >= targetFer) {
                measure(last.microDb() + BRACKET_GRID_MICRO_DB, errors);
            } else {
                return;
            }
        }
    }

    /**
     * Narrows a bracket to 0.2 dB with more errors a point.
     *
     * @param errors frame errors that end a point
     */
    public NeededEbn0 refine(long errors) {
        NeededEbn0 coarse = answer();
        if (!coarse.bracketed() || cutShort) {
            return coarse;
        }
        long low = Math.floorDiv(Math.round(coarse.ebn0Db() * 1e6) - REFINED_WIDTH_MICRO_DB / 2, REFINED_GRID_MICRO_DB)
                * REFINED_GRID_MICRO_DB;
        MeasuredPoint lower = measure(low, errors);
        MeasuredPoint upper = null;
        for (int shifts = 0; !cutShort && shifts < MOST_REFINED_SHIFTS; shifts++) {
            if (lower.fer() <= targetFer) {
                upper = lower;
                lower = measure(lower.microDb() - REFINED_WIDTH_MICRO_DB, errors);
            } else if (upper == null || upper.fer() > targetFer) {
                MeasuredPoint next = measure(lower.microDb() + REFINED_WIDTH_MICRO_DB, errors);
                if (next.fer() > targetFer) {
                    lower = next;
                } else {
                    upper = next;
                }
            } else {
                makeSureOfBothSides(errors);
                return between(lower, upper);
            }
        }
        return answer();
    }

    /** The point measured highest whose FER is above the target, below every point that meets it. */
    private MeasuredPoint below() {
        MeasuredPoint found = null;
        for (MeasuredPoint point : measured.values()) {
            if (point.fer() <= targetFer) {
                break;
            }
            found = point;
        }
        return found;
    }

    private MeasuredPoint above() {
        return measured.values().stream()
                .filter(point -> point.fer() <= targetFer)
                .findFirst()
                .orElse(null);
    }

    /** How far to climb: in great steps while nearly every frame fails, along the curve's own slope once it has one. */
    private long climb(MeasuredPoint last) {
        if (last.fer() > 0.5) {
            return 4 * BRACKET_GRID_MICRO_DB;
        }
        var earlier = measured.lowerEntry(last.microDb());
        if (earlier == null || earlier.getValue().fer() <= last.fer()) {
            return 2 * BRACKET_GRID_MICRO_DB;
        }
        double slope =
                (Math.log10(last.fer()) - Math.log10(earlier.getValue().fer())) / (last.microDb() - earlier.getKey());
        double wanted = (Math.log10(targetFer) - Math.log10(last.fer())) / slope;
        long steps = (long) Math.ceil(wanted / BRACKET_GRID_MICRO_DB);
        return BRACKET_GRID_MICRO_DB * Math.max(1, Math.min(4, steps));
    }

    private MeasuredPoint measure(long microDb, long errors) {
        MeasuredPoint known = measured.get(microDb);
        if (known != null && known.rule().frameErrors() >= errors) {
            return known;
        }
        long frames = (long) Math.min(mostFrames, Math.ceil(errors / targetFer));
        StoppingRule rule = new StoppingRule(Math.max(1, frames), errors);
        PointCounts counts = meter.measure(microDb, rule);
        MeasuredPoint point = new MeasuredPoint(microDb, counts, rule);
        if (counts.complete()) {
            measured.put(microDb, point);
        } else {
            cutShort = true;
        }
        return point;
    }

    private NeededEbn0 answer() {
        List<MeasuredPoint> points = new ArrayList<>(measured.values());
        MeasuredPoint lower = below();
        MeasuredPoint upper = above();
        if (lower != null && upper != null) {
            return between(lower, upper);
        }
        double known = points.isEmpty()
                ? Double.NaN
                : (lower == null ? points.get(0) : points.get(points.size() - 1)).ebn0Db();
        return new NeededEbn0(
                known,
                lower == null ? Double.NEGATIVE_INFINITY : known,
                upper == null ? Double.POSITIVE_INFINITY : known,
                lower,
                upper,
                points,
                !cutShort);
    }

    private NeededEbn0 between(MeasuredPoint lower, MeasuredPoint upper) {
        double x0 = lower.ebn0Db();
        double x1 = upper.ebn0Db();
        double atLower = Math.log10(lower.fer());
        double atUpper = Math.log10(visibleFer(upper));
        double slope = (atUpper - atLower) / (x1 - x0);
        double estimate = x0 + (Math.log10(targetFer) - atLower) / slope;
        return new NeededEbn0(
                estimate,
                Math.min(lowEnd(), estimate),
                Math.max(highEnd(), estimate),
                lower,
                upper,
                new ArrayList<>(measured.values()),
                !cutShort);
    }

    /** Where the line through the lower ends first meets the target. */
    private double lowEnd() {
        MeasuredPoint before = null;
        for (MeasuredPoint point : measured.values()) {
            double low = interval(point).low();
            if (low <= targetFer) {
                return before == null
                        ? Double.NEGATIVE_INFINITY
                        : crossing(before.ebn0Db(), interval(before).low(), point.ebn0Db(), low);
            }
            before = point;
        }
        return Double.POSITIVE_INFINITY;
    }

    /** Where the line through the upper ends last meets the target. */
    private double highEnd() {
        MeasuredPoint after = null;
        for (MeasuredPoint point : measured.descendingMap().values()) {
            double high = interval(point).high();
            if (high >= targetFer) {
                return after == null
                        ? Double.POSITIVE_INFINITY
                        : crossing(
                                point.ebn0Db(),
                                high,
                                after.ebn0Db(),
                                interval(after).high());
            }
            after = point;
        }
        return Double.NEGATIVE_INFINITY;
    }

    private static Interval interval(MeasuredPoint point) {
        return INTERVALS.frameErrorRate(point.counts(), point.rule());
    }

    /** FER of a point, half a frame error standing in for none, since the logarithm needs something. */
    private static double visibleFer(MeasuredPoint point) {
        return Math.max(point.fer(), 0.5 / point.counts().frames());
    }

    /** Where the straight line of log FER through both points meets the target, which lies between them. */
    private double crossing(double x0, double fer0, double x1, double fer1) {
        // A lower end of 0 has no logarithm; far below everything, it leaves the crossing near the other point.
        double y0 = Math.log10(Math.max(fer0, Double.MIN_NORMAL));
        double y1 = Math.log10(Math.max(fer1, Double.MIN_NORMAL));
        return x0 + (Math.log10(targetFer) - y0) / ((y1 - y0) / (x1 - x0));
    }

    private static long onGrid(double db, long grid) {
        return Math.round(db * 1e6 / grid) * grid;
    }
}
