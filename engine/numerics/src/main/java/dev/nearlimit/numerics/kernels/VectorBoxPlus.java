package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import dev.nearlimit.numerics.functions.BoxPlusCorrection;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * The box-plus operation of {@link LayeredFloatKernels#sumProduct} on vectors, in three passes, since one
 * of all its operations makes the JIT box vectors. Magnitudes are compared as
 * integers, which order as the floats that they are: the minimum of floats takes several instructions, as it has to look
 * for NaN and -0.
 */
final class VectorBoxPlus {
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int MAGNITUDE = 0x7fffffff;
    private static final int SIGN = 0x80000000;
    private static final int LIMIT_BITS = Float.floatToRawIntBits(BoxPlusCorrection.LIMIT);

    private VectorBoxPlus() {}

    /**
     * result = a (+) b on {@code lanes} values, a multiple of 64; the result may be in the place of an operand.
     *
     * @param work 2 * lanes values from {@code workAt} on whose contents do not matter
     */
    static void combine(
            float[] a, int aAt, float[] b, int bAt, float[] result, int resultAt, int lanes, float[] work, int workAt) {
        distances(a, aAt, b, bAt, work, workAt, lanes);
        correct(work, workAt, 2 * lanes);
        join(a, aAt, b, bAt, work, workAt, result, resultAt, lanes);
    }

    /** |a + b| and, beyond them, |a - b|, as far as the correction reaches. */
    private static void distances(float[] a, int aAt, float[] b, int bAt, float[] work, int at, int lanes) {
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            FloatVector x = FloatVector.fromArray(FLOATS, a, aAt + l);
            FloatVector y = FloatVector.fromArray(FLOATS, b, bAt + l);
            x.add(y)
                    .reinterpretAsInts()
                    .lanewise(AND, MAGNITUDE)
                    .min(LIMIT_BITS)
                    .reinterpretAsFloats()
                    .intoArray(work, at + l);
            x.sub(y)
                    .reinterpretAsInts()
                    .lanewise(AND, MAGNITUDE)
                    .min(LIMIT_BITS)
                    .reinterpretAsFloats()
                    .intoArray(work, at + lanes + l);
        }
    }

    private static void correct(float[] work, int at, int lanes) {
        FloatVector c5 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C5);
        FloatVector c4 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C4);
        FloatVector c3 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C3);
        FloatVector c2 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C2);
        FloatVector c1 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C1);
        FloatVector c0 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C0);
        for (int l = at; l < at + lanes; l += FLOATS.length()) {
            FloatVector s = FloatVector.fromArray(FLOATS, work, l);
            FloatVector u = s.mul(c5)
                    .add(c4)
                    .mul(s)
                    .add(c3)
                    .mul(s)
                    .add(c2)
                    .mul(s)
                    .add(c1)
                    .mul(s)
                    .add(c0);
            u = u.mul(u);
            u = u.mul(u);
            u.mul(u).intoArray(work, l);
        }
    }

    private static void join(
            float[] a, int aAt, float[] b, int bAt, float[] work, int workAt, float[] result, int resultAt, int lanes) {
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            IntVector i = FloatVector.fromArray(FLOATS, a, aAt + l).reinterpretAsInts();
            IntVector j = FloatVector.fromArray(FLOATS, b, bAt + l).reinterpretAsInts();
            FloatVector correction = FloatVector.fromArray(FLOATS, work, workAt + l)
                    .sub(FloatVector.fromArray(FLOATS, work, workAt + lanes + l));
            IntVector magnitude = i.lanewise(AND, MAGNITUDE).min(j.lanewise(AND, MAGNITUDE));
            i.lanewise(XOR, j)
                    .lanewise(AND, SIGN)
                    .lanewise(OR, magnitude)
                    .reinterpretAsFloats()
                    .add(correction)
                    .intoArray(result, resultAt + l);
        }
    }
}
