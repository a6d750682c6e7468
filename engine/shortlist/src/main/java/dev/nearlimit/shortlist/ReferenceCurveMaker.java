package dev.nearlimit.shortlist;

import dev.nearlimit.limits.BinaryInputAwgn;
import dev.nearlimit.limits.HardDecisionAwgn;
import dev.nearlimit.limits.ShannonLimit;
import dev.nearlimit.limits.UncodedBinary;
import dev.nearlimit.shortlist.result.ReferenceCurves;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/** Samples the reference curves that charts draw beside the schemes. */
final class ReferenceCurveMaker {
    private static final double STEP_DB = 0.25;
    private static final double LAST_DB = 14;

    /** Rates at which the limits are sampled; a limit is a function of the rate, and drawn the other way round. */
    private static final double[] RATES = rates();

    private ReferenceCurveMaker() {}

    static ReferenceCurves make() {
        List<double[]> uncoded = new ArrayList<>();
        for (double db = -2; db <= LAST_DB; db += STEP_DB) {
            uncoded.add(new double[] {db, UncodedBinary.bitErrorRate(db)});
        }
        return new ReferenceCurves(
                uncoded.toArray(double[][]::new),
                byRate(ShannonLimit::leastEbn0Db, 2.0),
                byRate(BinaryInputAwgn::leastEbn0Db, 1.0),
                byRate(HardDecisionAwgn::leastEbn0Db, 1.0));
    }

    private static double[][] byRate(DoubleUnaryOperator leastEbn0Db, double scale) {
        double[][] curve = new double[RATES.length][];
        for (int i = 0; i < RATES.length; i++) {
            double rate = RATES[i] * scale;
            curve[i] = new double[] {leastEbn0Db.applyAsDouble(rate), rate};
        }
        return curve;
    }

    private static double[] rates() {
        double[] rates = new double[51];
        rates[0] = 0.001;
        for (int i = 1; i < 50; i++) {
            rates[i] = i / 50.0;
        }
        rates[50] = 0.999;
        return rates;
    }
}
