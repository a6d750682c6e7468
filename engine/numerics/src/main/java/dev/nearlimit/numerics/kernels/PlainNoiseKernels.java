package dev.nearlimit.numerics.kernels;

/** The passes in plain Java, each a loop without branches that the JIT can vectorise where it is able to. */
final class PlainNoiseKernels implements NoiseKernels {
    private static final int LANES = 64;
    private static final float ANGLE_UNIT = (float) (Math.PI / 4 / 2147483648.0);
    private static final int SIGN = 0x80000000;

    @Override
    public String name() {
        return "plain";
    }

    @Override
    public void fill(long[] state, long[] draws, int steps) {
        for (int s = 0; s < steps; s++) {
            for (int l = 0; l < LANES; l++) {
                draws[s * LANES + l] = draw(state, l);
            }
            step(state);
        }
    }

    @Override
    public void halves(long[] state, int[] high, int[] low, int steps) {
        // No buffer in a field: one instance serves all threads.
        for (int s = 0; s < steps; s++) {
            int row = s * LANES;
            for (int l = 0; l < LANES / 2; l++) {
                long even = draw(state, l);
                long odd = draw(state, l + LANES / 2);
                high[row + 2 * l] = (int) (even >>> 32);
                high[row + 2 * l + 1] = (int) (odd >>> 32);
                low[row + 2 * l] = (int) even;
                low[row + 2 * l + 1] = (int) odd;
            }
            step(state);
        }
    }

    private static long draw(long[] state, int l) {
        return Long.rotateLeft(state[l] + state[3 * LANES + l], 23) + state[l];
    }

    private static void step(long[] state) {
        for (int l = 0; l < LANES; l++) {
            long s0 = state[l];
            long s1 = state[LANES + l];
            long s2 = state[2 * LANES + l] ^ s0;
            long s3 = state[3 * LANES + l] ^ s1;
            state[l] = s0 ^ s3;
            state[LANES + l] = s1 ^ s2;
            state[2 * LANES + l] = s2 ^ (s1 << 17);
            state[3 * LANES + l] = Long.rotateLeft(s3, 45);
        }
    }

    @Override
    public boolean radius(int[] high, float[] radius, float[] scratch, int count) {
        // Only a cell below 64 makes high >>> 7 zero and so the difference negative.
        int signs = 0;
        for (int i = 0; i < count; i++) {
            signs |= (high[i] >>> 7) - 1;
        }
        for (int i = 0; i < count; i++) {
            radius[i] = Radius.ofDraw(high[i]);
        }
        return signs < 0;
    }

    @Override
    public void rotate(int[] low, float[] radius, float[] samples, int at, int count) {
        for (int row = 0; row < count; row += LANES) {
            rotateRow(low, radius, samples, at + 2 * row, row);
        }
    }

    private static void rotateRow(int[] low, float[] radius, float[] samples, int at, int row) {
        for (int l = 0; l < LANES; l++) {
            int b = low[row + l];
            float r = radius[row + l];
            float t = (float) (b << 2) * ANGLE_UNIT;
            float t2 = t * t;
            float c = r * cosine(t2);
            float s = r * sine(t, t2);
            int x = Float.floatToRawIntBits(c) ^ (b & SIGN);
            int y = Float.floatToRawIntBits(s);
            int exchange = (x ^ y) & (b << 1 >> 31);
            samples[at + l] = Float.intBitsToFloat(x ^ exchange);
            samples[at + LANES + l] = Float.intBitsToFloat(y ^ exchange);
        }
    }

    /** sin t for |t| up to pi/4, t2 being t*t. Coefficients of the Cephes single-precision sine. */
    static float sine(float t, float t2) {
        float p = t2 * -1.9515295891E-4f + 8.3321608736E-3f;
        p = p * t2 + -1.6666654611E-1f;
        return p * t2 * t + t;
    }

    /** cos t for |t| up to pi/4 from t2 = t*t. Coefficients of the Cephes single-precision cosine. */
    static float cosine(float t2) {
        float p = t2 * 2.443315711809948E-5f + -1.388731625493765E-3f;
        p = p * t2 + 4.166664568298827E-2f;
        return p * t2 * t2 - t2 * 0.5f + 1f;
    }
}
