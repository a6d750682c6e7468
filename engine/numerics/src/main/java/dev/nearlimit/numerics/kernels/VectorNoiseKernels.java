package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.ASHR;
import static jdk.incubator.vector.VectorOperators.I2F;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.ROL;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.IntVector;
import jdk.incubator.vector.LongVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * The passes with the Vector API: the operations of {@link PlainNoiseKernels} and {@link Radius} in the same order, so
 * that every bit is the same. A pass is a method of its own, since a long one falls past the limit of the JIT's inlining
 * and boxes its vectors. A row of 64 lanes is a whole number of vectors of any width up to 2048 bits.
 */
final class VectorNoiseKernels implements NoiseKernels {
    private static final VectorSpecies<Long> LONGS = LongVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Integer> INTS = IntVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int LANES = 64;
    private static final int SQRT_HALF_BITS = 0x3f3504f3;
    private static final float LN_2 = 0.69314718056f;
    private static final float ANGLE_UNIT = (float) (Math.PI / 4 / 2147483648.0);
    private static final int SIGN = 0x80000000;

    private static final long UPPER_HALF = 0xFFFFFFFF00000000L;
    private static final long LOWER_HALF = 0x00000000FFFFFFFFL;

    @Override
    public String name() {
        return "vector " + INTS.vectorBitSize() + "-bit";
    }

    @Override
    public void fill(long[] state, long[] draws, int steps) {
        for (int l = 0; l < LANES; l += LONGS.length()) {
            fillLanes(state, draws, l, steps);
        }
    }

    private static void fillLanes(long[] state, long[] draws, int l, int steps) {
        LongVector s0 = LongVector.fromArray(LONGS, state, l);
        LongVector s1 = LongVector.fromArray(LONGS, state, LANES + l);
        LongVector s2 = LongVector.fromArray(LONGS, state, 2 * LANES + l);
        LongVector s3 = LongVector.fromArray(LONGS, state, 3 * LANES + l);
        for (int s = 0; s < steps; s++) {
            s0.add(s3).lanewise(ROL, 23).add(s0).intoArray(draws, s * LANES + l);
            LongVector t = s1.lanewise(LSHL, 17);
            s2 = s2.lanewise(XOR, s0);
            s3 = s3.lanewise(XOR, s1);
            s1 = s1.lanewise(XOR, s2);
            s0 = s0.lanewise(XOR, s3);
            s2 = s2.lanewise(XOR, t);
            s3 = s3.lanewise(ROL, 45);
        }
        s0.intoArray(state, l);
        s1.intoArray(state, LANES + l);
        s2.intoArray(state, 2 * LANES + l);
        s3.intoArray(state, 3 * LANES + l);
    }

    @Override
    public void halves(long[] state, int[] high, int[] low, int steps) {
        for (int l = 0; l < LANES / 2; l += LONGS.length()) {
            halvesOfLanes(state, high, low, l, steps);
        }
    }

    /** Two vectors at a time, the even lanes of a row's part and its odd ones, which also keeps the processor busier. */
    private static void halvesOfLanes(long[] state, int[] high, int[] low, int l, int steps) {
        int o = l + LANES / 2;
        LongVector a0 = LongVector.fromArray(LONGS, state, l);
        LongVector a1 = LongVector.fromArray(LONGS, state, LANES + l);
        LongVector a2 = LongVector.fromArray(LONGS, state, 2 * LANES + l);
        LongVector a3 = LongVector.fromArray(LONGS, state, 3 * LANES + l);
        LongVector b0 = LongVector.fromArray(LONGS, state, o);
        LongVector b1 = LongVector.fromArray(LONGS, state, LANES + o);
        LongVector b2 = LongVector.fromArray(LONGS, state, 2 * LANES + o);
        LongVector b3 = LongVector.fromArray(LONGS, state, 3 * LANES + o);
        for (int s = 0; s < steps; s++) {
            LongVector even = a0.add(a3).lanewise(ROL, 23).add(a0);
            LongVector odd = b0.add(b3).lanewise(ROL, 23).add(b0);
            int at = s * LANES + 2 * l;
            // Seen as ints the lower half of a long is the even lane.
            odd.lanewise(AND, UPPER_HALF)
                    .lanewise(OR, even.lanewise(LSHR, 32))
                    .reinterpretAsInts()
                    .intoArray(high, at);
            odd.lanewise(LSHL, 32)
                    .lanewise(OR, even.lanewise(AND, LOWER_HALF))
                    .reinterpretAsInts()
                    .intoArray(low, at);
            LongVector t = a1.lanewise(LSHL, 17);
            a2 = a2.lanewise(XOR, a0);
            a3 = a3.lanewise(XOR, a1);
            a1 = a1.lanewise(XOR, a2);
            a0 = a0.lanewise(XOR, a3);
            a2 = a2.lanewise(XOR, t);
            a3 = a3.lanewise(ROL, 45);
            t = b1.lanewise(LSHL, 17);
            b2 = b2.lanewise(XOR, b0);
            b3 = b3.lanewise(XOR, b1);
            b1 = b1.lanewise(XOR, b2);
            b0 = b0.lanewise(XOR, b3);
            b2 = b2.lanewise(XOR, t);
            b3 = b3.lanewise(ROL, 45);
        }
        a0.intoArray(state, l);
        a1.intoArray(state, LANES + l);
        a2.intoArray(state, 2 * LANES + l);
        a3.intoArray(state, 3 * LANES + l);
        b0.intoArray(state, o);
        b1.intoArray(state, LANES + o);
        b2.intoArray(state, 2 * LANES + o);
        b3.intoArray(state, 3 * LANES + o);
    }

    @Override
    public boolean radius(int[] high, float[] radius, float[] scratch, int count) {
        boolean tail = split(high, radius, scratch, count);
        radius(radius, scratch, count);
        return tail;
    }

    /**
     * w = m * 2^e of {@link Radius}: leaves m - 1 and (e - 31) ln 2. A pass of its own, since the logarithm waits for itself
     * most of the time, and the fewer operations a vector takes, the more vectors the processor has under way.
     */
    private static boolean split(int[] high, float[] mantissa, float[] exponent, int count) {
        IntVector signs = IntVector.zero(INTS);
        for (int i = 0; i < count; i += INTS.length()) {
            IntVector draw = IntVector.fromArray(INTS, high, i);
            signs = signs.lanewise(OR, draw.lanewise(LSHR, 7).sub(1));
            FloatVector w = ((FloatVector) draw.lanewise(LSHR, 1).convert(I2F, 0)).add(0.5f);
            IntVector bits = w.viewAsIntegralLanes();
            IntVector e = bits.sub(SQRT_HALF_BITS).lanewise(ASHR, 23);
            bits.sub(e.lanewise(LSHL, 23)).viewAsFloatingLanes().sub(1f).intoArray(mantissa, i);
            ((FloatVector) e.convert(I2F, 0)).sub(31f).mul(LN_2).intoArray(exponent, i);
        }
        return signs.reduceLanes(OR) < 0;
    }

    private static void radius(float[] radius, float[] exponent, int count) {
        for (int i = 0; i < count; i += FLOATS.length()) {
            FloatVector m = FloatVector.fromArray(FLOATS, radius, i);
            FloatVector z = m.mul(m);
            FloatVector ln = m.mul(7.0376836292E-2f)
                    .add(-1.1514610310E-1f)
                    .mul(m)
                    .add(1.1676998740E-1f)
                    .mul(m)
                    .add(-1.2420140846E-1f)
                    .mul(m)
                    .add(1.4249322787E-1f)
                    .mul(m)
                    .add(-1.6668057665E-1f)
                    .mul(m)
                    .add(2.0000714765E-1f)
                    .mul(m)
                    .add(-2.4999993993E-1f)
                    .mul(m)
                    .add(3.3333331174E-1f)
                    .mul(m)
                    .mul(z)
                    .sub(z.mul(0.5f))
                    .add(m)
                    .add(FloatVector.fromArray(FLOATS, exponent, i));
            // As integers, floats below zero and -0 are below 0, so this is the maximum with +0 of plain Java.
            ln.mul(-2f)
                    .viewAsIntegralLanes()
                    .max(0)
                    .viewAsFloatingLanes()
                    .sqrt()
                    .intoArray(radius, i);
        }
    }

    @Override
    public void rotate(int[] low, float[] radius, float[] samples, int at, int count) {
        for (int row = 0; row < count; row += LANES) {
            rotateRow(low, radius, samples, at + 2 * row, row);
        }
    }

    private static void rotateRow(int[] low, float[] radius, float[] samples, int at, int row) {
        for (int l = 0; l < LANES; l += INTS.length()) {
            IntVector b = IntVector.fromArray(INTS, low, row + l);
            FloatVector r = FloatVector.fromArray(FLOATS, radius, row + l);
            FloatVector t = ((FloatVector) b.lanewise(LSHL, 2).convert(I2F, 0)).mul(ANGLE_UNIT);
            FloatVector t2 = t.mul(t);
            IntVector x = r.mul(LaneMath.cosine(t2)).viewAsIntegralLanes().lanewise(XOR, b.lanewise(AND, SIGN));
            IntVector y = r.mul(LaneMath.sine(t, t2)).viewAsIntegralLanes();
            IntVector exchange =
                    x.lanewise(XOR, y).lanewise(AND, b.lanewise(LSHL, 1).lanewise(ASHR, 31));
            x.lanewise(XOR, exchange).viewAsFloatingLanes().intoArray(samples, at + l);
            y.lanewise(XOR, exchange).viewAsFloatingLanes().intoArray(samples, at + LANES + l);
        }
    }
}
