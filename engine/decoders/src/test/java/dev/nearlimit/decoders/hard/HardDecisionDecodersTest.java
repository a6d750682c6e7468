package dev.nearlimit.decoders.hard;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.quantiser.NoQuantiser;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Hard-decision decoders against search through all codewords; codes of up to 31 positions, words as ints. */
class HardDecisionDecodersTest {
    /** Words sent, and errors added to them, of a batch under way. */
    private static final class Trial {
        final Code code;
        final Decoder decoder;
        final LlrBatch received;
        final DecodedBatch decoded;
        final int[] sent = new int[FrameBatch.FRAMES];
        final int[] word = new int[FrameBatch.FRAMES];
        final int[] codewords;

        Trial(Code code, Decoder decoder) {
            this.code = code;
            this.decoder = decoder;
            this.received = new LlrBatch(code.n());
            this.decoded = new DecodedBatch(code.n());
            this.codewords = new int[1 << code.k()];
            for (int w = 1; w < codewords.length; w++) {
                codewords[w] =
                        codewords[w & (w - 1)] ^ (int) code.generator().word(Integer.numberOfTrailingZeros(w), 0);
            }
        }

        void put(int frame, int codeword, int errors) {
            sent[frame] = codeword;
            word[frame] = codeword ^ errors;
        }

        void decode() {
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                for (int i = 0; i < code.n(); i++) {
                    received.values()[FrameBatch.softIndex(i, f)] = (word[f] >> i & 1) == 0 ? 0.3f : -0.3f;
                }
            }
            decoder.decode(received, decoded);
        }

        int answer(int frame) {
            long[] packed = new long[1];
            FrameBatch.extractFrame(decoded.bits(), frame, packed);
            return (int) packed[0];
        }

        boolean declaredFailure(int frame) {
            return (decoded.declaredFailures() >>> frame & 1L) != 0;
        }

        int distanceToCode(int received) {
            int least = Integer.MAX_VALUE;
            for (int codeword : codewords) {
                least = Math.min(least, Integer.bitCount(codeword ^ received));
            }
            return least;
        }

        boolean isCodeword(int candidate) {
            return distanceToCode(candidate) == 0;
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"hamming:7,4", "hamming-extended:8,4", "bch:15,7", "bch:15,5", "golay:24,12", "reed-muller:1,4"})
    void syndromeDecodingFindsANearestCodeword(String designator) {
        Code code = Catalogue.standard().build(designator);
        Trial trial = new Trial(code, new SyndromeSettings().newDecoder(code, new NoQuantiser()));
        CosetLeaders leaders = CosetLeaders.of(code);
        Random random = new Random(1);
        for (int batch = 0; batch < 8; batch++) {
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                trial.put(f, 0, random.nextInt(1 << code.n()));
            }
            trial.decode();
            assertEquals(0, trial.decoded.declaredFailures());
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                String where = designator + ", seed 1, batch " + batch + " frame " + f;
                int away = Integer.bitCount(trial.answer(f) ^ trial.word[f]);
                assertEquals(trial.distanceToCode(trial.word[f]), away, where);
                assertTrue(trial.isCodeword(trial.answer(f)), where);
                assertTrue(away <= leaders.coveringRadius(), where);
            }
        }
    }

    /** Every pattern of up to t errors is corrected. The values of t are those of the codes' well-known distances. */
    @ParameterizedTest
    @CsvSource({
        "'bch:15,11', 1",
        "'bch:15,7', 2",
        "'bch:15,5', 3",
        "'bch:31,16', 3",
        "'bch:31,11', 5",
        "'bch:15,7+shorten=3', 2",
        "'bch-extended:16,7', 2",
        "'bch-extended:16,5', 3",
        "'bch-extended:16,7+shorten=2', 2",
        "'hamming:7,4', 1",
        "'hamming-extended:8,4', 1",
        "'golay:23,12', 3",
        "'golay:24,12', 3",
        "'reed-muller:1,4', 3",
        "'repetition:7', 3",
        "'parity-check:8', 0"
    })
    void everyPatternOfUpToTErrorsIsCorrected(String designator, int t) {
        Code code = Catalogue.standard().build(designator);
        assertEquals(t, BoundedDistanceSettings.errorsCorrected(code));
        Trial trial = new Trial(code, new BoundedDistanceSettings().newDecoder(code, new NoQuantiser()));
        Random random = new Random(2);
        int inBatch = 0;
        for (int weight = 0; weight <= t; weight++) {
            int errors = (1 << weight) - 1;
            while (errors < 1 << code.n() && errors >= 0) {
                trial.put(inBatch++, trial.codewords[random.nextInt(trial.codewords.length)], errors);
                if (inBatch == FrameBatch.FRAMES) {
                    expectAllCorrected(trial, designator);
                    inBatch = 0;
                }
                errors = nextOfSameWeight(errors);
            }
        }
        while (inBatch < FrameBatch.FRAMES) {
            trial.put(inBatch++, 0, 0);
        }
        expectAllCorrected(trial, designator);
    }

    private static int nextOfSameWeight(int pattern) {
        if (pattern == 0) {
            return -1;
        }
        int low = pattern & -pattern;
        int carried = pattern + low;
        return carried | (((pattern ^ carried) / low) >>> 2);
    }

    private static void expectAllCorrected(Trial trial, String designator) {
        trial.decode();
        assertEquals(0, trial.decoded.declaredFailures(), designator);
        assertArrayEquals(new int[FrameBatch.FRAMES], trial.decoded.iterations());
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            assertEquals(
                    trial.sent[f],
                    trial.answer(f),
                    designator + ", errors " + Integer.toBinaryString(trial.word[f] ^ trial.sent[f]));
        }
    }

    /** Random words: an answer if and only if a codeword lies within t, otherwise a failure and the word as received. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "bch:15,7",
                "bch:15,5",
                "bch:31,16",
                "bch:15,7+shorten=3",
                "bch-extended:16,7",
                "bch-extended:16,5",
                "bch-extended:16,7+shorten=2",
                "hamming-extended:8,4",
                "golay:24,12",
                "reed-muller:1,4",
                "parity-check:8"
            })
    void beyondTErrorsAnswersLieWithinTOfTheReceivedWord(String designator) {
        Code code = Catalogue.standard().build(designator);
        int t = BoundedDistanceSettings.errorsCorrected(code);
        Trial trial = new Trial(code, new BoundedDistanceSettings().newDecoder(code, new NoQuantiser()));
        Random random = new Random(3);
        int failures = 0;
        int batches = code.k() > 12 ? 4 : 20;
        for (int batch = 0; batch < batches; batch++) {
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                trial.put(f, 0, (int) (random.nextLong() & (1L << code.n()) - 1));
            }
            trial.decode();
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                String where = designator + ", seed 3, batch " + batch + " frame " + f;
                boolean reachable = trial.distanceToCode(trial.word[f]) <= t;
                assertEquals(!reachable, trial.declaredFailure(f), where);
                if (reachable) {
                    assertTrue(trial.isCodeword(trial.answer(f)), where);
                    assertTrue(Integer.bitCount(trial.answer(f) ^ trial.word[f]) <= t, where);
                } else {
                    assertEquals(trial.word[f], trial.answer(f), where);
                    failures++;
                }
            }
        }
        assertTrue(failures > 0 && failures < batches * FrameBatch.FRAMES, designator + " had " + failures);
    }

    /** Long codes, beyond search: random patterns of exactly t errors are corrected in every lane. */
    @ParameterizedTest
    @ValueSource(strings = {"bch:127,64", "bch:255,131", "bch-extended:128,64", "bch:63,45+shorten=9"})
    void longCodesCorrectTErrors(String designator) {
        Code code = Catalogue.standard().build(designator);
        int t = BoundedDistanceSettings.errorsCorrected(code);
        Decoder decoder = new BoundedDistanceSettings().newDecoder(code, new NoQuantiser());
        Random random = new Random(4);
        long[] information = random.longs(code.k()).toArray();
        long[] sent = new long[code.n()];
        code.encoder().encode(information, sent);
        LlrBatch received = new LlrBatch(code.n());
        DecodedBatch decoded = new DecodedBatch(code.n());
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            for (int i = 0; i < code.n(); i++) {
                received.values()[FrameBatch.softIndex(i, f)] = (sent[i] >>> f & 1L) == 0 ? 1f : -1f;
            }
            random.ints(0, code.n()).distinct().limit(t).forEach(flip(received, f));
        }
        decoder.decode(received, decoded);
        assertEquals(0, decoded.declaredFailures(), designator);
        assertArrayEquals(sent, decoded.bits(), designator);
    }

    private static java.util.function.IntConsumer flip(LlrBatch batch, int frame) {
        return i -> batch.values()[FrameBatch.softIndex(i, frame)] *= -1f;
    }
}
