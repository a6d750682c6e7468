package dev.nearlimit.numerics.kernels;

/** The passes in plain Java. */
final class PlainReceptionKernels implements ReceptionKernels {
    private static final int LANES = 64;
    private static final int ONE = 0x3f800000;

    @Override
    public void demap(long[] bits, int first, int positions, float sigma, float scale, float[] values, int at) {
        for (int p = 0; p < positions; p++) {
            demapPosition(bits[first + p], sigma, scale, values, at + p * LANES);
        }
    }

    private static void demapPosition(long word, float sigma, float scale, float[] values, int at) {
        for (int f = 0; f < LANES; f++) {
            float signal = Float.intBitsToFloat(ONE | ((int) (word >>> f) << 31));
            values[at + f] = (signal + sigma * values[at + f]) * scale;
        }
    }

    @Override
    public void midTread(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt) {
        for (int i = 0; i < count; i++) {
            float x = values[at + i];
            float y = Math.min(Math.abs(x / step), rail);
            int whole = (int) y;
            int magnitude = y - whole >= 0.5f ? whole + 1 : whole;
            int level = x < 0f ? -magnitude : magnitude;
            levels[levelsAt + i] = (byte) level;
            values[at + i] = level * step;
        }
    }

    @Override
    public void midRise(float[] values, int at, int count, float step, int rail, byte[] levels, int levelsAt) {
        float halfStep = step * 0.5f;
        for (int i = 0; i < count; i++) {
            float x = values[at + i];
            int magnitude = 2 * (int) Math.min(Math.abs(x / step), rail) + 1;
            int level = x < 0f ? -magnitude : magnitude;
            levels[levelsAt + i] = (byte) level;
            values[at + i] = level * halfStep;
        }
    }
}
