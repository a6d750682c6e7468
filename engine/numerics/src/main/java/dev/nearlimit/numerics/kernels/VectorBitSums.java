package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.ASHR;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.OR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.FloatVector;
import jdk.incubator.vector.ShortVector;
import jdk.incubator.vector.VectorSpecies;

/** Sums of bits with the Vector API; a bit is a method call of its own, short enough for the JIT. */
final class VectorBitSums implements BitSumKernels {
    private static final VectorSpecies<Byte> BYTES = ByteVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Short> SHORTS = ShortVector.SPECIES_PREFERRED;
    private static final VectorSpecies<Float> FLOATS = FloatVector.SPECIES_PREFERRED;
    private static final int LANES = 64;

    @Override
    public void sum(BitEdges edges, int limit, byte[] channel, byte[] message, byte[] posterior) {
        int[] first = edges.first();
        for (int bit = 0; bit < edges.bits(); bit++) {
            sumBytes(
                    edges.messages(),
                    first[bit],
                    first[bit + 1],
                    (short) limit,
                    channel,
                    message,
                    posterior,
                    bit * LANES);
        }
    }

    /** Sums are taken in 16-bit lanes, those of even and of odd frames apart. */
    private static void sumBytes(
            int[] messages, int from, int to, short limit, byte[] channel, byte[] message, byte[] posterior, int at) {
        for (int l = 0; l < LANES; l += BYTES.length()) {
            ShortVector pairs = ByteVector.fromArray(BYTES, channel, at + l).reinterpretAsShorts();
            ShortVector even = pairs.lanewise(LSHL, 8).lanewise(ASHR, 8);
            ShortVector odd = pairs.lanewise(ASHR, 8);
            for (int e = from; e < to; e++) {
                pairs = ByteVector.fromArray(BYTES, message, messages[e] + l).reinterpretAsShorts();
                even = even.add(pairs.lanewise(LSHL, 8).lanewise(ASHR, 8));
                odd = odd.add(pairs.lanewise(ASHR, 8));
            }
            even = even.min(limit).max((short) -limit).lanewise(AND, (short) 0xFF);
            odd = odd.min(limit).max((short) -limit).lanewise(LSHL, 8);
            odd.lanewise(OR, even).reinterpretAsBytes().intoArray(posterior, at + l);
        }
    }

    @Override
    public void sum(BitEdges edges, int limit, short[] channel, short[] message, short[] posterior) {
        int[] first = edges.first();
        for (int bit = 0; bit < edges.bits(); bit++) {
            sumShorts(
                    edges.messages(),
                    first[bit],
                    first[bit + 1],
                    (short) limit,
                    channel,
                    message,
                    posterior,
                    bit * LANES);
        }
    }

    private static void sumShorts(
            int[] messages,
            int from,
            int to,
            short limit,
            short[] channel,
            short[] message,
            short[] posterior,
            int at) {
        for (int l = 0; l < LANES; l += SHORTS.length()) {
            ShortVector sum = ShortVector.fromArray(SHORTS, channel, at + l);
            for (int e = from; e < to; e++) {
                sum = sum.add(ShortVector.fromArray(SHORTS, message, messages[e] + l));
            }
            sum.min(limit).max((short) -limit).intoArray(posterior, at + l);
        }
    }

    @Override
    public void sum(BitEdges edges, float[] channel, float[] message, float[] posterior) {
        int[] first = edges.first();
        for (int bit = 0; bit < edges.bits(); bit++) {
            sumFloats(edges.messages(), first[bit], first[bit + 1], channel, message, posterior, bit * LANES);
        }
    }

    private static void sumFloats(
            int[] messages, int from, int to, float[] channel, float[] message, float[] posterior, int at) {
        for (int l = 0; l < LANES; l += FLOATS.length()) {
            FloatVector sum = FloatVector.fromArray(FLOATS, channel, at + l);
            for (int e = from; e < to; e++) {
                sum = sum.add(FloatVector.fromArray(FLOATS, message, messages[e] + l));
            }
            sum.intoArray(posterior, at + l);
        }
    }
}
