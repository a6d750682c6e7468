package dev.nearlimit.codes.gf2;

import java.util.Random;
import java.util.stream.LongStream;

/**
 * A random matrix for property tests, with its seed as name. Shapes lie around the borders of words and include empty
 * ones; densities run from nearly empty to full.
 */
record RandomMatrix(long seed, int rows, int columns, boolean[][] entries) {
    private static final int[] SIDES = {0, 1, 2, 5, 17, 31, 63, 64, 65, 100, 127, 128, 129};
    private static final double[] DENSITIES = {0.02, 0.1, 0.5, 0.9, 1.0};

    static RandomMatrix ofSeed(long seed) {
        Random random = new Random(seed);
        int rows = SIDES[random.nextInt(SIDES.length)];
        int columns = SIDES[random.nextInt(SIDES.length)];
        double density = DENSITIES[random.nextInt(DENSITIES.length)];
        return new RandomMatrix(seed, rows, columns, NaiveGf2.random(rows, columns, density, random));
    }

    static LongStream seeds() {
        return LongStream.range(1, 61);
    }

    BitMatrix packed() {
        return NaiveGf2.packed(entries, columns);
    }

    /** Another matrix of random entries, from the same seed. */
    boolean[][] partner(int partnerRows, int partnerColumns) {
        return NaiveGf2.random(partnerRows, partnerColumns, 0.5, new Random(~seed));
    }

    @Override
    public String toString() {
        return "seed " + seed + ": " + rows + "x" + columns;
    }
}
