package dev.nearlimit.shortlist.evaluation;

import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.search.ErrorRateMeter;
import dev.nearlimit.simulation.search.MeasuredPoint;
import dev.nearlimit.simulation.search.NeededEbn0;
import dev.nearlimit.simulation.search.NeededEbn0Search;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Objects;

/**
 * Finds one contender's error curve in steps that a shortlist may stop after: a coarse bracket, a refined one.
 * Points measured in one step serve the next.
 */
public final class CurveSearch {
    /** Frame errors that end a point of the coarse bracket: a few dozen. */
    public static final long COARSE_ERRORS = 32;

    /** Half of the coarse interval's width that is sought [dB], and what is spent on it at most. */
    private static final double COARSE_HALF_WIDTH_DB = 0.1;

    private static final long COARSE_BUDGET = 64;

    /** Half of the refined interval's width that is sought [dB], and what is spent on it at most. */
    private static final double REFINED_HALF_WIDTH_DB = 0.02;

    private static final long REFINED_BUDGET = 150;

    /** Codewords that one point may take at most, so that a hopeless point ends. */
    private static final long MOST_FRAMES = 20_000_000;

    /** Codewords at most where a formula gives the FER and only the wrong bits a failed frame are measured. */
    private static final long MOST_FRAMES_BESIDE_A_FORMULA = 2_000_000;

    private final ErrorRateMeter meter;
    private final int informationBits;
    private final double targetFer;
    private final NeededEbn0Search search;

    /**
     * @param meter counts errors of the contender
     * @param informationBits information bits a codeword
     * @param targetFer FER that a codeword may have
     */
    public CurveSearch(ErrorRateMeter meter, int informationBits, double targetFer) {
        this.meter = meter;
        this.informationBits = informationBits;
        this.targetFer = targetFer;
        this.search = new NeededEbn0Search(meter, targetFer, MOST_FRAMES);
    }

    /**
     * Whether so low a target is out of simulation's reach: even a few dozen frame errors at it take more codewords than
     * a point may have.
     */
    public static boolean outOfReach(double targetFer) {
        return COARSE_ERRORS / targetFer > MOST_FRAMES;
    }

    /** The lowest codeword FER that simulation can show. */
    public static double lowestFer() {
        return (double) COARSE_ERRORS / MOST_FRAMES;
    }

    /**
     * Finds the needed Eb/N0 to about a tenth of a dB.
     *
     * @param startDb where to begin [dB]
     * @param giveUpDb highest Eb/N0 to try [dB]
     */
    public ErrorCurve coarse(double startDb, double giveUpDb) {
        NeededEbn0 found = search.bracket(startDb, giveUpDb, COARSE_ERRORS);
        return simulated(found.bracketed() ? search.refine(COARSE_HALF_WIDTH_DB, COARSE_BUDGET) : found, "coarse");
    }

    /**
     * Whether a curve that gave up has shown that the target is missed where it ended: its FER interval there (95 %) lies
     * above the target.
     */
    public boolean missesForSure(ErrorCurve gaveUp) {
        MeasuredPoint last = gaveUp.nearNeeded();
        return new ErrorRateIntervals()
                        .frameErrorRate(last.counts(), last.rule())
                        .low()
                > targetFer;
    }

    /** Narrows what {@link #coarse} found to a fiftieth of a dB, where the frames suffice that this is worth. */
    public ErrorCurve refined() {
        return simulated(search.refine(REFINED_HALF_WIDTH_DB, REFINED_BUDGET), "refined");
    }

    /**
     * The curve of a contender whose FER is known exactly. What the formula does not give, wrong bits a failed frame and
     * undetected errors, is measured at the needed Eb/N0.
     */
    public ErrorCurve exact(ExactErrorRate rate) {
        double needed = rate.neededEbn0Db(targetFer);
        MeasuredPoint point = measure(needed, 2 * COARSE_ERRORS, MOST_FRAMES_BESIDE_A_FORMULA);
        if (point.counts().frames() == 0) {
            return withoutMeasurement(rate, targetFer, false);
        }
        return new ErrorCurve(
                needed,
                needed,
                needed,
                "exact",
                rate.how(),
                "exact",
                List.of(point),
                rate,
                point,
                bitErrorRate(point),
                point.counts().complete());
    }

    /** The same curve for a contender out of the running: what the formula gives, and nothing measured. */
    public static ErrorCurve unmeasured(ExactErrorRate rate, double targetFer) {
        return withoutMeasurement(rate, targetFer, true);
    }

    private static ErrorCurve withoutMeasurement(ExactErrorRate rate, double targetFer, boolean complete) {
        double needed = rate.neededEbn0Db(targetFer);
        return new ErrorCurve(
                needed, needed, needed, "exact", rate.how(), "exact", List.of(), rate, null, null, complete);
    }

    private MeasuredPoint measure(double ebn0Db, long errors, long mostFrames) {
        long microDb = Math.round(ebn0Db * 1e6);
        StoppingRule rule = new StoppingRule((long) Math.min(mostFrames, Math.ceil(errors / targetFer)), errors);
        PointCounts counts = meter.measure(microDb, rule);
        return new MeasuredPoint(microDb, counts, rule);
    }

    private ErrorCurve simulated(NeededEbn0 found, String stage) {
        MeasuredPoint near = found.bracketHigh() != null ? found.bracketHigh() : found.bracketLow();
        return new ErrorCurve(
                found.ebn0Db(),
                found.lowDb(),
                found.highDb(),
                "simulated",
                describe(found),
                found.bracketed() ? stage : "coarse",
                found.points(),
                null,
                near,
                bitErrorRate(found.bracketLow(), found.bracketHigh()),
                found.complete());
    }

    private BitErrorRate bitErrorRate(MeasuredPoint... points) {
        List<MeasuredPoint> measured =
                Arrays.stream(points).filter(Objects::nonNull).toList();
        return BitErrorRate.at(targetFer, measured, informationBits).orElse(null);
    }

    private static String describe(NeededEbn0 found) {
        if (!found.bracketed()) {
            return found.bracketLow() == null
                    ? "target met at every Eb/N0 tried"
                    : String.format(
                            Locale.ROOT,
                            "target not met up to %.2f dB",
                            found.bracketLow().ebn0Db());
        }
        List<MeasuredPoint> points = found.points();
        return String.format(
                Locale.ROOT,
                "curve fitted to %d points from %.2f to %.2f dB (%d errors in %d frames)",
                points.size(),
                points.get(0).ebn0Db(),
                points.get(points.size() - 1).ebn0Db(),
                points.stream().mapToLong(point -> point.counts().frameErrors()).sum(),
                points.stream().mapToLong(point -> point.counts().frames()).sum());
    }
}
