package dev.nearlimit.codes.field;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Cyclotomic cosets of 2 modulo an odd n: the orbits of doubling on 0 .. n-1. The exponents of alpha in one coset are
 * the zeros of one irreducible polynomial over GF(2) (MacWilliams and Sloane 1977, ch. 4 sec. 3).
 */
public final class CyclotomicCosets {
    private CyclotomicCosets() {}

    /**
     * The coset of a number, ascending.
     *
     * @param n odd, at least 1
     * @param member 0 .. n-1
     */
    public static int[] coset(int n, int member) {
        requireOdd(n);
        if (member < 0 || member >= n) {
            throw new IllegalArgumentException("member is " + member + ", must be 0 .. " + (n - 1));
        }
        int[] found = new int[32];
        int count = 0;
        long next = member;
        do {
            if (count == found.length) {
                found = Arrays.copyOf(found, 2 * count);
            }
            found[count++] = (int) next;
            next = 2 * next % n;
        } while (next != member);
        int[] coset = Arrays.copyOf(found, count);
        Arrays.sort(coset);
        return coset;
    }

    /** All cosets modulo an odd n in the order of their least members. */
    public static List<int[]> all(int n) {
        requireOdd(n);
        boolean[] seen = new boolean[n];
        List<int[]> cosets = new ArrayList<>();
        for (int member = 0; member < n; member++) {
            if (!seen[member]) {
                int[] coset = coset(n, member);
                for (int other : coset) {
                    seen[other] = true;
                }
                cosets.add(coset);
            }
        }
        return cosets;
    }

    private static void requireOdd(int n) {
        if (n < 1 || (n & 1) == 0) {
            throw new IllegalArgumentException("modulus is " + n + ", must be odd and positive");
        }
    }
}
