package dev.nearlimit.algebra.distance;

import dev.nearlimit.codes.gf2.BitMatrix;

/**
 * A word that is light because its message is: the lightest row of a generator matrix or sum of two rows. With a
 * systematic generator those are the words of information weight 1 and 2. Sums are left out where there are too many of
 * them to be quick.
 *
 * @param weight its weight, at least 1
 * @param rows how many generator rows add up to it, 1 or 2
 */
record LightWord(int weight, int rows) {
    /** Words to XOR and count for all sums of two rows: a few hundred milliseconds. */
    private static final long QUICK = 1L << 28;

    static LightWord of(BitMatrix generator) {
        long[][] rows = new long[generator.rows()][];
        int lightest = Integer.MAX_VALUE;
        for (int r = 0; r < rows.length; r++) {
            rows[r] = generator.row(r);
            lightest = Math.min(lightest, generator.rowWeight(r));
        }
        int lightestSum = (long) rows.length * rows.length / 2 * generator.wordsPerRow() <= QUICK
                ? lightestSumOfTwo(rows)
                : Integer.MAX_VALUE;
        return lightestSum < lightest ? new LightWord(lightestSum, 2) : new LightWord(lightest, 1);
    }

    private static int lightestSumOfTwo(long[][] rows) {
        int lightest = Integer.MAX_VALUE;
        for (int a = 0; a < rows.length; a++) {
            for (int b = a + 1; b < rows.length; b++) {
                int weight = 0;
                for (int w = 0; w < rows[a].length; w++) {
                    weight += Long.bitCount(rows[a][w] ^ rows[b][w]);
                }
                lightest = Math.min(lightest, weight);
            }
        }
        return lightest;
    }

    /** As a user reads it. */
    String description() {
        return rows == 1
                ? "a generator row has weight " + weight
                : "the sum of two generator rows has weight " + weight;
    }
}
