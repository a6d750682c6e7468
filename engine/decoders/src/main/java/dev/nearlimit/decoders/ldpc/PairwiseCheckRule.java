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
    private final float[][] forward;
    private final float[] backward;

    PairwiseCheckRule(int largestDegree, int lanes) {
        this.forward = new float[largestDegree][lanes];
        this.backward = new float[lanes];
    }

    @Override
    public final void apply(float[][] incoming, int degree, int lanes, float[][] message, int first) {
        if (degree == 1) {
            Arrays.fill(message[first], 0, lanes, FloatBeliefPropagation.LARGEST);
            finish(message[first], lanes);
            return;
        }
        System.arraycopy(incoming[0], 0, forward[0], 0, lanes);
        for (int i = 1; i <= degree - 2; i++) {
            combine(forward[i - 1], incoming[i], forward[i], lanes);
        }
        int last = degree - 1;
        System.arraycopy(forward[last - 1], 0, message[first + last], 0, lanes);
        System.arraycopy(incoming[last], 0, backward, 0, lanes);
        for (int i = last - 1; i >= 1; i--) {
            combine(forward[i - 1], backward, message[first + i], lanes);
            combine(backward, incoming[i], backward, lanes);
        }
        System.arraycopy(backward, 0, message[first], 0, lanes);
        for (int i = 0; i < degree; i++) {
            finish(message[first + i], lanes);
        }
    }

    /** The operation on {@code lanes} pairs; the result may be the array of the first operands. */
    abstract void combine(float[] a, float[] b, float[] result, int lanes);

    /** What is done to every message at the end. */
    abstract void finish(float[] message, int lanes);
}
