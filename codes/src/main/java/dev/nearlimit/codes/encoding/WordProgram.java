package dev.nearlimit.codes.encoding;

import java.util.Arrays;

/**
 * A straight-line program over the words of a batch: each step sets one word to the XOR of others, which may include the
 * word itself. Bit f of every word belongs to frame f, so that a step serves 64 frames. Immutable and free of state: it
 * may be shared by threads, and running it allocates nothing.
 */
public final class WordProgram {
    private final int[] target;
    private final int[] sourceEnd;
    private final int[] source;
    private final int wordsNeeded;

    private WordProgram(int[] target, int[] sourceEnd, int[] source) {
        this.target = target;
        this.sourceEnd = sourceEnd;
        this.source = source;
        this.wordsNeeded = 1
                + Math.max(
                        Arrays.stream(target).max().orElse(-1),
                        Arrays.stream(source).max().orElse(-1));
    }

    /**
     * Runs all steps in order.
     *
     * @param words at least {@link #wordsNeeded()} of them; targets are overwritten
     */
    public void run(long[] words) {
        if (words.length < wordsNeeded) {
            throw new IllegalArgumentException("program needs " + wordsNeeded + " words, got " + words.length);
        }
        int s = 0;
        for (int step = 0; step < target.length; step++) {
            long sum = 0;
            for (int end = sourceEnd[step]; s < end; s++) {
                sum ^= words[source[s]];
            }
            words[target[step]] = sum;
        }
    }

    /** One more than the highest word named. */
    public int wordsNeeded() {
        return wordsNeeded;
    }

    /** Words set in a run. */
    public int steps() {
        return target.length;
    }

    /** Words read in a run: the measure by which programs for the same codewords are compared. */
    public int wordOperations() {
        return source.length;
    }

    /** Collects steps in the order in which they will run. */
    static final class Builder {
        private int[] target = new int[64];
        private int[] sourceEnd = new int[64];
        private int[] source = new int[256];
        private int steps;
        private int sources;

        /** Starts a step, which sets {@code word} to the XOR of what {@link #add} names until the next step. */
        Builder set(int word) {
            if (steps == target.length) {
                target = Arrays.copyOf(target, 2 * steps);
                sourceEnd = Arrays.copyOf(sourceEnd, 2 * steps);
            }
            target[steps] = word;
            sourceEnd[steps++] = sources;
            return this;
        }

        Builder add(int... words) {
            if (source.length - sources < words.length) {
                source = Arrays.copyOf(source, Math.max(2 * source.length, sources + words.length));
            }
            System.arraycopy(words, 0, source, sources, words.length);
            sources += words.length;
            sourceEnd[steps - 1] = sources;
            return this;
        }

        WordProgram build() {
            return new WordProgram(
                    Arrays.copyOf(target, steps), Arrays.copyOf(sourceEnd, steps), Arrays.copyOf(source, sources));
        }
    }
}
