package dev.nearlimit.codes.catalogue;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the name that a mistyped one was most likely meant to be. */
final class NearMiss {
    private NearMiss() {}

    /** The nearest name, if no more than a third of its letters must be inserted, dropped or replaced. */
    static Optional<String> nearest(String typed, Collection<String> names) {
        return names.stream()
                .filter(name -> editDistance(typed, name) <= Math.max(1, name.length() / 3))
                .min(Comparator.comparingInt((String name) -> editDistance(typed, name))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /** Letters to insert, drop or replace to turn one word into the other (Levenshtein 1966). */
    static int editDistance(String a, String b) {
        int[] above = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[b.length() + 1];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replaced = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, 1 + Math.min(above[j], row[j - 1]));
            }
            above = row;
        }
        return above[b.length()];
    }
}
