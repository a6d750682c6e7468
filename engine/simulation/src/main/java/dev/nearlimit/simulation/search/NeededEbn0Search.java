package dev.nearlimit.simulation.search;

import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;

/**
 * Finds the Eb/N0 at which the frame error rate meets a target, spending frames where they matter.
 *
 * <p>{@link #bracket} climbs from below, where errors are plentiful and points are cheap: a point ends after
 * {@code errors} frame errors, or after {@code errors / target} frames, which is enough to know on which side of the
 * target it lies. {@link #refine} then adds frames in rounds, each at the Eb/N0 where they narrow the estimate most,
 * until the interval is as narrow as wanted.
 *
 * <p>Estimate and interval come from a curve fitted to all points ({@code WaterfallFit}), which says what it assumes.
 * Every decision depends on counts alone. A point that was cut short decides nothing.
 */
public final class NeededEbn0Search {
    private static final long BRACKET_GRID_MICRO_DB = 250_000;
    /** Refined points lie on this grid, or on the finer one where a curve falls by more than half a decade in a step. */
    private static final long REFINED_GRID_MICRO_DB = 50_000;

    private static final long FINE_GRID_MICRO_DB = 10_000;
    private static final double STEEP_NATS = 1.2;
    /** Refined points lie from this far above the target to this far below it [nats of FER]. */
    private static final double REACH_ABOVE = 3;

    private static final double REACH_BELOW = 1;
    /** Frames of a round: so many frame errors at the target, and a quarter of all refining so far. */
    private static final double ERRORS_PER_ROUND = 5;

    private static final double GROWTH_OF_ROUNDS = 0.25;
    /** How often all points may have to be found on one side of the target before refining is given up. */
    private static final int MOST_SIDES = 8;
    /** Frames that tell on which side of the target a point lies, as frame errors at the target. */
    private static final double ERRORS_THAT_TELL = 6;

    private static final double LEAST_SLOPE = 0.05;

    private final ErrorRateMeter meter;
    private final double targetFer;
    private final long mostFrames;
    private final TreeMap<Long, MeasuredPoint> measured = new TreeMap<>();
    /** The curve behind the last bracketed answer. */
    private WaterfallFit fit;

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
        return answer();
    }

    /**
     * Narrows a bracket's interval.
     *
     * @param halfWidthDb half of the 95 % interval's width that suffices [dB]
     * @param errors frames to spend at most, as frame errors at the target: errors / target frames
     */
    public NeededEbn0 refine(double halfWidthDb, long errors) {
        NeededEbn0 answer = answer();
        if (!answer.bracketed()) {
            return answer;
        }
        double budget = errors / targetFer;
        double spent = 0;
        for (int sides = 0; !cutShort && sides < MOST_SIDES && (!answer.bracketed() || spent < budget); ) {
            if (answer.bracketed() && width(answer) <= 2 * halfWidthDb) {
                break;
            }
            double round = ERRORS_PER_ROUND / targetFer + GROWTH_OF_ROUNDS * spent;
            double frames = Math.ceil(answer.bracketed() ? Math.min(budget - spent, round) : round);
            sides += answer.bracketed() ? 0 : 1;
            long at = answer.bracketed() ? mostTelling(frames, answer) : missingSide();
            MeasuredPoint known = measured.get(at);
            double more = Math.min(
                    frames, mostFrames - (known == null ? 0 : known.counts().frames()));
            if (more < 1) {
                break;
            }
            addFrames(at, (long) more);
            spent += more;
            answer = answer();
        }
        return answer;
    }

    private static double width(NeededEbn0 answer) {
        return answer.highDb() - answer.lowDb();
    }

    /** Where a point is missing when more frames have brought all points to one side of the target. */
    private long missingSide() {
        long step = Math.max(FINE_GRID_MICRO_DB, Math.round(1e6 * REACH_BELOW / fit.slopePerDb()));
        return below() == null ? measured.firstKey() - step : measured.lastKey() + step;
    }

    /**
     * Where so many more frames leave the estimate the least uncertain; while an end of the interval is open, beyond the
     * crossing on that side.
     */
    private long mostTelling(double frames, NeededEbn0 answer) {
        double slope = fit.slopePerDb();
        long grid = slope * REFINED_GRID_MICRO_DB / 1e6 > STEEP_NATS ? FINE_GRID_MICRO_DB : REFINED_GRID_MICRO_DB;
        long first = onGrid(fit.crossingDb() - REACH_ABOVE / slope, grid);
        long last = onGrid(fit.crossingDb() + REACH_BELOW / slope, grid);
        if (Double.isInfinite(width(answer))) {
            return Double.isInfinite(answer.highDb()) ? last : first;
        }
        long best = first;
        double least = Double.POSITIVE_INFINITY;
        for (long at = first; at <= last; at += grid) {
            double deviation = fit.deviationDb(at / 1e6, frames);
            if (deviation < least) {
                least = deviation;
                best = at;
            }
        }
        return best;
    }

    private WaterfallFit fit() {
        MeasuredPoint lower = below();
        MeasuredPoint upper = above();
        double atLower = WaterfallFit.eta(lower.fer());
        double atUpper = WaterfallFit.eta(visibleFer(upper));
        double slope = Math.max(LEAST_SLOPE, (atLower - atUpper) / (upper.ebn0Db() - lower.ebn0Db()));
        double start = lower.ebn0Db() + (atLower - WaterfallFit.eta(targetFer)) / slope;
        double within = Math.max(lower.ebn0Db(), Math.min(upper.ebn0Db(), start));
        return WaterfallFit.of(targetFer, measured.values(), within, slope);
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
        long frames = (long) Math.min(mostFrames, Math.ceil(Math.min(errors, ERRORS_THAT_TELL) / targetFer));
        return measure(microDb, new StoppingRule(Math.max(1, frames), errors));
    }

    private void addFrames(long microDb, long frames) {
        MeasuredPoint known = measured.get(microDb);
        long before = known == null ? 0 : known.counts().frames();
        measure(microDb, new StoppingRule(before + frames, Long.MAX_VALUE));
    }

    private MeasuredPoint measure(long microDb, StoppingRule rule) {
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
            fit = fit();
            return new NeededEbn0(fit.crossingDb(), fit.lowDb(), fit.highDb(), lower, upper, points, !cutShort);
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

    /** FER of a point, half a frame error standing in for none, since the logarithm needs something. */
    private static double visibleFer(MeasuredPoint point) {
        return Math.max(point.fer(), 0.5 / point.counts().frames());
    }

    private static long onGrid(double db, long grid) {
        return Math.round(db * 1e6 / grid) * grid;
    }
}
