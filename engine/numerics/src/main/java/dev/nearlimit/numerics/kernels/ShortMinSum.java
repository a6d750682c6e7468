package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.ABS;
import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.GT;
import static jdk.incubator.vector.VectorOperators.LT;
import static jdk.incubator.vector.VectorOperators.OR;
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
    private static final int FRAMES = 64;

    private ShortMinSum() {}

    static void update(CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch) {
        int lanes = run.lanes();
        short largest = (short) arithmetic.largestMessage();
        if (lanes % (2 * LANES.length()) == 0) {
            read(run.bits(), lanes, posterior, message, run.messages(), scratch, largest);
        } else {
            readSingly(run.bits(), lanes, posterior, message, run.messages(), scratch, largest);
        }
        finish(run, arithmetic, posterior, message, scratch);
    }

    static void updateStarting(
            CheckRun run,
            MinSumArithmetic arithmetic,
            short[] posterior,
            short[] message,
            short[] scratch,
            short[] keep) {
        short largest = (short) arithmetic.largestMessage();
        readStarting(run.bits(), run.lanes(), posterior, message, run.messages(), scratch, largest, keep);
        finish(run, arithmetic, posterior, message, scratch);
    }

    private static void finish(
            CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch) {
        int lanes = run.lanes();
        int[] bits = run.bits();
        correct(scratch, bits.length * lanes, lanes, arithmetic.eighths(), (short) arithmetic.offset());
        if (lanes % (2 * LANES.length()) == 0) {
            send(bits, lanes, posterior, message, run.messages(), scratch, (short) arithmetic.largestPosterior());
        } else {
            sendSingly(bits, lanes, posterior, message, run.messages(), scratch, (short) arithmetic.largestPosterior());
        }
    }

    /** {@link #read}, where the messages of lanes that have just started count as 0. */
    private static void readStarting(
            int[] bits,
            int lanes,
            short[] posterior,
            short[] message,
            int messages,
            short[] scratch,
            short largest,
            short[] keep) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ShortVector kept = ShortVector.fromArray(LANES, keep, l);
            ShortVector least = ShortVector.broadcast(LANES, largest);
            ShortVector second = least;
            ShortVector sign = ShortVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                ShortVector t = ShortVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ShortVector.fromArray(LANES, message, messages + i * lanes + l)
                                .lanewise(AND, kept));
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

    /** Leaves t of every edge, then a row each of the least magnitude, the second, and the product of the signs. */
    private static void read(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += 2 * LANES.length()) {
            int k = l + LANES.length();
            // Starting both minima at the largest message limits every magnitude to it at no cost.
            ShortVector least = ShortVector.broadcast(LANES, largest);
            ShortVector second = least;
            ShortVector sign = ShortVector.zero(LANES);
            ShortVector leastOfNext = least;
            ShortVector secondOfNext = least;
            ShortVector signOfNext = sign;
            for (int i = 0; i < bits.length; i++) {
                int edge = messages + i * lanes;
                ShortVector t = ShortVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ShortVector.fromArray(LANES, message, edge + l));
                ShortVector u = ShortVector.fromArray(LANES, posterior, bits[i] + k)
                        .sub(ShortVector.fromArray(LANES, message, edge + k));
                t.intoArray(scratch, i * lanes + l);
                u.intoArray(scratch, i * lanes + k);
                sign = sign.lanewise(XOR, t);
                signOfNext = signOfNext.lanewise(XOR, u);
                t = t.lanewise(ABS);
                u = u.lanewise(ABS);
                second = second.min(least.max(t));
                secondOfNext = secondOfNext.min(leastOfNext.max(u));
                least = least.min(t);
                leastOfNext = leastOfNext.min(u);
            }
            least.intoArray(scratch, minima + l);
            leastOfNext.intoArray(scratch, minima + k);
            second.intoArray(scratch, minima + lanes + l);
            secondOfNext.intoArray(scratch, minima + lanes + k);
            sign.intoArray(scratch, minima + 2 * lanes + l);
            signOfNext.intoArray(scratch, minima + 2 * lanes + k);
        }
    }

    /** {@link #read} one vector at a time, for registers so wide that a check has an odd number of them. */
    private static void readSingly(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
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
     * Corrects what is sent and gives it the product of all signs: the second magnitude in its place, the least in the
     * third row, since edges are told apart by the least as it was.
     */
    private static void correct(short[] scratch, int minima, int lanes, int eighths, short offset) {
        for (int l = minima; l < minima + lanes; l += LANES.length()) {
            ShortVector least = ShortVector.fromArray(LANES, scratch, l);
            ShortVector second = ShortVector.fromArray(LANES, scratch, l + lanes);
            if (eighths != 8) {
                least = LaneMath.scaled(least, (short) eighths);
                second = LaneMath.scaled(second, (short) eighths);
            }
            least = least.sub(offset).max((short) 0);
            second = second.sub(offset).max((short) 0);
            var negative = ShortVector.fromArray(LANES, scratch, l + 2 * lanes).compare(LT, (short) 0);
            second.blend(second.neg(), negative).intoArray(scratch, l + lanes);
            least.blend(least.neg(), negative).intoArray(scratch, l + 2 * lanes);
        }
    }

    private static void send(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += 2 * LANES.length()) {
            int k = l + LANES.length();
            ShortVector least = ShortVector.fromArray(LANES, scratch, minima + l);
            ShortVector leastOfNext = ShortVector.fromArray(LANES, scratch, minima + k);
            ShortVector second = ShortVector.fromArray(LANES, scratch, minima + lanes + l);
            ShortVector secondOfNext = ShortVector.fromArray(LANES, scratch, minima + lanes + k);
            ShortVector first = ShortVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            ShortVector firstOfNext = ShortVector.fromArray(LANES, scratch, minima + 2 * lanes + k);
            for (int i = 0; i < bits.length; i++) {
                int edge = messages + i * lanes;
                ShortVector t = ShortVector.fromArray(LANES, scratch, i * lanes + l);
                ShortVector u = ShortVector.fromArray(LANES, scratch, i * lanes + k);
                // Where two edges share the least magnitude both choices are equal.
                ShortVector m = second.blend(first, t.lanewise(ABS).compare(GT, least));
                ShortVector n = secondOfNext.blend(firstOfNext, u.lanewise(ABS).compare(GT, leastOfNext));
                m = m.blend(m.neg(), t.compare(LT, (short) 0));
                n = n.blend(n.neg(), u.compare(LT, (short) 0));
                m.intoArray(message, edge + l);
                n.intoArray(message, edge + k);
                t.add(m).min(limit).max((short) -limit).intoArray(posterior, bits[i] + l);
                u.add(n).min(limit).max((short) -limit).intoArray(posterior, bits[i] + k);
            }
        }
    }

    /** {@link #send} one vector at a time. */
    private static void sendSingly(
            int[] bits, int lanes, short[] posterior, short[] message, int messages, short[] scratch, short limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ShortVector least = ShortVector.fromArray(LANES, scratch, minima + l);
            ShortVector second = ShortVector.fromArray(LANES, scratch, minima + lanes + l);
            ShortVector first = ShortVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            for (int i = 0; i < bits.length; i++) {
                ShortVector t = ShortVector.fromArray(LANES, scratch, i * lanes + l);
                ShortVector m = second.blend(first, t.lanewise(ABS).compare(GT, least));
                m = m.blend(m.neg(), t.compare(LT, (short) 0));
                m.intoArray(message, messages + i * lanes + l);
                t.add(m).min(limit).max((short) -limit).intoArray(posterior, bits[i] + l);
            }
        }
    }

    static void addUnsatisfied(CheckRun run, short[] posterior, short[] found) {
        for (int l = 0; l < FRAMES; l += LANES.length()) {
            addUnsatisfied(run.bits(), run.lanes(), l, posterior, found);
        }
    }

    /** What is found in one vector's lanes, over all checks of the run. */
    private static void addUnsatisfied(int[] bits, int lanes, int first, short[] posterior, short[] found) {
        ShortVector any = ShortVector.fromArray(LANES, found, first);
        for (int l = first; l < lanes; l += FRAMES) {
            ShortVector sum = ShortVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                sum = sum.lanewise(XOR, ShortVector.fromArray(LANES, posterior, bits[i] + l));
            }
            any = any.lanewise(OR, sum);
        }
        any.intoArray(found, first);
    }
}
