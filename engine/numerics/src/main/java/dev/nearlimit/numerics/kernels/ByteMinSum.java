package dev.nearlimit.numerics.kernels;

import static jdk.incubator.vector.VectorOperators.ABS;
import static jdk.incubator.vector.VectorOperators.AND;
import static jdk.incubator.vector.VectorOperators.GT;
import static jdk.incubator.vector.VectorOperators.LT;
import static jdk.incubator.vector.VectorOperators.OR;
import static jdk.incubator.vector.VectorOperators.XOR;

import jdk.incubator.vector.ByteVector;
import jdk.incubator.vector.VectorSpecies;

/**
 * Layered min-sum in 8-bit lanes, in three passes over a run whose values stay in the first-level cache. Each pass is
 * a method of its own: one long method falls past the limit of the JIT's inlining and boxes its vectors. Negation and
 * choice are blends, as masked operations are slow where the processor has no mask registers.
 */
final class ByteMinSum {
    private static final VectorSpecies<Byte> LANES = ByteVector.SPECIES_PREFERRED;
    private static final int FRAMES = 64;

    private ByteMinSum() {}

    static void update(CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch) {
        int lanes = run.lanes();
        byte largest = (byte) arithmetic.largestMessage();
        if (lanes % (2 * LANES.length()) == 0) {
            read(run.bits(), lanes, posterior, message, run.messages(), scratch, largest);
        } else {
            readSingly(run.bits(), lanes, posterior, message, run.messages(), scratch, largest);
        }
        finish(run, arithmetic, posterior, message, scratch);
    }

    static void updateStarting(
            CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch, byte[] keep) {
        byte largest = (byte) arithmetic.largestMessage();
        readStarting(run.bits(), run.lanes(), posterior, message, run.messages(), scratch, largest, keep);
        finish(run, arithmetic, posterior, message, scratch);
    }

    private static void finish(
            CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch) {
        int lanes = run.lanes();
        int[] bits = run.bits();
        correct(scratch, bits.length * lanes, lanes, arithmetic.eighths(), (byte) arithmetic.offset());
        if (lanes % (2 * LANES.length()) == 0) {
            send(bits, lanes, posterior, message, run.messages(), scratch, (byte) arithmetic.largestPosterior());
        } else {
            sendSingly(bits, lanes, posterior, message, run.messages(), scratch, (byte) arithmetic.largestPosterior());
        }
    }

    /** {@link #read}, where the messages of lanes that have just started count as 0. */
    private static void readStarting(
            int[] bits,
            int lanes,
            byte[] posterior,
            byte[] message,
            int messages,
            byte[] scratch,
            byte largest,
            byte[] keep) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ByteVector kept = ByteVector.fromArray(LANES, keep, l);
            ByteVector least = ByteVector.broadcast(LANES, largest);
            ByteVector second = least;
            ByteVector sign = ByteVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                ByteVector t = ByteVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ByteVector.fromArray(LANES, message, messages + i * lanes + l)
                                .lanewise(AND, kept));
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

    /** Leaves t of every edge, then a row each of the least magnitude, the second, and the product of the signs. */
    private static void read(
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += 2 * LANES.length()) {
            int k = l + LANES.length();
            // Starting both minima at the largest message limits every magnitude to it at no cost.
            ByteVector least = ByteVector.broadcast(LANES, largest);
            ByteVector second = least;
            ByteVector sign = ByteVector.zero(LANES);
            ByteVector leastOfNext = least;
            ByteVector secondOfNext = least;
            ByteVector signOfNext = sign;
            for (int i = 0; i < bits.length; i++) {
                int edge = messages + i * lanes;
                ByteVector t = ByteVector.fromArray(LANES, posterior, bits[i] + l)
                        .sub(ByteVector.fromArray(LANES, message, edge + l));
                ByteVector u = ByteVector.fromArray(LANES, posterior, bits[i] + k)
                        .sub(ByteVector.fromArray(LANES, message, edge + k));
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
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte largest) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
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
     * Corrects what is sent and gives it the product of all signs: the second magnitude in its place, the least in the
     * third row, since edges are told apart by the least as it was.
     */
    private static void correct(byte[] scratch, int minima, int lanes, int eighths, byte offset) {
        for (int l = minima; l < minima + lanes; l += LANES.length()) {
            ByteVector least = ByteVector.fromArray(LANES, scratch, l);
            ByteVector second = ByteVector.fromArray(LANES, scratch, l + lanes);
            if (eighths != 8) {
                least = LaneMath.scaled(least, (short) eighths);
                second = LaneMath.scaled(second, (short) eighths);
            }
            least = least.sub(offset).max((byte) 0);
            second = second.sub(offset).max((byte) 0);
            var negative = ByteVector.fromArray(LANES, scratch, l + 2 * lanes).compare(LT, (byte) 0);
            second.blend(second.neg(), negative).intoArray(scratch, l + lanes);
            least.blend(least.neg(), negative).intoArray(scratch, l + 2 * lanes);
        }
    }

    private static void send(
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += 2 * LANES.length()) {
            int k = l + LANES.length();
            ByteVector least = ByteVector.fromArray(LANES, scratch, minima + l);
            ByteVector leastOfNext = ByteVector.fromArray(LANES, scratch, minima + k);
            ByteVector second = ByteVector.fromArray(LANES, scratch, minima + lanes + l);
            ByteVector secondOfNext = ByteVector.fromArray(LANES, scratch, minima + lanes + k);
            ByteVector first = ByteVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            ByteVector firstOfNext = ByteVector.fromArray(LANES, scratch, minima + 2 * lanes + k);
            for (int i = 0; i < bits.length; i++) {
                int edge = messages + i * lanes;
                ByteVector t = ByteVector.fromArray(LANES, scratch, i * lanes + l);
                ByteVector u = ByteVector.fromArray(LANES, scratch, i * lanes + k);
                // Where two edges share the least magnitude both choices are equal.
                ByteVector m = second.blend(first, t.lanewise(ABS).compare(GT, least));
                ByteVector n = secondOfNext.blend(firstOfNext, u.lanewise(ABS).compare(GT, leastOfNext));
                m = m.blend(m.neg(), t.compare(LT, (byte) 0));
                n = n.blend(n.neg(), u.compare(LT, (byte) 0));
                m.intoArray(message, edge + l);
                n.intoArray(message, edge + k);
                t.add(m).min(limit).max((byte) -limit).intoArray(posterior, bits[i] + l);
                u.add(n).min(limit).max((byte) -limit).intoArray(posterior, bits[i] + k);
            }
        }
    }

    /** {@link #send} one vector at a time. */
    private static void sendSingly(
            int[] bits, int lanes, byte[] posterior, byte[] message, int messages, byte[] scratch, byte limit) {
        int minima = bits.length * lanes;
        for (int l = 0; l < lanes; l += LANES.length()) {
            ByteVector least = ByteVector.fromArray(LANES, scratch, minima + l);
            ByteVector second = ByteVector.fromArray(LANES, scratch, minima + lanes + l);
            ByteVector first = ByteVector.fromArray(LANES, scratch, minima + 2 * lanes + l);
            for (int i = 0; i < bits.length; i++) {
                ByteVector t = ByteVector.fromArray(LANES, scratch, i * lanes + l);
                ByteVector m = second.blend(first, t.lanewise(ABS).compare(GT, least));
                m = m.blend(m.neg(), t.compare(LT, (byte) 0));
                m.intoArray(message, messages + i * lanes + l);
                t.add(m).min(limit).max((byte) -limit).intoArray(posterior, bits[i] + l);
            }
        }
    }

    static void addUnsatisfied(CheckRun run, byte[] posterior, byte[] found) {
        for (int l = 0; l < FRAMES; l += LANES.length()) {
            addUnsatisfied(run.bits(), run.lanes(), l, posterior, found);
        }
    }

    /** What is found in one vector's lanes, over all checks of the run. */
    private static void addUnsatisfied(int[] bits, int lanes, int first, byte[] posterior, byte[] found) {
        ByteVector any = ByteVector.fromArray(LANES, found, first);
        for (int l = first; l < lanes; l += FRAMES) {
            ByteVector sum = ByteVector.zero(LANES);
            for (int i = 0; i < bits.length; i++) {
                sum = sum.lanewise(XOR, ByteVector.fromArray(LANES, posterior, bits[i] + l));
            }
            any = any.lanewise(OR, sum);
        }
        any.intoArray(found, first);
    }

    static void start(byte[] posterior, byte[] received, byte[] keep) {
        for (int row = 0; row < posterior.length; row += FRAMES) {
            for (int l = 0; l < FRAMES; l += LANES.length()) {
                ByteVector from = ByteVector.fromArray(LANES, received, row + l);
                ByteVector.fromArray(LANES, posterior, row + l)
                        .lanewise(XOR, from)
                        .lanewise(AND, ByteVector.fromArray(LANES, keep, l))
                        .lanewise(XOR, from)
                        .intoArray(posterior, row + l);
            }
        }
    }
}
