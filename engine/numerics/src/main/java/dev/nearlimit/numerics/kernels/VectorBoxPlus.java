package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import dev.nearlimit.numerics.functions.BoxPlusCorrection;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * The box-plus operation of {@link LayeredFloatKernels#sumProduct} on vectors, in two passes. Magnitudes are compared as
 * integers, which order as the floats that they are: the minimum of floats takes several instructions, as it has to look
 * for NaN and -0.
 */
final class VectorBoxPlus {
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Integer> INTS = IntVector.SPECIES_PREFERRED;
    private static final int MAGNITUDE = 0x7fffffff;
    private static final int SIGN = 0x80000000;
    private static final int LIMIT_BITS = Float.floatToRawIntBits(BoxPlusCorrection.LIMIT);

    private VectorBoxPlus() {}

    /** result = a (+) b on {@code lanes} values, a multiple of 64; the result may be in the place of an operand. */
    static void combine(float[] a, int aAt, float[] b, int bAt, float[] result, int resultAt, int lanes) {
        FloatVector c5 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C5);
        FloatVector c4 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C4);
        FloatVector c3 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C3);
        FloatVector c2 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C2);
        FloatVector c1 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C1);
        FloatVector c0 = FloatVector.broadcast(FLOATS, BoxPlusCorrection.C0);
        IntVector magnitudes = IntVector.broadcast(INTS, MAGNITUDE);
        IntVector signs = IntVector.broadcast(INTS, SIGN);
        IntVector limit = IntVector.broadcast(INTS, LIMIT_BITS);
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            FloatVector x = FloatVector.fromArray(FLOATS, a, aAt + l);
            FloatVector y = FloatVector.fromArray(FLOATS, b, bAt + l);
            FloatVector s = x.add(y)
                    .reinterpretAsInts()
                    .lanewise(AND, magnitudes)
                    .min(limit)
                    .reinterpretAsFloats();
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
            u = u.mul(u);
            s = x.sub(y)
                    .reinterpretAsInts()
                    .lanewise(AND, magnitudes)
                    .min(limit)
                    .reinterpretAsFloats();
            FloatVector v = s.mul(c5)
                    .add(c4)
                    .mul(s)
                    .add(c3)
                    .mul(s)
                    .add(c2)
                    .mul(s)
                    .add(c1)
                    .mul(s)
                    .add(c0);
            v = v.mul(v);
            v = v.mul(v);
            v = v.mul(v);
            IntVector i = x.reinterpretAsInts();
            IntVector j = y.reinterpretAsInts();
            IntVector magnitude = i.lanewise(AND, magnitudes).min(j.lanewise(AND, magnitudes));
            i.lanewise(XOR, j)
                    .lanewise(AND, signs)
                    .lanewise(OR, magnitude)
                    .reinterpretAsFloats()
                    .add(u.sub(v))
                    .intoArray(result, resultAt + l);
        }
    }
}
