package dev.nearlimit.codes.family;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.ArrayList;
import java.util.List;

/**
 * The parity-check matrix {@code [A I]} of Hamming codes, full-length or shortened. The columns of A are the numbers of
 * m bits and weight 2 or more in ascending order, row i holding bit i, so that a shortened code keeps the first of them
 * and its first information bit has two parity bits: the minimum distance stays exactly 3.
 */
final class HammingCodes {
    static final int MAX_CHECKS = 14;
    static final String SOURCE = "R. W. Hamming, Error detecting and error correcting codes, BSTJ 29 (1950)";

    private HammingCodes() {}

    /** Why (n,k) is no Hamming code with m = n-k checks; null if it is one. */
    static String objection(int n, int k) {
        int m = n - k;
        if (k < 1 || m < 2 || m > MAX_CHECKS) {
            return "(" + n + "," + k + ") has n-k = " + m + " and k = " + k + ", expected n-k = 2 .. " + MAX_CHECKS
                    + " and k >= 1";
        }
        int longest = (1 << m) - 1;
        if (n > longest) {
            return "n is " + n + ", but " + m + " checks tell apart at most 2^" + m + "-1 = " + longest + " positions";
        }
        return null;
    }

    /** The matrix of the (n,k) code, with an overall parity bit as one more position and one more row if extended. */
    static SparseBitMatrix parityCheck(int n, int k, boolean extended) {
        int m = n - k;
        List<List<Integer>> rows = new ArrayList<>();
        for (int i = 0; i < m; i++) {
            rows.add(new ArrayList<>());
        }
        int column = 0;
        for (int label = 3; column < k; label++) {
            if (Integer.bitCount(label) >= 2) {
                for (int i = 0; i < m; i++) {
                    if ((label >> i & 1) != 0) {
                        rows.get(i).add(column);
                    }
                }
                column++;
            }
        }
        for (int i = 0; i < m; i++) {
            rows.get(i).add(k + i);
        }
        if (extended) {
            List<Integer> everyPosition = new ArrayList<>();
            for (int position = 0; position <= n; position++) {
                everyPosition.add(position);
            }
            rows.add(everyPosition);
        }
        int[][] ones = rows.stream()
                .map(row -> row.stream().mapToInt(Integer::intValue).toArray())
                .toArray(int[][]::new);
        return SparseBitMatrix.ofRows(extended ? n + 1 : n, ones);
    }
}
