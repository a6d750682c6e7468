package dev.nearlimit.shortlist.evaluation;

import dev.nearlimit.algebra.errorrate.BoundedDistanceErrorRate;
import dev.nearlimit.algebra.errorrate.CosetLeaderErrorRate;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.hard.BoundedDistanceSettings;
import dev.nearlimit.decoders.hard.SyndromeSettings;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/**
 * The frame error rate of a hard-decision decoder that a formula gives exactly, on AWGN with one bit a real dimension.
 *
 * @param frameErrorRateAt FER at an Eb/N0 [dB] of the code
 * @param leastEbn0Db Eb/N0 [dB] at which the FER is the argument
 * @param how the formula, in words
 */
public record ExactErrorRate(DoubleUnaryOperator frameErrorRateAt, DoubleUnaryOperator leastEbn0Db, String how) {

    /** The formula for a code with a decoder, where there is one. */
    public static Optional<ExactErrorRate> of(Code code, DecoderSettings decoder) {
        if (decoder instanceof SyndromeSettings) {
            CosetLeaderErrorRate rate = CosetLeaderErrorRate.of(
                    code.n(), code.k(), CosetLeaders.of(code).countsByWeight());
            return Optional.of(new ExactErrorRate(
                    ebn0Db -> rate.frameErrorRate(ebn0Db).value(),
                    rate::leastEbn0Db,
                    "exact: weights of all coset leaders"));
        }
        if (decoder instanceof BoundedDistanceSettings) {
            int t = BoundedDistanceSettings.errorsCorrected(code);
            BoundedDistanceErrorRate rate = new BoundedDistanceErrorRate(code.n(), code.k(), t);
            return Optional.of(new ExactErrorRate(
                    ebn0Db -> rate.frameErrorRate(ebn0Db).value(),
                    rate::leastEbn0Db,
                    "exact: more than " + t + " errors in " + code.n() + " bits"));
        }
        return Optional.empty();
    }

    /** FER at an Eb/N0 [dB] of the code. */
    public double frameErrorRate(double ebn0Db) {
        return frameErrorRateAt.applyAsDouble(ebn0Db);
    }

    /** Eb/N0 [dB] of the code at which the FER is reached. */
    public double neededEbn0Db(double fer) {
        return leastEbn0Db.applyAsDouble(fer);
    }
}
