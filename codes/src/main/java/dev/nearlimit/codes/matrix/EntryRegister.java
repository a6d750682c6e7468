package dev.nearlimit.codes.matrix;

import java.util.Arrays;
import java.util.Optional;

/** Remembers which entries a file gave in which line, to find one that was given twice. */
final class EntryRegister {
    private long[] keys = new long[64];
    private int[] lines = new int[64];
    private int count;

    /**
     * An entry given twice.
     *
     * @param key the entry's key
     * @param firstLine line that gave it first
     * @param secondLine line that gave it again
     */
    record Duplicate(long key, int firstLine, int secondLine) {}

    void add(long key, int line) {
        if (count == keys.length) {
            keys = Arrays.copyOf(keys, 2 * count);
            lines = Arrays.copyOf(lines, 2 * count);
        }
        keys[count] = key;
        lines[count++] = line;
    }

    /** The least key that was added more than once. */
    Optional<Duplicate> duplicate() {
        long[] sorted = Arrays.copyOf(keys, count);
        Arrays.sort(sorted);
        for (int i = 1; i < count; i++) {
            if (sorted[i] == sorted[i - 1]) {
                int first = indexOf(sorted[i], 0);
                return Optional.of(new Duplicate(sorted[i], lines[first], lines[indexOf(sorted[i], first + 1)]));
            }
        }
        return Optional.empty();
    }

    private int indexOf(long key, int from) {
        int index = from;
        while (keys[index] != key) {
            index++;
        }
        return index;
    }
}
