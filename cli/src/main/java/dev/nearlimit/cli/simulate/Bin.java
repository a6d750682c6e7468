package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Histogram;
import java.util.ArrayList;
import java.util.List;

/**
 * A stretch of a histogram.
 *
 * @param low least value, included
 * @param high largest value, included
 * @param frames how often values from low to high came up
 */
record Bin(int low, int high, long frames) {
    /** 0, 1, 2, 3..4, 5..8, 9..16 and so on, those that hold anything. */
    static List<Bin> octaves(Histogram histogram) {
        List<Bin> bins = new ArrayList<>();
        add(bins, histogram, 0, 0);
        int low = 1;
        for (long high = 1; low <= histogram.largest(); high *= 2) {
            int end = (int) Math.min(high, Integer.MAX_VALUE - 1);
            add(bins, histogram, low, end);
            low = end + 1;
        }
        return bins;
    }

    /** Stretches of equal width, so many at most, those that hold anything. */
    static List<Bin> equal(Histogram histogram, int most) {
        List<Bin> bins = new ArrayList<>();
        int width = histogram.largest() / most + 1;
        for (int low = 0; low <= histogram.largest(); low += width) {
            add(bins, histogram, low, low + width - 1);
        }
        return bins;
    }

    private static void add(List<Bin> bins, Histogram histogram, int low, int high) {
        long frames = histogram.count(low, high);
        if (frames > 0) {
            bins.add(new Bin(low, high, frames));
        }
    }

    /** As {@code 3..4:17}. */
    @Override
    public String toString() {
        return (low == high ? String.valueOf(low) : low + ".." + high) + ":" + frames;
    }
}
