package dev.nearlimit.algebra.graph;

import dev.nearlimit.codes.gf2.BitMatrix;
import java.util.OptionalInt;

/** Cycles by trying everything: simple paths grown edge by edge, and all pairs of rows with all pairs of columns. */
final class NaiveCycles {
    private NaiveCycles() {}

    /** Length of the shortest simple path that returns to the bit it started from. */
    static OptionalInt girth(BitMatrix H) {
        for (int length = 4; length <= 2 * Math.min(H.rows(), H.columns()); length += 2) {
            for (int bit = 0; bit < H.columns(); bit++) {
                if (returns(H, bit, bit, length, 1L << bit, 0)) {
                    return OptionalInt.of(length);
                }
            }
        }
        return OptionalInt.empty();
    }

    /** Whether exactly {@code left} more edges lead from {@code bit} back to {@code start} over nodes not yet used. */
    private static boolean returns(BitMatrix H, int start, int bit, int left, long usedBits, long usedChecks) {
        for (int check = 0; check < H.rows(); check++) {
            if (!H.get(check, bit) || (usedChecks >>> check & 1) != 0) {
                continue;
            }
            if (left == 2) {
                if (bit != start && H.get(check, start)) {
                    return true;
                }
                continue;
            }
            for (int next = 0; next < H.columns(); next++) {
                if (H.get(check, next)
                        && (usedBits >>> next & 1) == 0
                        && returns(H, start, next, left - 2, usedBits | 1L << next, usedChecks | 1L << check)) {
                    return true;
                }
            }
        }
        return false;
    }

    static long fourCycles(BitMatrix H) {
        long cycles = 0;
        for (int a = 0; a < H.rows(); a++) {
            for (int b = a + 1; b < H.rows(); b++) {
                for (int c = 0; c < H.columns(); c++) {
                    for (int d = c + 1; d < H.columns(); d++) {
                        if (H.get(a, c) && H.get(a, d) && H.get(b, c) && H.get(b, d)) {
                            cycles++;
                        }
                    }
                }
            }
        }
        return cycles;
    }
}
