package dev.nearlimit.limits;

/**
 * A uniform quantiser of log-likelihood ratios, as the set of LLRs at which its output changes. It rounds half away from
 * zero and saturates at its outermost levels; which side a threshold itself belongs to does not matter to a limit, since
 * LLRs are continuous.
 *
 * @param wordBits b: 2 .. 8 for mid-tread, 1 .. 7 for mid-rise
 * @param step distance of neighbouring levels in LLR units (nats), above 0 and at most 10000; without meaning where
 *     b = 1, since the sign has no step
 * @param rise where the levels are
 */
public record UniformLlrQuantiser(int wordBits, double step, QuantiserRise rise) {
    /** Beyond any LLR that a receiver computes. */
    private static final double MOST_STEP = 1e4;

    public UniformLlrQuantiser {
        requireWord(wordBits, rise);
        if (!(step > 0 && step <= MOST_STEP)) {
            throw new InvalidLimitException(
                    "step of the quantiser is " + step + ", must be above 0 and at most " + (int) MOST_STEP);
        }
    }

    /**
     * A quantiser by the value of its outermost level: step is clip / (2^(b-1)-1), or 2 clip / (2^b-1) for mid-rise.
     *
     * @param clip magnitude of the outermost level in LLR units, above 0
     */
    public static UniformLlrQuantiser ofClip(int wordBits, double clip, QuantiserRise rise) {
        requireWord(wordBits, rise);
        if (!(clip > 0 && clip <= MOST_STEP)) {
            throw new InvalidLimitException(
                    "clip of the quantiser is " + clip + ", must be above 0 and at most " + (int) MOST_STEP);
        }
        double step =
                rise == QuantiserRise.MID_TREAD ? clip / ((1 << (wordBits - 1)) - 1) : 2 * clip / ((1 << wordBits) - 1);
        return new UniformLlrQuantiser(wordBits, step, rise);
    }

    static void requireWord(int wordBits, QuantiserRise rise) {
        if (wordBits < rise.leastBits() || wordBits > rise.mostBits()) {
            throw new InvalidLimitException("word of a " + rise.designator() + " quantiser is " + wordBits
                    + " bits, must be " + rise.leastBits() + ".." + rise.mostBits());
        }
    }

    /** Whether the step matters: not to a quantiser that keeps only the sign. */
    public boolean hasStep() {
        return wordBits > 1;
    }

    /** Thresholds above 0: 2^(b-1)-1 of them, for both rises. */
    int positiveThresholds() {
        return (1 << (wordBits - 1)) - 1;
    }

    /** The threshold of that number, from 1 upwards; negative ones mirror them. */
    double threshold(int number) {
        return rise == QuantiserRise.MID_TREAD ? (number - 0.5) * step : number * step;
    }
}
