package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.numerics.functions.BoxPlusCorrection;

/**
 * The box-plus operation of Hagenauer, Offer and Papke 1996, "Iterative decoding of binary block and convolutional
 * codes", in the form of a minimum with two corrections (Chen, Dholakia, Eleftheriou, Fossorier and Hu 2005):
 *
 * <pre>a (+) b = sign(a) sign(b) min(|a|, |b|) + (f(|a + b|) - f(|a - b|)),   f(x) = ln(1 + e^-x)</pre>
 *
 * with {@link BoxPlusCorrection} for f, every operation rounded to single precision in the order written. One operation
 * is off from the exact box-plus of its operands by at most twice that function's error and two roundings of the result.
 */
final class SumProductCheckRule extends PairwiseCheckRule {
    private final float[] ofSum;
    private final float[] ofDifference;

    SumProductCheckRule(int largestDegree, int lanes) {
        super(largestDegree, lanes);
        this.ofSum = new float[lanes];
        this.ofDifference = new float[lanes];
    }

    @Override
    void combine(float[] a, int aFrom, float[] b, int bFrom, float[] result, int from, int lanes) {
        // Three short passes, since the JIT does not unroll, and so makes no SIMD of, one long loop body.
        distances(a, aFrom, b, bFrom, lanes);
        BoxPlusCorrection.replace(ofSum, 0, lanes);
        BoxPlusCorrection.replace(ofDifference, 0, lanes);
        for (int f = 0; f < lanes; f++) {
            result[from + f] = MinSumCheckRule.lesser(a[aFrom + f], b[bFrom + f]) + (ofSum[f] - ofDifference[f]);
        }
    }

    private void distances(float[] a, int aFrom, float[] b, int bFrom, int lanes) {
        for (int f = 0; f < lanes; f++) {
            ofSum[f] = Math.abs(a[aFrom + f] + b[bFrom + f]);
            ofDifference[f] = Math.abs(a[aFrom + f] - b[bFrom + f]);
        }
    }

    @Override
    void finish(float[] message, int from, int count) {
        // Nothing to correct.
    }
}
