package dev.nearlimit.algebra.weight;

import dev.nearlimit.codes.gf2.BitMatrix;
import java.util.Arrays;

/**
 * Enumerates words of a linear code in Gray order (F. Gray, US patent 2632058, 1953) and adds up, for each weight, the
 * number of words and their message weights.
 *
 * <p>The last {@value #TABLE_BITS} basis words are expanded to a table of all their sums; the other basis words are walked
 * in Gray order, one XOR a step, and every step weighs the whole table against the current sum. Words are kept by plane:
 * word p of every table entry in one array, so that long codes are weighed plane by plane in short loops over small
 * arrays. An inner step has no branch and no allocation.
 *
 * <p>One kernel belongs to one thread; the tables are shared.
 */
final class WordKernel {
    /** 256 entries: 2 kB a plane and as much for the weights, well inside a first-level cache. */
    private static final int TABLE_BITS = 8;

    /** A count and a message weight travel in one long, so a part of the work must fit 32 bits of each. */
    private static final int MESSAGE_WEIGHT_BITS = 32;

    /** Neighbouring words often have the same weight; separate counters keep their additions from waiting for each other. */
    private static final int LANES = 4;

    private final Basis basis;
    private final long[] current;
    private final int[] weight;
    private final long[] lane0;
    private final long[] lane1;
    private final long[] lane2;
    private final long[] lane3;

    WordKernel(Basis basis) {
        this.basis = basis;
        this.current = new long[basis.planes];
        this.weight = new int[basis.tableSize];
        this.lane0 = new long[basis.n + 1];
        this.lane1 = new long[basis.n + 1];
        this.lane2 = new long[basis.n + 1];
        this.lane3 = new long[basis.n + 1];
    }

    /**
     * Adds the words whose top message bits are {@code part} to the totals.
     *
     * @param part which of the {@link Basis#parts()} parts of the code
     * @param counts receives the number of words of each weight, added to what is there
     * @param messageWeights receives the total message weight of the words of each weight, added to what is there
     */
    void enumerate(int part, long[] counts, long[] messageWeights) {
        int fixedWeight = startAt(part);
        long steps = 1L << basis.walkedBits;
        for (long step = 0; step < steps; step++) {
            long gray = step ^ (step >>> 1);
            if (step > 0) {
                xorInto(current, basis.walked[Long.numberOfTrailingZeros(step)]);
            }
            weigh();
            tally(fixedWeight + Long.bitCount(gray));
        }
        drain(counts, messageWeights);
    }

    private int startAt(int part) {
        Arrays.fill(current, 0);
        for (int bit = 0; bit < basis.fixed.length; bit++) {
            if ((part >>> bit & 1) != 0) {
                xorInto(current, basis.fixed[bit]);
            }
        }
        return Integer.bitCount(part);
    }

    private static void xorInto(long[] target, long[] source) {
        for (int p = 0; p < target.length; p++) {
            target[p] ^= source[p];
        }
    }

    private void weigh() {
        weighFirst(current[0], basis.table[0], weight);
        for (int p = 1; p < current.length; p++) {
            weighFurther(current[p], basis.table[p], weight);
        }
    }

    private static void weighFirst(long sum, long[] plane, int[] weight) {
        for (int i = 0; i < weight.length; i++) {
            weight[i] = Long.bitCount(sum ^ plane[i]);
        }
    }

    private static void weighFurther(long sum, long[] plane, int[] weight) {
        for (int i = 0; i < weight.length; i++) {
            weight[i] += Long.bitCount(sum ^ plane[i]);
        }
    }

    private void tally(int walkedWeight) {
        long[] increment = basis.increment;
        int size = weight.length;
        if (size < LANES) {
            for (int i = 0; i < size; i++) {
                lane0[weight[i]] += increment[i] + walkedWeight;
            }
            return;
        }
        for (int i = 0; i < size; i += LANES) {
            lane0[weight[i]] += increment[i] + walkedWeight;
            lane1[weight[i + 1]] += increment[i + 1] + walkedWeight;
            lane2[weight[i + 2]] += increment[i + 2] + walkedWeight;
            lane3[weight[i + 3]] += increment[i + 3] + walkedWeight;
        }
    }

    private void drain(long[] counts, long[] messageWeights) {
        for (int w = 0; w <= basis.n; w++) {
            long packed = lane0[w] + lane1[w] + lane2[w] + lane3[w];
            counts[w] += packed >>> MESSAGE_WEIGHT_BITS;
            messageWeights[w] += packed & ((1L << MESSAGE_WEIGHT_BITS) - 1);
        }
        Arrays.fill(lane0, 0);
        Arrays.fill(lane1, 0);
        Arrays.fill(lane2, 0);
        Arrays.fill(lane3, 0);
    }

    /**
     * The basis words of a code, divided among the table, the Gray walk and the parts that threads share out. Immutable
     * once made.
     */
    static final class Basis {
        /** 2^18 words, a quarter of a millisecond or more: small enough to share out evenly, large enough to be worth it. */
        private static final int PART_BITS = 18;

        private final int n;
        private final int planes;
        private final int tableSize;
        private final int walkedBits;
        private final long[][] table;
        private final long[] increment;
        private final long[][] walked;
        private final long[][] fixed;

        /**
         * @param n length
         * @param words basis words, packed; message bit i goes with word i
         */
        Basis(int n, long[][] words) {
            int dimension = words.length;
            int tableBits = Math.min(TABLE_BITS, dimension);
            this.n = n;
            this.planes = BitMatrix.wordsFor(n);
            this.tableSize = 1 << tableBits;
            this.walkedBits = Math.min(PART_BITS, dimension) - tableBits;
            this.table = new long[planes][tableSize];
            this.increment = new long[tableSize];
            for (int i = 0; i < tableSize; i++) {
                increment[i] = (1L << MESSAGE_WEIGHT_BITS) + Integer.bitCount(i);
                if (i > 0) {
                    int lowest = Integer.numberOfTrailingZeros(i);
                    for (int p = 0; p < planes; p++) {
                        table[p][i] = table[p][i & (i - 1)] ^ words[lowest][p];
                    }
                }
            }
            this.walked = Arrays.copyOfRange(words, tableBits, tableBits + walkedBits);
            this.fixed = Arrays.copyOfRange(words, tableBits + walkedBits, dimension);
        }

        int n() {
            return n;
        }

        /** Number of parts, a power of two. */
        int parts() {
            return 1 << fixed.length;
        }

        /** Words a part. */
        long wordsPerPart() {
            return (long) tableSize << walkedBits;
        }
    }
}
