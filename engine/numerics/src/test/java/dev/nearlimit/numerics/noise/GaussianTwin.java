package dev.nearlimit.numerics.noise;

import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Xoshiro256PlusPlus;

/** Samples of one frame, one by one, with the quarter turns written out: the slow twin of the 64-lane passes. */
final class GaussianTwin {
    private GaussianTwin() {}

    static float[] samples(FrameStreams streams, long frame, int dimensions) {
        long[] state = new long[256];
        streams.start(frame, state);
        Xoshiro256PlusPlus stream = Xoshiro256PlusPlus.ofLane(state, 0);
        float[] samples = new float[dimensions];
        for (int d = 0; d < dimensions; d += 2) {
            long draw = stream.next();
            float[] pair = pair(draw, streams.aside(frame, d / 2));
            samples[d] = pair[0];
            if (d + 1 < dimensions) {
                samples[d + 1] = pair[1];
            }
        }
        return samples;
    }

    static float[] pair(long draw, long aside) {
        int a = (int) (draw >>> 32);
        int b = (int) draw;
        int cell = a >>> 1;
        float w = cell < 64 ? (float) ((double) cell + ((double) (aside >>> 1) * 0x1p-63 + 0x1p-64)) : cell + 0.5f;
        float radius = radius(w);
        float t = (b << 2) * (float) (Math.PI / 4 / 2147483648.0);
        float t2 = t * t;
        float c = radius
                * (((t2 * 2.443315711809948E-5f - 1.388731625493765E-3f) * t2 + 4.166664568298827E-2f) * t2 * t2
                        - t2 * 0.5f
                        + 1f);
        float s = radius * (((t2 * -1.9515295891E-4f + 8.3321608736E-3f) * t2 - 1.6666654611E-1f) * t2 * t + t);
        return switch (b >>> 30) {
            case 0 -> new float[] {c, s};
            case 1 -> new float[] {s, c};
            case 2 -> new float[] {-c, s};
            default -> new float[] {s, -c};
        };
    }

    private static float radius(float w) {
        int e = Math.getExponent(w);
        float m = w / (float) StrictMath.pow(2, e);
        if (m >= Float.intBitsToFloat(0x3fb504f3)) {
            m = m / 2;
            e++;
        }
        m = m - 1;
        float[] coefficients = {
            7.0376836292E-2f,
            -1.1514610310E-1f,
            1.1676998740E-1f,
            -1.2420140846E-1f,
            1.4249322787E-1f,
            -1.6668057665E-1f,
            2.0000714765E-1f,
            -2.4999993993E-1f,
            3.3333331174E-1f
        };
        float p = 0;
        for (float coefficient : coefficients) {
            p = p * m + coefficient;
        }
        float z = m * m;
        float ln = p * m * z - z * 0.5f + m + (e - 31f) * 0.69314718056f;
        return (float) Math.sqrt(Math.max(-2f * ln, 0f));
    }
}
