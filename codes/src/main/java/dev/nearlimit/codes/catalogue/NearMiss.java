package dev.nearlimit.codes.catalogue;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the name that a mistyped one was most likely meant to be. */
final class NearMiss {
    private NearMiss() {}

    /** The nearest name, if no more than a third of its letters are wrong. */
    static Optional<String> nearest(String typed, Collection<String> names) {
        return names.stream()
                .filter(name -> editDistance(typed, name) <= Math.max(1, name.length() / 3))
                .min(Comparator.comparingInt((String name) -> editDistance(typed, name))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /** Letters to insert, drop, replace or swap with their neighbour to turn one word into the other (Damerau 1964). */
    static int editDistance(String a, String b) {
        int[][] distance = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    distance[i][j] = i + j;
                    continue;
                }
                int replaced = distance[i - 1][j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                distance[i][j] = Math.min(replaced, 1 + Math.min(distance[i - 1][j], distance[i][j - 1]));
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    distance[i][j] = Math.min(distance[i][j], distance[i - 2][j - 2] + 1);
                }
            }
        }
        return distance[a.length()][b.length()];
    }
}
