package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.ABS;
import static jdk.incubator.vector.VectorOperators.GT;
import static jdk.incubator.vector.VectorOperators.LSHR;
import static jdk.incubator.vector.VectorOperators.LT;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ShortVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Layered min-sum in 16-bit lanes, in three passes over a run whose values stay in the first-level cache. Each pass is
 * a method of its own: one long method falls past the limit of the JIT's inlining and boxes its vectors. Negation and
 * choice are blends, as masked operations are slow where the processor has no mask registers.
 */
final class ShortMinSum {
    private static final VectorSpecies<Short> LANES = ShortVector.SPECIES_PREFERRED;

    private ShortMinSum() {}

    static void update(CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch) {
        int lanes = run.lanes();
        int[] bits = run.bits();
        int minima = bits.length * lanes;
        read(bits, lanes, posterior, message, run.messages(), scratch, (short) arithmetic.largestMessage());
        correct(scratch, minima, lanes, arithmetic.eighths(), (short) arithmetic.offset());
        send(bits, lanes, posterior, message, run.messages(), scratch, (short) arithmetic.largestPosterior());
    }

    /** Leaves t of every edge, then a row each of the least magnitude, the second, and the product of the signs. */
    private static void read(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            // Starting both minima at the largest message limits every magnitude to it at no cost.
            ShortVector least = ShortVector.broadcast(LANES, largest);
            ShortVector second = least;
            ShortVector sign = ShortVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                ShortVector t = ShortVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ShortVector.fromArray(LANES, message, messages + i * lanes + l));
                t.intoArray(scratch, i * lanes + l);
                ShortVector magnitude = t.lanewise(ABS);
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
    private static void correct(short[] scratch, int minima, int lanes, int eighths, short offset) {
        for (int l = minima; l < minima + lanes; l += LANES.length()) {
            ShortVector least = ShortVector.fromArray(LANES, scratch, l);
            ShortVector second = ShortVector.fromArray(LANES, scratch, l + lanes);
            if (eighths != 8) {
                least = scaled(least, (short) eighths);
                second = scaled(second, (short) eighths);
            }
            second.sub(offset).max((short) 0).intoArray(scratch, l + lanes);
            least.sub(offset).max((short) 0).intoArray(scratch, l + 3 * lanes);
        }
    }

    /** floor(eighths * m / 8) of magnitudes. */
    private static ShortVector scaled(ShortVector m, short eighths) {
        return m.mul(eighths).lanewise(LSHR, 3);
    }

    private static void send(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ShortVector least = ShortVector.fromArray(LANES, scratch, minima + l);
            ShortVector fromSecond = ShortVector.fromArray(LANES, scratch, minima + lanes + l);
            ShortVector sign = ShortVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            ShortVector fromLeast = ShortVector.fromArray(LANES, scratch, minima + 3 * lanes + l);
            for (int i = 0; i < bits.length; i++) {
                ShortVector t = ShortVector.fromArray(LANES, scratch, i * lanes + l);
                // Where two edges share the least magnitude both choices are equal.
                ShortVector m = fromSecond.blend(fromLeast, t.lanewise(ABS).compare(GT, least));
                m = m.blend(m.neg(), sign.lanewise(XOR, t).compare(LT, (short) 0));
                m.intoArray(message, messages + i * lanes + l);
                t.add(m).min(limit).max((short) -limit).intoArray(posterior, bits[i] + l);
            }
        }
    }
}
