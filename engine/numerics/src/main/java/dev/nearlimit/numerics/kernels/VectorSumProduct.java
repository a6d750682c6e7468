package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.OR;

import java.util.Arrays;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Layered sum-product, in passes over a block of a run whose values stay in the first-level cache. Scratch memory holds a
 * row for each t, then for each F, then one for B; new messages take the place of the old ones at the very end, after the
 * t that they are added to. Each pass is a method of its own: one long method falls past the limit of the JIT's inlining
 * and boxes its vectors.
 */
final class VectorSumProduct {
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int MAGNITUDE = 0x7fffffff;
    private static final int SIGN = 0x80000000;

    private VectorSumProduct() {}

    static void update(CheckRun run, float largest, float[] posterior, float[] message, float[] scratch) {
        int[] bits = run.bits();
        for (int from = 0; from < run.lanes(); from += LayeredFloatKernels.MOST_LANES) {
            int block = Math.min(LayeredFloatKernels.MOST_LANES, run.lanes() - from);
            int messages = run.messages() + from;
            for (int i = 0; i < bits.length; i++) {
                read(posterior, bits[i] + from, message, messages + i * run.lanes(), scratch, i * block, block);
            }
            if (bits.length == 1) {
                Arrays.fill(scratch, block, 2 * block, largest);
            } else {
                combine(bits.length, scratch, block);
            }
            for (int i = 0; i < bits.length; i++) {
                send(
                        scratch,
                        i * block,
                        (bits.length + i) * block,
                        largest,
                        message,
                        messages + i * run.lanes(),
                        posterior,
                        bits[i] + from,
                        block);
            }
        }
    }

    private static void read(
            float[] posterior, int bits, float[] message, int messages, float[] scratch, int at, int lanes) {
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            FloatVector.fromArray(FLOATS, posterior, bits + l)
                    .sub(FloatVector.fromArray(FLOATS, message, messages + l))
                    .intoArray(scratch, at + l);
        }
    }

    /** Leaves the message to edge i in row d + i. */
    private static void combine(int d, float[] scratch, int lanes) {
        int forward = d * lanes; // row d + i holds F_(i-1) until the message takes its place
        int backward = 2 * d * lanes;
        int work = backward + lanes;
        System.arraycopy(scratch, 0, scratch, forward + lanes, lanes);
        for (int i = 1; i <= d - 2; i++) {
            VectorBoxPlus.combine(
                    scratch,
                    forward + i * lanes,
                    scratch,
                    i * lanes,
                    scratch,
                    forward + (i + 1) * lanes,
                    lanes,
                    scratch,
                    work);
        }
        System.arraycopy(scratch, (d - 1) * lanes, scratch, backward, lanes);
        for (int i = d - 2; i >= 1; i--) {
            int row = forward + i * lanes;
            VectorBoxPlus.combine(scratch, row, scratch, backward, scratch, row, lanes, scratch, work);
            VectorBoxPlus.combine(scratch, backward, scratch, i * lanes, scratch, backward, lanes, scratch, work);
        }
        System.arraycopy(scratch, backward, scratch, forward, lanes);
    }

    private static void send(
            float[] scratch,
            int read,
            int made,
            float largest,
            float[] message,
            int messages,
            float[] posterior,
            int bits,
            int lanes) {
        int largestBits = Float.floatToRawIntBits(largest);
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            IntVector m = FloatVector.fromArray(FLOATS, scratch, made + l).reinterpretAsInts();
            // As in VectorBoxPlus, magnitudes are compared as integers.
            FloatVector limited = m.lanewise(AND, MAGNITUDE)
                    .min(largestBits)
                    .lanewise(OR, m.lanewise(AND, SIGN))
                    .reinterpretAsFloats();
            limited.intoArray(message, messages + l);
            FloatVector.fromArray(FLOATS, scratch, read + l).add(limited).intoArray(posterior, bits + l);
        }
    }
}
