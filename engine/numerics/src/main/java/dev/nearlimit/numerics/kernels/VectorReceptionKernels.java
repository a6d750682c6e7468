package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.ASHR;
import static jdk.incubator.vector.VectorOperators.I2F;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorShuffle;
import jdk.incubator.vector.VectorSpecies;

/**
 * The passes with the Vector API, bit for bit those of {@link PlainReceptionKernels}. Java 17 has no SIMD conversion from
 * float to int; adding 2^23 to a float of 0 .. 2^22 leaves the nearest integer in its lowest bits, ties to even, and the
 * difference to the float as it was says how to correct that, exactly.
 *
 * <p>Bytes are never put into vectors of another shape than the preferred one: the JIT would then see two classes of
 * byte vectors where other kernels have one, know neither for sure, and box the vectors of all of them.
 */
final class VectorReceptionKernels implements ReceptionKernels {
    private static final VectorSpecies<Integer> INTS = IntVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int LANES = 64;
    private static final int SIGN = 0x80000000;
    private static final int ONE = 0x3f800000;
    private static final float TWO_TO_23 = 0x1p23f;
    private static final int BITS_OF_TWO_TO_23 = 0x4b000000;
    private static final VectorSpecies<Byte> BYTES = ByteVector.SPECIES_PREFERRED;
    /** Takes byte k of int j to place k * ints + j: four vectors' levels, put into ints one over the other, in order. */
    private static final VectorShuffle<Byte> IN_ORDER =
            VectorShuffle.fromOp(BYTES, p -> Integer.BYTES * (p % INTS.length()) + p / INTS.length());
    /** Shifts that bring bit j of an int to the sign of lane j. */
    private static final IntVector TO_SIGN =
            (IntVector) INTS.broadcast(31).sub(IntVector.zero(INTS).addIndex(1));

    @Override
    public void demap(long[] bits, int first, int positions, float sigma, float scale, float[] values, int at) {
        for (int p = 0; p < positions; p++) {
            demapPosition(bits[first + p], sigma, scale, values, at + p * LANES);
        }
    }

    private static void demapPosition(long word, float sigma, float scale, float[] values, int at) {
        for (int f = 0; f < LANES; f += INTS.length()) {
            FloatVector signal = IntVector.broadcast(INTS, (int) (word >>> f))
                    .lanewise(LSHL, TO_SIGN)
                    .lanewise(AND, SIGN)
                    .lanewise(OR, ONE)
                    .viewAsFloatingLanes();
            FloatVector.fromArray(FLOATS, values, at + f)
                    .mul(sigma)
                    .add(signal)
                    .mul(scale)
                    .intoArray(values, at + f);
        }
    }

    @Override
    public void midTread(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt) {
        if (isPowerOfTwo(step)) {
            for (int i = 0; i < count; i += BYTES.length()) {
                treadByInverse(values, at + i, 1f / step, step, rail, levels, levelsAt + i);
            }
        } else {
            for (int i = 0; i < count; i += BYTES.length()) {
                treadByDivision(values, at + i, step, rail, levels, levelsAt + i);
            }
        }
    }

    /** Dividing by a power of two and multiplying by its inverse give the same. */
    private static void treadByInverse(
            float[] values, int at, float inverse, float step, int rail, byte[] levels, int levelsAt) {
        IntVector bytes = IntVector.zero(INTS);
        for (int k = 0; k < Integer.BYTES; k++) {
            FloatVector x = FloatVector.fromArray(FLOATS, values, at + k * FLOATS.length());
            IntVector level = withSign(treadMagnitude(x.mul(inverse), rail), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }

    private static void treadByDivision(float[] values, int at, float step, int rail, byte[] levels, int levelsAt) {
        IntVector bytes = IntVector.zero(INTS);
        for (int k = 0; k < Integer.BYTES; k++) {
            FloatVector x = FloatVector.fromArray(FLOATS, values, at + k * FLOATS.length());
            IntVector level = withSign(treadMagnitude(x.div(step), rail), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }

    private static boolean isPowerOfTwo(float step) {
        return (Float.floatToRawIntBits(step) & 0x7FFFFF) == 0 && 1f / step < Float.POSITIVE_INFINITY;
    }

    private static IntVector treadMagnitude(FloatVector steps, int rail) {
        FloatVector y = magnitude(steps, rail);
        FloatVector sum = y.add(TWO_TO_23);
        // A tie that went down to an even number is what is left of exactly 1/2: it goes up.
        IntVector up = y.sub(sum.sub(TWO_TO_23)).sub(0.5f).viewAsIntegralLanes().lanewise(ASHR, 31);
        return sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23 - 1).add(up);
    }

    @Override
    public void midRise(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt) {
        for (int i = 0; i < count; i += BYTES.length()) {
            rise(values, at + i, step, rail, levels, levelsAt + i);
        }
    }

    private static void rise(float[] values, int at, float step, int rail, byte[] levels, int levelsAt) {
        IntVector bytes = IntVector.zero(INTS);
        for (int k = 0; k < Integer.BYTES; k++) {
            FloatVector x = FloatVector.fromArray(FLOATS, values, at + k * FLOATS.length());
            FloatVector y = magnitude(x.div(step), rail);
            FloatVector sum = y.add(TWO_TO_23);
            // What was rounded up goes back down.
            IntVector down = y.sub(sum.sub(TWO_TO_23)).viewAsIntegralLanes().lanewise(ASHR, 31);
            IntVector whole = sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23).add(down);
            IntVector level = withSign(whole.add(whole).add(1), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step * 0.5f).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }

    /** min(|steps|, rail), as integers: the order of floats that are not negative is that of their bits. */
    private static FloatVector magnitude(FloatVector steps, int rail) {
        return steps.viewAsIntegralLanes()
                .lanewise(AND, ~SIGN)
                .min(Float.floatToRawIntBits(rail))
                .viewAsFloatingLanes();
    }

    private static IntVector withSign(IntVector magnitude, FloatVector x) {
        // Adding +0 turns -0 into +0.
        IntVector sign = x.add(0f).viewAsIntegralLanes().lanewise(ASHR, 31);
        return magnitude.lanewise(XOR, sign).sub(sign);
    }
}
