package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.ABS;
import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.GT;
import static jdk.incubator.vector.VectorOperators.LSHL;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.LT;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.ShortVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Layered min-sum in 8-bit lanes, in three passes over a run whose values stay in the first-level cache. Each pass is
 * a method of its own: one long method falls past the limit of the JIT's inlining and boxes its vectors. Negation and
 * choice are blends, as masked operations are slow where the processor has no mask registers.
 */
final class ByteMinSum {
    private static final VectorSpecies<Byte> LANES = ByteVector.SPECIES_PREFERRED;

    private ByteMinSum() {}

    static void update(CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch) {
        int lanes = run.lanes();
        int[] bits = run.bits();
        int minima = bits.length * lanes;
        read(bits, lanes, posterior, message, run.messages(), scratch, (byte) arithmetic.largestMessage());
        correct(scratch, minima, lanes, arithmetic.eighths(), (byte) arithmetic.offset());
        send(bits, lanes, posterior, message, run.messages(), scratch, (byte) arithmetic.largestPosterior());
    }

    /** Leaves t of every edge, then a row each of the least magnitude, the second, and the product of the signs. */
    private static void read(
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            // Starting both minima at the largest message limits every magnitude to it at no cost.
            ByteVector least = ByteVector.broadcast(LANES, largest);
            ByteVector second = least;
            ByteVector sign = ByteVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                ByteVector t = ByteVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ByteVector.fromArray(LANES, message, messages + i * lanes + l));
                t.intoArray(scratch, i * lanes + l);
                ByteVector magnitude = t.lanewise(ABS);
                sign = sign.lanewise(XOR, t);
                second = second.min(least.max(magnitude));
                least = least.min(magnitude);
            }
            least.intoArray(scratch, minima + l);
            second.intoArray(scratch, minima + lanes + l);
            sign.intoArray(scratch, minima + 2 * lanes + l);
        }
    }

    /**
     * Corrects what is sent: the second magnitude in its place, the least in a fourth row, since edges are told apart by
     * the least as it was.
     */
    private static void correct(byte[] scratch, int minima, int lanes, int eighths, byte offset) {
        for (int l = minima; l < minima + lanes; l += LANES.length()) {
            ByteVector least = ByteVector.fromArray(LANES, scratch, l);
            ByteVector second = ByteVector.fromArray(LANES, scratch, l + lanes);
            if (eighths != 8) {
                least = scaled(least, (short) eighths);
                second = scaled(second, (short) eighths);
            }
            second.sub(offset).max((byte) 0).intoArray(scratch, l + lanes);
            least.sub(offset).max((byte) 0).intoArray(scratch, l + 3 * lanes);
        }
    }

    /** floor(eighths * m / 8) of magnitudes, in the two bytes of 16-bit lanes: processors do not multiply bytes. */
    private static ByteVector scaled(ByteVector m, short eighths) {
        ShortVector pairs = m.reinterpretAsShorts();
        ShortVector even = pairs.lanewise(AND, (short) 0xFF).mul(eighths).lanewise(LSHR, 3);
        ShortVector odd = pairs.lanewise(LSHR, 8).mul(eighths).lanewise(LSHR, 3);
        return odd.lanewise(LSHL, 8).lanewise(OR, even).reinterpretAsBytes();
    }

    private static void send(
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ByteVector least = ByteVector.fromArray(LANES, scratch, minima + l);
            ByteVector fromSecond = ByteVector.fromArray(LANES, scratch, minima + lanes + l);
            ByteVector sign = ByteVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            ByteVector fromLeast = ByteVector.fromArray(LANES, scratch, minima + 3 * lanes + l);
            for (int i = 0; i < bits.length; i++) {
                ByteVector t = ByteVector.fromArray(LANES, scratch, i * lanes + l);
                // Where two edges share the least magnitude both choices are equal.
                ByteVector m = fromSecond.blend(fromLeast, t.lanewise(ABS).compare(GT, least));
                m = m.blend(m.neg(), sign.lanewise(XOR, t).compare(LT, (byte) 0));
                m.intoArray(message, messages + i * lanes + l);
                t.add(m).min(limit).max((byte) -limit).intoArray(posterior, bits[i] + l);
            }
        }
    }
}
