package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.ASHR;
import static jdk.incubator.vector.VectorOperators.I2B;
import static jdk.incubator.vector.VectorOperators.I2F;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorShape;
import jdk.incubator.vector.VectorSpecies;

/**
 * The passes with the Vector API, bit for bit those of {@link PlainReceptionKernels}. Java 17 has no SIMD conversion from
 * float to int; adding 2^23 to a float of 0 .. 2^22 leaves the nearest integer in its lowest bits, ties to even, and the
 * difference to the float as it was says how to correct that, exactly.
 */
final class VectorReceptionKernels implements ReceptionKernels {
    private static final VectorSpecies<Integer> INTS = IntVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int LANES = 64;
    private static final int SIGN = 0x80000000;
    private static final int ONE = 0x3f800000;
    private static final float TWO_TO_23 = 0x1p23f;
    private static final int BITS_OF_TWO_TO_23 = 0x4b000000;
    /** Shifts that bring bit j of an int to the sign of lane j. */
    private static final IntVector TO_SIGN =
            (IntVector) INTS.broadcast(31).sub(IntVector.zero(INTS).addIndex(1));

    /** Whether levels of one vector of floats fill a vector of bytes; in registers of 128 bits they do not. */
    static boolean fits() {
        return INTS.vectorBitSize() >= 256;
    }

    /** Apart, since there is no such shape where this class does not fit. */
    private static final class Levels {
        private static final VectorSpecies<Byte> SPECIES =
                VectorSpecies.of(byte.class, VectorShape.forBitSize(INTS.vectorBitSize() / Integer.BYTES));

        private static void put(IntVector levels, byte[] bytes, int at) {
            ((ByteVector) levels.convertShape(I2B, SPECIES, 0)).intoArray(bytes, at);
        }
    }

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
            for (int i = 0; i < count; i += FLOATS.length()) {
                // Dividing by a power of two and multiplying by its inverse give the same.
                FloatVector x = FloatVector.fromArray(FLOATS, values, at + i);
                tread(x, x.mul(1f / step), step, rail, values, at + i, levels, levelsAt + i);
            }
        } else {
            for (int i = 0; i < count; i += FLOATS.length()) {
                FloatVector x = FloatVector.fromArray(FLOATS, values, at + i);
                tread(x, x.div(step), step, rail, values, at + i, levels, levelsAt + i);
            }
        }
    }

    private static boolean isPowerOfTwo(float step) {
        return (Float.floatToRawIntBits(step) & 0x7FFFFF) == 0 && 1f / step < Float.POSITIVE_INFINITY;
    }

    private static void tread(
            FloatVector x, FloatVector steps, float step, int rail, float[] values, int at, byte[] levels, int i) {
        FloatVector y = magnitude(steps, rail);
        FloatVector sum = y.add(TWO_TO_23);
        // A tie that went down to an even number is what is left of exactly 1/2: it goes up.
        IntVector up = y.sub(sum.sub(TWO_TO_23)).sub(0.5f).viewAsIntegralLanes().lanewise(ASHR, 31);
        IntVector magnitude =
                sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23 - 1).add(up);
        put(withSign(magnitude, x), step, values, at, levels, i);
    }

    @Override
    public void midRise(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt) {
        for (int i = 0; i < count; i += FLOATS.length()) {
            FloatVector x = FloatVector.fromArray(FLOATS, values, at + i);
            FloatVector y = magnitude(x.div(step), rail);
            FloatVector sum = y.add(TWO_TO_23);
            // What was rounded up goes back down.
            IntVector down = y.sub(sum.sub(TWO_TO_23)).viewAsIntegralLanes().lanewise(ASHR, 31);
            IntVector whole = sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23).add(down);
            put(withSign(whole.add(whole).add(1), x), step * 0.5f, values, at + i, levels, levelsAt + i);
        }
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

    private static void put(IntVector level, float unit, float[] values, int at, byte[] levels, int i) {
        ((FloatVector) level.convert(I2F, 0)).mul(unit).intoArray(values, at);
        Levels.put(level, levels, i);
    }
}
