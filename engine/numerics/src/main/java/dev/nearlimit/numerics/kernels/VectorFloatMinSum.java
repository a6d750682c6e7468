package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.GT;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Layered min-sum in single precision, by the two least magnitudes of a row, in three passes as {@link ByteMinSum}.
 * Magnitudes are compared as integers, which order as the floats that they are: the minimum of floats takes several
 * instructions, as it has to look for NaN and -0.
 */
final class VectorFloatMinSum {
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Integer> INTS = IntVector.SPECIES_PREFERRED;
    private static final int MAGNITUDE = 0x7fffffff;
    private static final int SIGN = 0x80000000;
    private static final int FRAMES = 64;
    private static final int INFINITY = 0x7f800000;

    private VectorFloatMinSum() {}

    static void update(CheckRun run, FloatCorrection correction, float[] posterior, float[] message, float[] scratch) {
        int[] bits = run.bits();
        // A check of weight 1 sends the largest message, corrected.
        int start = bits.length == 1 ? Float.floatToRawIntBits(correction.largest()) : INFINITY;
        for (int from = 0; from < run.lanes(); from += LayeredFloatKernels.MOST_LANES) {
            int block = Math.min(LayeredFloatKernels.MOST_LANES, run.lanes() - from);
            int messages = run.messages() + from;
            int minima = bits.length * block;
            read(bits, from, block, posterior, message, messages, run.lanes(), scratch, start);
            correct(scratch, minima, block, correction.factor(), correction.offset(), correction.largest());
            send(bits, from, block, posterior, message, messages, run.lanes(), scratch);
        }
    }

    /** Leaves t of every edge, then a row each of the least magnitude, the second, and the product of the signs. */
    private static void read(
            int[] bits,
            int from,
            int lanes,
            float[] posterior,
            float[] message,
            int messages,
            int stride,
            float[] scratch,
            int start) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            IntVector least = IntVector.broadcast(INTS, start);
            IntVector second = least;
            IntVector sign = IntVector.zero(INTS);
            for (int i = 0; i < bits.length; i++) {
                FloatVector t = FloatVector.fromArray(FLOATS, posterior, bits[i] + from + l)
                        .sub(FloatVector.fromArray(FLOATS, message, messages + i * stride + l));
                t.intoArray(scratch, i * lanes + l);
                IntVector word = t.reinterpretAsInts();
                IntVector magnitude = word.lanewise(AND, MAGNITUDE);
                sign = sign.lanewise(XOR, word);
                second = second.min(least.max(magnitude));
                least = least.min(magnitude);
            }
            least.reinterpretAsFloats().intoArray(scratch, minima + l);
            second.reinterpretAsFloats().intoArray(scratch, minima + lanes + l);
            sign.reinterpretAsFloats().intoArray(scratch, minima + 2 * lanes + l);
        }
    }

    /**
     * Corrects what is sent: the second magnitude in its place, the least in a fourth row, since edges are told apart by
     * the least as it was.
     */
    private static void correct(float[] scratch, int minima, int lanes, float factor, float offset, float largest) {
        int offsetBits = Float.floatToRawIntBits(offset);
        int largestBits = Float.floatToRawIntBits(largest);
        for (int l = minima; l < minima + lanes; l += FLOATS.length()) {
            FloatVector m = FloatVector.fromArray(FLOATS, scratch, l).mul(factor);
            m = m.sub(m.reinterpretAsInts().min(offsetBits).reinterpretAsFloats());
            m.reinterpretAsInts().min(largestBits).reinterpretAsFloats().intoArray(scratch, l + 3 * lanes);
            m = FloatVector.fromArray(FLOATS, scratch, l + lanes).mul(factor);
            m = m.sub(m.reinterpretAsInts().min(offsetBits).reinterpretAsFloats());
            m.reinterpretAsInts().min(largestBits).reinterpretAsFloats().intoArray(scratch, l + lanes);
        }
    }

    private static void send(
            int[] bits,
            int from,
            int lanes,
            float[] posterior,
            float[] message,
            int messages,
            int stride,
            float[] scratch) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            IntVector least = FloatVector.fromArray(FLOATS, scratch, minima + l).reinterpretAsInts();
            IntVector fromSecond =
                    FloatVector.fromArray(FLOATS, scratch, minima + lanes + l).reinterpretAsInts();
            IntVector sign = FloatVector.fromArray(FLOATS, scratch, minima + 2 * lanes + l)
                    .reinterpretAsInts();
            IntVector fromLeast = FloatVector.fromArray(FLOATS, scratch, minima + 3 * lanes + l)
                    .reinterpretAsInts();
            for (int i = 0; i < bits.length; i++) {
                FloatVector t = FloatVector.fromArray(FLOATS, scratch, i * lanes + l);
                IntVector word = t.reinterpretAsInts();
                // Where two edges share the least magnitude both choices are equal.
                FloatVector m = fromSecond
                        .blend(fromLeast, word.lanewise(AND, MAGNITUDE).compare(GT, least))
                        .lanewise(OR, sign.lanewise(XOR, word).lanewise(AND, SIGN))
                        .reinterpretAsFloats();
                m.intoArray(message, messages + i * stride + l);
                t.add(m).intoArray(posterior, bits[i] + from + l);
            }
        }
    }

    static void addUnsatisfied(CheckRun run, float[] posterior, float[] found) {
        int[] bits = run.bits();
        for (int l = 0; l < run.lanes(); l += FLOATS.length()) {
            IntVector sum = IntVector.zero(INTS);
            for (int i = 0; i < bits.length; i++) {
                sum = sum.lanewise(
                        XOR,
                        FloatVector.fromArray(FLOATS, posterior, bits[i] + l).reinterpretAsInts());
            }
            sum = sum.lanewise(AND, SIGN);
            FloatVector.fromArray(FLOATS, found, l % FRAMES)
                    .reinterpretAsInts()
                    .lanewise(OR, sum)
                    .reinterpretAsFloats()
                    .intoArray(found, l % FRAMES);
        }
    }
}
