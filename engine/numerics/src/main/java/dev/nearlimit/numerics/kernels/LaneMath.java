package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.ASHR;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.ShortVector;

/**
 * Functions on whole vectors, the pieces of which passes are made. The launcher has the JIT inline every method here,
 * and none of the passes into anything: a call that hands over a vector makes an object of it.
 *
 * <p>Java 17 has no SIMD conversion from float to int; adding 2^23 to a float of 0 .. 2^22 leaves the nearest integer in
 * its lowest bits, ties to even, and the difference to the float as it was says how to correct that, exactly.
 */
final class LaneMath {
    private static final int SIGN = 0x80000000;
    private static final float TWO_TO_23 = 0x1p23f;
    private static final int BITS_OF_TWO_TO_23 = 0x4b000000;

    private LaneMath() {}

    /** As in {@link PlainNoiseKernels}. */
    static FloatVector sine(FloatVector t, FloatVector t2) {
        return t2.mul(-1.9515295891E-4f)
                .add(8.3321608736E-3f)
                .mul(t2)
                .add(-1.6666654611E-1f)
                .mul(t2)
                .mul(t)
                .add(t);
    }

    /** As in {@link PlainNoiseKernels}. */
    static FloatVector cosine(FloatVector t2) {
        return t2.mul(2.443315711809948E-5f)
                .add(-1.388731625493765E-3f)
                .mul(t2)
                .add(4.166664568298827E-2f)
                .mul(t2)
                .mul(t2)
                .sub(t2.mul(0.5f))
                .add(1f);
    }
    /** min(|steps|, rail) rounded half up. */
    static IntVector treadMagnitude(FloatVector steps, int rail) {
        FloatVector y = magnitude(steps, rail);
        FloatVector sum = y.add(TWO_TO_23);
        // A tie that went down to an even number is what is left of exactly 1/2: it goes up.
        IntVector up = y.sub(sum.sub(TWO_TO_23)).sub(0.5f).viewAsIntegralLanes().lanewise(ASHR, 31);
        return sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23 - 1).add(up);
    }

    /** 2i + 1 with i the whole part of min(|steps|, rail). */
    static IntVector riseMagnitude(FloatVector steps, int rail) {
        FloatVector y = magnitude(steps, rail);
        FloatVector sum = y.add(TWO_TO_23);
        // What was rounded up goes back down.
        IntVector down = y.sub(sum.sub(TWO_TO_23)).viewAsIntegralLanes().lanewise(ASHR, 31);
        IntVector whole = sum.viewAsIntegralLanes().sub(BITS_OF_TWO_TO_23).add(down);
        return whole.add(whole).add(1);
    }

    /** min(|steps|, rail), as integers: the order of floats that are not negative is that of their bits. */
    private static FloatVector magnitude(FloatVector steps, int rail) {
        return steps.viewAsIntegralLanes()
                .lanewise(AND, ~SIGN)
                .min(Float.floatToRawIntBits(rail))
                .viewAsFloatingLanes();
    }

    /** The magnitude with the sign of x, plus for -0. */
    static IntVector withSign(IntVector magnitude, FloatVector x) {
        // Adding +0 turns -0 into +0.
        IntVector sign = x.add(0f).viewAsIntegralLanes().lanewise(ASHR, 31);
        return magnitude.lanewise(XOR, sign).sub(sign);
    }

    /** floor(eighths * m / 8) of magnitudes, in the two bytes of 16-bit lanes: processors do not multiply bytes. */
    static ByteVector scaled(ByteVector m, short eighths) {
        ShortVector pairs = m.reinterpretAsShorts();
        ShortVector even = pairs.lanewise(AND, (short) 0xFF).mul(eighths).lanewise(LSHR, 3);
        ShortVector odd = pairs.lanewise(LSHR, 8).mul(eighths).lanewise(LSHR, 3);
        return odd.lanewise(LSHL, 8).lanewise(OR, even).reinterpretAsBytes();
    }

    /** floor(eighths * m / 8) of magnitudes. */
    static ShortVector scaled(ShortVector m, short eighths) {
        return m.mul(eighths).lanewise(LSHR, 3);
    }
}
