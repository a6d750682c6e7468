package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import dev.nearlimit.numerics.functions.BoxPlusCorrection;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * The box-plus operation of {@link LayeredFloatKernels#sumProduct} on vectors. Magnitudes are compared as integers, which
 * order as the floats that they are: the minimum of floats takes several instructions, as it has to look for NaN and -0.
 */
final class VectorBoxPlus {
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int MAGNITUDE = 0x7fffffff;
    private static final int SIGN = 0x80000000;
    private static final int LIMIT_BITS = Float.floatToRawIntBits(BoxPlusCorrection.LIMIT);

    private VectorBoxPlus() {}

    /** result = a (+) b on {@code lanes} values, a multiple of 64; the result may be in the place of an operand. */
    static void combine(float[] a, int aAt, float[] b, int bAt, float[] result, int resultAt, int lanes) {
        for (int l = 0; l < lanes; l += FLOATS.length()) {
            FloatVector x = FloatVector.fromArray(FLOATS, a, aAt + l);
            FloatVector y = FloatVector.fromArray(FLOATS, b, bAt + l);
            FloatVector change = correction(x.add(y)).sub(correction(x.sub(y)));
            lesser(x.reinterpretAsInts(), y.reinterpretAsInts()).add(change).intoArray(result, resultAt + l);
        }
    }

    /** sign(a) sign(b) min(|a|, |b|) of the bits of two floats; its zeros have the product of the signs as well. */
    private static FloatVector lesser(IntVector a, IntVector b) {
        IntVector magnitude = a.lanewise(AND, MAGNITUDE).min(b.lanewise(AND, MAGNITUDE));
        return a.lanewise(XOR, b).lanewise(AND, SIGN).lanewise(OR, magnitude).reinterpretAsFloats();
    }

    /** {@link BoxPlusCorrection#of} of |x|, the same operations in the same order. */
    static FloatVector correction(FloatVector x) {
        FloatVector y =
                x.reinterpretAsInts().lanewise(AND, MAGNITUDE).min(LIMIT_BITS).reinterpretAsFloats();
        FloatVector u = y.mul(BoxPlusCorrection.C5)
                .add(BoxPlusCorrection.C4)
                .mul(y)
                .add(BoxPlusCorrection.C3)
                .mul(y)
                .add(BoxPlusCorrection.C2)
                .mul(y)
                .add(BoxPlusCorrection.C1)
                .mul(y)
                .add(BoxPlusCorrection.C0);
        u = u.mul(u);
        u = u.mul(u);
        return u.mul(u);
    }
}
