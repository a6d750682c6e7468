package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Sums of bits against plain additions, in all three kinds of lanes. */
class BitSumKernelsTest {
    private static final int MESSAGES = 50;

    private final BitSumKernels kernels = Kernels.decoders().orElseThrow().bitSums();

    private static BitEdges edges(Random random, int bits) {
        int[] first = new int[bits + 1];
        for (int b = 0; b < bits; b++) {
            // Bits without messages come, too.
            first[b + 1] = first[b] + random.nextInt(8);
        }
        int[] messages = random.ints(first[bits], 0, MESSAGES).map(m -> 64 * m).toArray();
        return new BitEdges(first, messages);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void equalPlainSums(long seed) {
        Random random = new Random(seed);
        int bits = 1 + random.nextInt(20);
        BitEdges edges = edges(random, bits);
        byte[] byteChannel = new byte[64 * bits];
        random.nextBytes(byteChannel);
        byte[] byteMessage = new byte[64 * MESSAGES];
        random.nextBytes(byteMessage);
        short[] shortChannel = shorts(byteChannel);
        short[] shortMessage = shorts(byteMessage);
        float[] floatChannel = floats(random, byteChannel.length);
        float[] floatMessage = floats(random, byteMessage.length);
        int byteLimit = 1 + random.nextInt(127);
        int shortLimit = 1 + random.nextInt(900);
        byte[] bytes = new byte[64 * bits];
        short[] shorts = new short[64 * bits];
        float[] floats = new float[64 * bits];
        kernels.sum(edges, byteLimit, byteChannel, byteMessage, bytes);
        kernels.sum(edges, shortLimit, shortChannel, shortMessage, shorts);
        kernels.sum(edges, floatChannel, floatMessage, floats);
        for (int i = 0; i < 64 * bits; i++) {
            int sum = byteChannel[i];
            float floatSum = floatChannel[i];
            for (int e = edges.first()[i / 64]; e < edges.first()[i / 64 + 1]; e++) {
                sum += byteMessage[edges.messages()[e] + i % 64];
                floatSum += floatMessage[edges.messages()[e] + i % 64];
            }
            String where = "seed " + seed + " value " + i;
            assertEquals(Math.max(-byteLimit, Math.min(byteLimit, sum)), bytes[i], where);
            assertEquals(Math.max(-shortLimit, Math.min(shortLimit, sum)), shorts[i], where);
            assertEquals(Float.floatToRawIntBits(floatSum), Float.floatToRawIntBits(floats[i]), where);
        }
    }

    private static short[] shorts(byte[] values) {
        short[] result = new short[values.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = values[i];
        }
        return result;
    }

    private static float[] floats(Random random, int count) {
        float[] values = new float[count];
        for (int i = 0; i < count; i++) {
            values[i] = (float) (random.nextGaussian() * 10);
        }
        return values;
    }
}
