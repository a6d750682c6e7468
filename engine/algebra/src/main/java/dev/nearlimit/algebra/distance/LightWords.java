package dev.nearlimit.algebra.distance;

import dev.nearlimit.algebra.weight.InfeasibleEnumerationException;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.CancellationException;

/**
 * Lists every codeword of low weight by walking through all codewords in Gray order: complete, and feasible for codes of
 * at most 2^{@value #MAX_DIMENSION} words. Words come by weight, those of equal weight in the order of the walk.
 */
public final class LightWords {
    /** Base-two logarithm of the most words that are walked through: under a second for codes of up to 128 bits. */
    public static final int MAX_DIMENSION = 26;

    /** Most words that are listed. */
    public static final int MOST_WORDS = 1 << 16;

    private LightWords() {}

    /**
     * All words of the minimum weight.
     *
     * @return a matrix with a word a row
     * @throws InfeasibleEnumerationException if the code has too many words, or too many of minimum weight
     */
    public static BitMatrix lightest(Code code) {
        requireFeasible(code);
        int[] least = {Integer.MAX_VALUE};
        walk(code, (word, weight) -> least[0] = Math.min(least[0], weight));
        return list(code, least[0]);
    }

    /**
     * All words but the zero word of at most a weight; none if the minimum distance is larger.
     *
     * @return a matrix with a word a row
     * @throws InfeasibleEnumerationException if the code has too many words, or too many of that weight
     */
    public static BitMatrix upToWeight(Code code, int heaviest) {
        requireFeasible(code);
        return list(code, heaviest);
    }

    private record Word(long[] bits, int weight) {}

    private static BitMatrix list(Code code, int heaviest) {
        List<Word> found = new ArrayList<>();
        walk(code, (word, weight) -> {
            if (weight <= heaviest) {
                if (found.size() == MOST_WORDS) {
                    throw new InfeasibleEnumerationException(code.designator() + " has more than " + MOST_WORDS
                            + " words of weight " + heaviest + " or less; a list of so many is of no use");
                }
                found.add(new Word(word.clone(), weight));
            }
        });
        found.sort(Comparator.comparingInt(Word::weight));
        BitMatrix words = new BitMatrix(found.size(), code.n());
        for (int r = 0; r < found.size(); r++) {
            long[] bits = found.get(r).bits();
            for (int c = 0; c < code.n(); c++) {
                words.set(r, c, (bits[c >> 6] >>> (c & 63) & 1) != 0);
            }
        }
        return words;
    }

    private interface Visitor {
        void visit(long[] word, int weight);
    }

    private static void walk(Code code, Visitor visitor) {
        BitMatrix generator = code.generator();
        long[][] rows = new long[code.k()][];
        for (int r = 0; r < rows.length; r++) {
            rows[r] = generator.row(r);
        }
        long[] word = new long[generator.wordsPerRow()];
        for (int step = 1; step < 1 << code.k(); step++) {
            long[] row = rows[Integer.numberOfTrailingZeros(step)];
            int weight = 0;
            for (int w = 0; w < word.length; w++) {
                word[w] ^= row[w];
                weight += Long.bitCount(word[w]);
            }
            visitor.visit(word, weight);
            if ((step & 0xFFFFF) == 0 && Thread.currentThread().isInterrupted()) {
                throw new CancellationException("interrupted while listing words of low weight");
            }
        }
    }

    private static void requireFeasible(Code code) {
        if (code.k() > MAX_DIMENSION) {
            throw new InfeasibleEnumerationException(code.designator() + " has 2^" + code.k()
                    + " codewords; those of low weight are listed for up to 2^" + MAX_DIMENSION);
        }
    }
}
