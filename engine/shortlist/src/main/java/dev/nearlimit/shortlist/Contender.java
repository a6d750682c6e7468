package dev.nearlimit.shortlist;

import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.limits.BinaryInputAwgn;
import dev.nearlimit.limits.HardDecisionAwgn;
import dev.nearlimit.limits.InvalidLimitException;
import dev.nearlimit.limits.NormalApproximation;
import dev.nearlimit.limits.ShannonLimit;
import dev.nearlimit.shortlist.evaluation.PayloadFit;
import dev.nearlimit.shortlist.result.SchemeResult.Limits;

/**
 * A code fitted to the payload with one decoder, and the limits at the rate that comes of it. Which modulation carries
 * it is still open: BPSK and QPSK need the same Eb/N0.
 *
 * @param family the code's family
 * @param fit the code as it carries the payload
 * @param choice decoder and quantiser
 * @param limits limits at the payload's rate and length
 */
record Contender(String family, PayloadFit fit, DecoderChoice choice, Limits limits) {

    static Contender of(String family, PayloadFit fit, DecoderChoice choice) {
        double rate = fit.rate();
        return new Contender(
                family,
                fit,
                choice,
                new Limits(
                        ShannonLimit.leastEbn0Db(rate),
                        BinaryInputAwgn.leastEbn0Db(rate),
                        HardDecisionAwgn.leastEbn0Db(rate),
                        normalApproximation(fit)));
    }

    private static Double normalApproximation(PayloadFit fit) {
        try {
            return NormalApproximation.leastEbn0Db(fit.bitsSent(), fit.payloadBits(), fit.payloadFer());
        } catch (InvalidLimitException e) {
            // It does not exist for every length and error rate; the result says so by leaving it out.
            return null;
        }
    }

    /**
     * An Eb/N0 below which no code of this rate and length reaches the payload's error rate with this kind of decoder [dB]
     * (Fano's inequality: C >= R (1 - F) - h(F) / n, n being all bits sent for a payload); -infinity where it rules
     * nothing out.
     */
    double provenLimitDb() {
        double fer = fit.payloadFer();
        double entropy = -(fer * Math.log(fer) + (1 - fer) * Math.log1p(-fer)) / Math.log(2);
        double capacity = fit.rate() * (1 - fer) - entropy / fit.bitsSent();
        if (capacity <= 0) {
            return Double.NEGATIVE_INFINITY;
        }
        double esn0 = choice.decoder().hardDecision()
                ? HardDecisionAwgn.leastEsn0(capacity)
                : BinaryInputAwgn.leastEsn0(capacity);
        return 10 * Math.log10(esn0 / fit.rate());
    }

    /** Operations per payload bit if every codeword takes the most iterations. */
    double worstCaseOperationsPerBit() {
        return operationsPerBit(choice.decoder().maxIterations()).total();
    }

    dev.nearlimit.decoders.OperationCount operationsPerBit(double iterations) {
        return choice.decoder()
                .operationsPerFrame(fit.code(), iterations)
                .times((double) fit.codewords() / fit.payloadBits());
    }

    String describe() {
        return fit.code().designator() + " with " + choice.decoder().designator();
    }
}
