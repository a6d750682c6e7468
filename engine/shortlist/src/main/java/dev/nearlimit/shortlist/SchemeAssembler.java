package dev.nearlimit.shortlist;

import dev.nearlimit.codes.KnownDistance;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.OperationCount;
import dev.nearlimit.limits.UncodedBinary;
import dev.nearlimit.shortlist.evaluation.BitErrorRate;
import dev.nearlimit.shortlist.evaluation.ErrorCurve;
import dev.nearlimit.shortlist.evaluation.ExactErrorRate;
import dev.nearlimit.shortlist.evaluation.PayloadFit;
import dev.nearlimit.shortlist.result.SchemeResult;
import dev.nearlimit.shortlist.result.SchemeResult.ExactPoint;
import dev.nearlimit.shortlist.result.SchemeResult.Failure;
import dev.nearlimit.shortlist.result.SchemeResult.Latency;
import dev.nearlimit.shortlist.result.SchemeResult.Operations;
import dev.nearlimit.shortlist.result.SchemeResult.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.search.MeasuredPoint;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
import dev.nearlimit.simulation.statistics.Interval;
import java.util.ArrayList;
import java.util.List;

/** Writes down what is known of a contender carried by one modulation: the row of the shortlist, before it is ranked. */
final class SchemeAssembler {
    private static final ErrorRateIntervals INTERVALS = new ErrorRateIntervals();

    /** Grid of the exact curves drawn in charts [dB]. */
    private static final double EXACT_STEP_DB = 0.25;

    private final Demands demands;

    SchemeAssembler(Demands demands) {
        this.demands = demands;
    }

    SchemeResult assemble(Standing standing, Carriage carriage) {
        Contender contender = standing.contender();
        PayloadFit fit = contender.fit();
        DecoderSettings decoder = contender.choice().decoder();
        ErrorCurve curve = standing.curve();
        List<Failure> failures = demands.failures(standing, carriage);
        Double needed = known(standing.neededDb());
        BitErrorRate ber = curve == null || needed == null ? null : curve.berAtNeeded();
        Double iterations = averageIterations(standing, decoder);
        return new SchemeResult(
                null,
                fit.code().designator(),
                contender.family(),
                decoder.designator(),
                carriage.modulation().designator(),
                contender.choice().quantiser().designator(),
                "awgn",
                fit.code().n(),
                fit.code().k(),
                fit.code().rate().toString(),
                fit.codewords(),
                fit.payloadBits() + "/" + fit.bitsSent(),
                fit.codewordFerTarget(),
                needed,
                needed == null ? null : known(standing.neededLowDb()),
                needed == null ? null : known(standing.neededHighDb()),
                needed == null ? "none" : curve.method(),
                curve == null ? "" : curve.how(),
                needed == null ? null : demands.leftDb() - needed,
                ber == null ? null : codingGainDb(ber.value(), needed),
                ber == null ? null : codingGainDb(ber.interval().high(), needed),
                ber == null ? null : codingGainDb(ber.interval().low(), needed),
                ber == null ? "none" : "simulated",
                ber == null ? null : ber.value(),
                gap(needed, contender.limits().shannonDb()),
                gap(needed, contender.limits().modulationDb()),
                decoder.hardDecision() ? gap(needed, contender.limits().hardDecisionDb()) : null,
                gap(needed, contender.limits().normalApproximationDb()),
                "estimated: normal approximation, not a bound",
                contender.limits(),
                undetectedUpper(curve),
                new Latency(null, carriage.airS(), null, null, carriage.airS()),
                carriage.symbolRateBaud(),
                carriage.occupiedBandwidthHz(),
                fit.rate(),
                (double) fit.payloadBits() / carriage.symbolsPerPayload(),
                operations(contender, iterations),
                iterations,
                fit.code().knownDistance().map(KnownDistance::value).orElse(null),
                needed != null && failures.isEmpty(),
                failures,
                false,
                false,
                stage(standing, needed, failures),
                note(standing, needed),
                points(standing),
                exactCurve(standing));
    }

    private static String stage(Standing standing, Double needed, List<Failure> failures) {
        if (needed != null) {
            return standing.curve().stage();
        }
        return failures.isEmpty() ? "unfinished" : "dropped";
    }

    private String note(Standing standing, Double needed) {
        boolean untouched = standing.curve() == null && standing.note().isEmpty();
        if (untouched || (standing.curve() != null && !standing.curve().complete())) {
            return "not finished: the run was cut short";
        }
        boolean marginUncertain = needed != null
                && standing.neededLowDb() <= demands.leftDb()
                && demands.leftDb() < standing.neededHighDb();
        return marginUncertain ? "its interval contains the available Eb/N0" : standing.note();
    }

    /** Null where the BER is so uncertain that it tells nothing: 0, or one half and more. */
    private static Double codingGainDb(double ber, double neededDb) {
        return ber > 0 && ber < 0.5 ? UncodedBinary.ebn0DbForBitErrorRate(ber) - neededDb : null;
    }

    private static Double averageIterations(Standing standing, DecoderSettings decoder) {
        MeasuredPoint near = standing.curve() == null ? null : standing.curve().nearNeeded();
        if (decoder.maxIterations() == 0 || near == null) {
            return null;
        }
        return (double) near.counts().iterations() / near.counts().frames();
    }

    private static Operations operations(Contender contender, Double iterations) {
        double worst = contender.worstCaseOperationsPerBit();
        if (contender.choice().decoder().maxIterations() > 0 && iterations == null) {
            return new Operations(null, null, null, null, worst);
        }
        OperationCount count = contender.operationsPerBit(iterations == null ? 0 : iterations);
        return new Operations(count.additions(), count.comparisons(), count.lookups(), count.total(), worst);
    }

    private static Double undetectedUpper(ErrorCurve curve) {
        if (curve == null || curve.nearNeeded() == null) {
            return null;
        }
        return INTERVALS.undetectedErrorRateUpper(curve.nearNeeded().counts());
    }

    private static List<Point> points(Standing standing) {
        if (standing.curve() == null) {
            return List.of();
        }
        List<Point> points = new ArrayList<>();
        for (MeasuredPoint point : standing.curve().points()) {
            points.add(point(standing.contender(), point));
        }
        return points;
    }

    private static Point point(Contender contender, MeasuredPoint point) {
        PointCounts counts = point.counts();
        int k = contender.fit().code().k();
        Interval fer = INTERVALS.frameErrorRate(counts, point.rule());
        Interval ber = INTERVALS.bitErrorRate(counts, k);
        return new Point(
                point.ebn0Db() + contender.fit().fillerDb(),
                counts.frames(),
                counts.frameErrors(),
                counts.bitErrors(),
                counts.undetectedErrors(),
                point.fer(),
                fer.low(),
                fer.high(),
                (double) counts.bitErrors() / ((double) counts.frames() * k),
                ber.low(),
                ber.high(),
                (double) counts.iterations() / counts.frames(),
                counts.complete());
    }

    /** The exact FER from well above to well below the target, for drawing. */
    private static List<ExactPoint> exactCurve(Standing standing) {
        ExactErrorRate exact =
                standing.curve() == null ? null : standing.curve().exact();
        if (exact == null) {
            return null;
        }
        double needed = standing.curve().neededDb();
        double filler = standing.contender().fit().fillerDb();
        List<ExactPoint> points = new ArrayList<>();
        double first = Math.floor((needed - 5) / EXACT_STEP_DB) * EXACT_STEP_DB;
        for (double at = first; at <= needed + 1; at += EXACT_STEP_DB) {
            points.add(new ExactPoint(at + filler, exact.frameErrorRate(at)));
        }
        return points;
    }

    private static Double gap(Double needed, Double limit) {
        return needed == null || limit == null ? null : needed - limit;
    }

    private static Double known(double value) {
        return Double.isNaN(value) || Double.isInfinite(value) ? null : value;
    }
}
