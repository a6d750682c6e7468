package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.I2F;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.OR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorShuffle;
import jdk.incubator.vector.VectorSpecies;

/**
 * The passes with the Vector API, bit for bit those of {@link PlainReceptionKernels}.
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
            IntVector level = LaneMath.withSign(LaneMath.treadMagnitude(x.mul(inverse), rail), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }

    private static void treadByDivision(float[] values, int at, float step, int rail, byte[] levels, int levelsAt) {
        IntVector bytes = IntVector.zero(INTS);
        for (int k = 0; k < Integer.BYTES; k++) {
            FloatVector x = FloatVector.fromArray(FLOATS, values, at + k * FLOATS.length());
            IntVector level = LaneMath.withSign(LaneMath.treadMagnitude(x.div(step), rail), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }

    private static boolean isPowerOfTwo(float step) {
        return (Float.floatToRawIntBits(step) & 0x7FFFFF) == 0 && 1f / step < Float.POSITIVE_INFINITY;
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
            IntVector level = LaneMath.withSign(LaneMath.riseMagnitude(x.div(step), rail), x);
            ((FloatVector) level.convert(I2F, 0)).mul(step * 0.5f).intoArray(values, at + k * FLOATS.length());
            bytes = bytes.lanewise(LSHR, 8).lanewise(OR, level.lanewise(LSHL, 24));
        }
        bytes.reinterpretAsBytes().rearrange(IN_ORDER).intoArray(levels, levelsAt);
    }
}
