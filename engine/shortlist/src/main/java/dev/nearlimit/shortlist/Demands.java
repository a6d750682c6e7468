package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.evaluation.CurveSearch;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.SchemeResult.Failure;
import dev.nearlimit.simulation.search.MeasuredPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** The demands of a requirement, each of which a scheme meets or fails by some amount. */
final class Demands {
    private final Requirement requirement;
    private final double leftDb;

    Demands(Requirement requirement) {
        this.requirement = requirement;
        this.leftDb = requirement.link().leftEbn0Db();
    }

    /** Eb/N0 left for code and decoder [dB]. */
    double leftDb() {
        return leftDb;
    }

    /** Whether everything that needs no error rate is met with at least one modulation. */
    boolean metWithoutErrorRates(Contender contender, List<Carriage> carriages) {
        return operationsExcess(contender) <= 1
                && carriages.stream()
                        .anyMatch(carriage -> bandwidthExcess(carriage) <= 1 && latencyExcess(carriage) <= 1);
    }

    /** Demands that the scheme fails, as far as they were looked at. */
    List<Failure> failures(Standing standing, Carriage carriage) {
        List<Failure> failures = new ArrayList<>();
        ebn0Failure(standing, failures);
        if (bandwidthExcess(carriage) > 1) {
            double allowed = requirement.link().bandwidthHz();
            failures.add(new Failure(
                    "bandwidth " + Units.hertz(allowed),
                    "needs " + Units.hertz(carriage.occupiedBandwidthHz() - allowed) + " more"));
        }
        if (latencyExcess(carriage) > 1) {
            double allowed = requirement.latencyS().getAsDouble();
            failures.add(new Failure(
                    "latency " + Units.seconds(allowed),
                    "takes " + Units.seconds(carriage.airS() - allowed) + " longer on air"));
        }
        if (operationsExcess(standing.contender()) > 1) {
            double allowed = requirement.operationsPerBit().getAsDouble();
            failures.add(new Failure(
                    "decoder budget " + Units.operations(allowed),
                    "takes "
                            + Units.operations(standing.contender().worstCaseOperationsPerBit() - allowed)
                            + " more in the worst case"));
        }
        return failures;
    }

    /**
     * How far a scheme misses the requirement as a whole [dB]: the sum over failed demands of 10 log10 of what it takes
     * over what is allowed, for Eb/N0 simply the dB missing. Infinite where the needed Eb/N0 is not known and not proven
     * to suffice, so that such a scheme never passes for a near miss.
     */
    double missDb(Standing standing, Carriage carriage) {
        double ebn0MissDb = Double.isNaN(standing.neededDb())
                ? Double.POSITIVE_INFINITY
                : Math.max(0, standing.neededDb() - leftDb);
        return ebn0MissDb
                + excessDb(bandwidthExcess(carriage))
                + excessDb(latencyExcess(carriage))
                + excessDb(operationsExcess(standing.contender()));
    }

    private void ebn0Failure(Standing standing, List<Failure> failures) {
        String demand = String.format(Locale.ROOT, "Eb/N0 %.2f dB", leftDb);
        double needed = standing.neededDb();
        double targetFer = standing.contender().fit().codewordFerTarget();
        double limit = standing.contender().provenLimitDb();
        if (!Double.isNaN(needed)) {
            if (needed > leftDb) {
                String doubt = standing.neededLowDb() <= leftDb ? ", which its interval cannot tell from none" : "";
                failures.add(new Failure(demand, "needs " + Units.decibels(needed - leftDb) + " more" + doubt));
            }
        } else if (limit > leftDb) {
            failures.add(new Failure(
                    demand,
                    String.format(
                            Locale.ROOT,
                            "no code of its rate and length works below %.2f dB, %s more",
                            limit,
                            Units.decibels(limit - leftDb))));
        } else if (standing.curve() == null) {
            if (CurveSearch.outOfReach(targetFer)) {
                failures.add(new Failure(
                        "evidence for codeword FER " + Units.errorRate(targetFer),
                        "simulation shows no rate below " + Units.errorRate(CurveSearch.lowestFer())));
            }
        } else if (standing.curve().complete()) {
            failures.add(new Failure(demand, shortfall(standing)));
        }
    }

    /** What was seen at the highest Eb/N0 tried within reach; a scheme is here only if its target was not met there. */
    private String shortfall(Standing standing) {
        double fillerDb = standing.contender().fit().fillerDb();
        MeasuredPoint last = null;
        for (MeasuredPoint point : standing.curve().points()) {
            if (last == null || point.ebn0Db() + fillerDb <= leftDb + 1e-6) {
                last = point;
            }
        }
        return String.format(
                Locale.ROOT,
                "codeword FER %s at %.2f dB (%d errors in %d), %s allowed",
                Units.errorRate(last.fer()),
                last.ebn0Db() + fillerDb,
                last.counts().frameErrors(),
                last.counts().frames(),
                Units.errorRate(standing.contender().fit().codewordFerTarget()));
    }

    private double bandwidthExcess(Carriage carriage) {
        return withoutRounding(
                carriage.occupiedBandwidthHz() / requirement.link().bandwidthHz());
    }

    private double latencyExcess(Carriage carriage) {
        return requirement.latencyS().isPresent()
                ? withoutRounding(carriage.airS() / requirement.latencyS().getAsDouble())
                : 0;
    }

    private double operationsExcess(Contender contender) {
        return requirement.operationsPerBit().isPresent()
                ? contender.worstCaseOperationsPerBit()
                        / requirement.operationsPerBit().getAsDouble()
                : 0;
    }

    private static double excessDb(double ratio) {
        return ratio > 1 ? 10 * Math.log10(ratio) : 0;
    }

    /** A ratio that exceeds 1 by rounding alone counts as 1. */
    private static double withoutRounding(double ratio) {
        return Math.abs(ratio - 1) < 1e-12 ? 1 : ratio;
    }
}
