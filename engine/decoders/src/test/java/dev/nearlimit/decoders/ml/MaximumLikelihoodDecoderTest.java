package dev.nearlimit.decoders.ml;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.quantiser.NoQuantiser;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MaximumLikelihoodDecoderTest {
    private static Code randomCode(Random random, int k, int n) {
        BitMatrix G = new BitMatrix(k, n);
        for (int i = 0; i < k; i++) {
            G.set(i, i, true);
            for (int j = k; j < n; j++) {
                G.set(i, j, random.nextBoolean());
            }
        }
        return Code.ofGenerator("test", "test", G);
    }

    /** Correlation of a word in double precision: sum of LLRs where it is 0 less sum where it is 1. */
    private static double correlation(boolean[] word, LlrBatch batch, int frame) {
        double sum = 0;
        for (int i = 0; i < word.length; i++) {
            double llr = batch.values()[FrameBatch.softIndex(i, frame)];
            sum += word[i] ? -llr : llr;
        }
        return sum;
    }

    private static boolean[] codeword(Code code, int information) {
        BitMatrix G = code.generator();
        boolean[] word = new boolean[code.n()];
        for (int i = 0; i < code.k(); i++) {
            for (int j = 0; j < code.n(); j++) {
                word[j] ^= (information >> i & 1) != 0 && G.get(i, j);
            }
        }
        return word;
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6})
    void noWordHasAGreaterCorrelation(long seed) {
        Random random = new Random(seed);
        int k = 1 + random.nextInt(7);
        Code code = randomCode(random, k, k + 1 + random.nextInt(70));
        LlrBatch batch = RandomBatches.noisy(code, random, 1.2, new long[code.n()]);
        DecodedBatch decoded = new DecodedBatch(code.n());
        new MaximumLikelihoodSettings().newDecoder(code, new NoQuantiser()).decode(batch, decoded);
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            double answer = correlation(RandomBatches.frame(decoded.bits(), f), batch, f);
            double best = Double.NEGATIVE_INFINITY;
            for (int w = 0; w < 1 << k; w++) {
                best = Math.max(best, correlation(codeword(code, w), batch, f));
            }
            // Single precision may prefer a word that is worse by its rounding errors, about n * 2^-24 * |LLR|.
            assertEquals(best, answer, 1e-3, "seed " + seed + " frame " + f);
        }
        assertEquals(0, decoded.declaredFailures());
    }

    @Test
    void ofEquallyGoodWordsTheFirstInGrayOrderWins() {
        Code code = randomCode(new Random(9), 4, 9);
        DecodedBatch decoded = new DecodedBatch(code.n());
        new MaximumLikelihoodSettings().newDecoder(code, new NoQuantiser()).decode(new LlrBatch(code.n()), decoded);
        // All LLRs are 0, so all words are equally good, and word number 0 is the zero word.
        assertArrayEquals(new long[code.n()], decoded.bits());
        // The LLRs favour a 1 at information bit 1 and say nothing else: Gray codes 3, then 2, come first in the walk.
        LlrBatch batch = new LlrBatch(code.n());
        batch.values()[FrameBatch.softIndex(1, 7)] = -1f;
        new MaximumLikelihoodSettings().newDecoder(code, new NoQuantiser()).decode(batch, decoded);
        assertArrayEquals(codeword(code, 3), RandomBatches.frame(decoded.bits(), 7));
    }

    @Test
    void refusesCodesWithTooManyWords() {
        Code code = randomCode(new Random(1), 17, 20);
        assertTrue(new MaximumLikelihoodFamily().objection(code).isPresent());
        assertEquals(
                "maximum-likelihood does not fit test: it has 2^17 codewords to look at; k may be at most 16",
                assertThrows(
                                InvalidDecoderException.class,
                                () -> new MaximumLikelihoodSettings().newDecoder(code, new NoQuantiser()))
                        .getMessage());
    }
}
