package dev.nearlimit.decoders.ldpc;

import java.util.Arrays;

/**
 * A check rule made of an operation on two LLRs, that of their modulo-2 sum, applied forward and backward along the row.
 * With t_0 .. t_(d-1) in ascending column order and (+) the operation:
 *
 * <pre>
 * F_0 = t_0,                F_i = F_(i-1) (+) t_i       for i = 1 .. d-2
 * B_(d-1) = t_(d-1),        B_i = B_(i+1) (+) t_i       for i = d-2 .. 1
 * m_0 = B_1,  m_i = F_(i-1) (+) B_(i+1),  m_(d-1) = F_(d-2)
 * </pre>
 *
 * A row of weight 1 sends the largest message.
 */
abstract class PairwiseCheckRule implements FloatCheckRule {
    private final float[] forward;
    private final float[] backward;

    PairwiseCheckRule(int largestDegree, int lanes) {
        this.forward = new float[largestDegree * lanes];
        this.backward = new float[lanes];
    }

    @Override
    public final void apply(float[] incoming, int degree, int lanes, float[] message, int from) {
        if (degree == 1) {
            Arrays.fill(message, from, from + lanes, FloatBeliefPropagation.LARGEST);
            finish(message, from, lanes);
            return;
        }
        System.arraycopy(incoming, 0, forward, 0, lanes);
        for (int i = 1; i <= degree - 2; i++) {
            combine(forward, (i - 1) * lanes, incoming, i * lanes, forward, i * lanes, lanes);
        }
        int last = degree - 1;
        System.arraycopy(forward, (last - 1) * lanes, message, from + last * lanes, lanes);
        System.arraycopy(incoming, last * lanes, backward, 0, lanes);
        for (int i = degree - 2; i >= 1; i--) {
            combine(forward, (i - 1) * lanes, backward, 0, message, from + i * lanes, lanes);
            combine(backward, 0, incoming, i * lanes, backward, 0, lanes);
        }
        System.arraycopy(backward, 0, message, from, lanes);
        finish(message, from, degree * lanes);
    }

    /** The operation on {@code lanes} pairs; the result may lie where the first operands lie. */
    abstract void combine(float[] a, int aFrom, float[] b, int bFrom, float[] result, int from, int lanes);

    /** What is done to every message at the end. */
    abstract void finish(float[] message, int from, int count);
}
