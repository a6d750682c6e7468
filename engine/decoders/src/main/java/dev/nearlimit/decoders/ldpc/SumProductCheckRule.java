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
    void combine(float[] a, float[] b, float[] result, int lanes) {
        // Short passes, since the JIT does not unroll, and so makes no SIMD of, one long loop body.
        distances(a, b, ofSum, ofDifference, lanes);
        BoxPlusCorrection.replace(ofSum, lanes);
        BoxPlusCorrection.replace(ofDifference, lanes);
        correct(a, b, ofSum, ofDifference, result, lanes);
    }

    private static void distances(float[] a, float[] b, float[] ofSum, float[] ofDifference, int lanes) {
        for (int f = 0; f < lanes; f++) {
            ofSum[f] = Math.abs(a[f] + b[f]);
            ofDifference[f] = Math.abs(a[f] - b[f]);
        }
    }

    private static void correct(float[] a, float[] b, float[] ofSum, float[] ofDifference, float[] result, int lanes) {
        for (int f = 0; f < lanes; f++) {
            result[f] = MinSumCheckRule.lesser(a[f], b[f]) + (ofSum[f] - ofDifference[f]);
        }
    }

    @Override
    void finish(float[] message, int lanes) {
        // Nothing to correct.
    }
}
