package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.evaluation.CurveSearch;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.SchemeResult.Failure;
import dev.nearlimit.simulation.search.MeasuredPoint;
import dev.nearlimit.simulation.statistics.ErrorRateIntervals;
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
     * over what is allowed, for Eb/N0 simply the dB missing. Orders rejected schemes; 0 if nothing is known to fail.
     */
    double missDb(Standing standing, Carriage carriage) {
        return Math.max(0, ebn0MissDb(standing))
                + excessDb(bandwidthExcess(carriage))
                + excessDb(latencyExcess(carriage))
                + excessDb(operationsExcess(standing.contender()));
    }

    /** Eb/N0 missing [dB], at least what is proven; negative or 0 where it suffices or nothing is known. */
    private double ebn0MissDb(Standing standing) {
        if (!Double.isNaN(standing.neededDb())) {
            return standing.neededDb() - leftDb;
        }
        return standing.contender().ownLimitDb() - leftDb;
    }

    private void ebn0Failure(Standing standing, List<Failure> failures) {
        String demand = String.format(Locale.ROOT, "Eb/N0 %.2f dB", leftDb);
        double needed = standing.neededDb();
        double limit = standing.contender().ownLimitDb();
        if (!Double.isNaN(needed)) {
            if (needed > leftDb) {
                failures.add(new Failure(demand, "needs " + Units.decibels(needed - leftDb) + " more"));
            }
        } else if (limit > leftDb) {
            failures.add(new Failure(
                    demand,
                    String.format(
                            Locale.ROOT,
                            "the limit at its rate alone, %.2f dB, needs %s more",
                            limit,
                            Units.decibels(limit - leftDb))));
        } else if (standing.curve() == null
                && CurveSearch.outOfReach(standing.contender().fit().codewordFerTarget())) {
            failures.add(new Failure(
                    "evidence for codeword FER "
                            + Units.errorRate(standing.contender().fit().codewordFerTarget()),
                    "simulation shows no rate below " + Units.errorRate(CurveSearch.lowestFer())));
        } else if (standing.curve() != null && standing.curve().nearNeeded() != null) {
            MeasuredPoint last = standing.curve().nearNeeded();
            double low = new ErrorRateIntervals()
                    .frameErrorRate(last.counts(), last.rule())
                    .low();
            failures.add(new Failure(
                    demand,
                    String.format(
                            Locale.ROOT,
                            "codeword FER above %s at %.2f dB after %d frame errors, %s allowed",
                            Units.errorRate(low),
                            last.ebn0Db() + standing.contender().fit().fillerDb(),
                            last.counts().frameErrors(),
                            Units.errorRate(standing.contender().fit().codewordFerTarget()))));
        }
    }

    private double bandwidthExcess(Carriage carriage) {
        return carriage.occupiedBandwidthHz() / requirement.link().bandwidthHz();
    }

    private double latencyExcess(Carriage carriage) {
        return requirement.latencyS().isPresent()
                ? carriage.airS() / requirement.latencyS().getAsDouble()
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
}
