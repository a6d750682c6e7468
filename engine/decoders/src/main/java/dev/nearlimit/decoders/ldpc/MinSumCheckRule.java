package dev.nearlimit.decoders.ldpc;

/**
 * Min-sum in single precision: the lesser magnitude with the product of the signs, then the correction of
 * {@link MagnitudeCorrection}, m * (j * 0.125f) or m - max(-b, min(b, m)), which is the magnitude less b, not below 0.
 */
final class MinSumCheckRule extends PairwiseCheckRule {
    private final float factor;
    private final float offset;

    MinSumCheckRule(MagnitudeCorrection correction, int largestDegree, int lanes) {
        super(largestDegree, lanes);
        this.factor = correction instanceof MagnitudeCorrection.Scale scale ? scale.eighths() * 0.125f : 1f;
        this.offset = correction instanceof MagnitudeCorrection.Offset by ? by.amount() : 0f;
    }

    @Override
    void combine(float[] a, float[] b, float[] result, int lanes) {
        for (int f = 0; f < lanes; f++) {
            result[f] = lesser(a[f], b[f]);
        }
    }

    /** sign(a) sign(b) min(|a|, |b|), with no look at the signs: one of the two terms is it, the other lies below. */
    static float lesser(float a, float b) {
        return Math.max(Math.min(a, b), -Math.max(a, b));
    }

    @Override
    void finish(float[] message, int lanes) {
        if (offset > 0f) {
            subtractOffset(message, offset, lanes);
        } else if (factor != 1f) {
            multiply(message, factor, lanes);
        }
    }

    private static void subtractOffset(float[] message, float offset, int lanes) {
        for (int f = 0; f < lanes; f++) {
            float m = message[f];
            message[f] = m - Math.max(-offset, Math.min(offset, m));
        }
    }

    private static void multiply(float[] message, float factor, int lanes) {
        for (int f = 0; f < lanes; f++) {
            message[f] *= factor;
        }
    }
}
