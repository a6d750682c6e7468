package dev.nearlimit.decoders.ml;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

/**
 * Finds for every frame the codeword of greatest correlation, the sum of LLRs where the word is 0 less the sum where it
 * is 1, by walking through all words in Gray order with all 64 frames at once.
 *
 * <p>What is kept of a word c is its loss, the sum of the LLRs at its ones, to be made least: the correlation is a
 * constant less twice the loss. Order of operations: word number w (w = 0 .. 2^k-1) has the information bits of the
 * Gray code w ^ (w >> 1), information bit 0 being the bit that changes most often. The positions are cut into groups of
 * {@value #GROUP}; for each group and each of its patterns the sum of the LLRs at the pattern's ones is tabulated,
 * added in ascending order of position in single precision; a word's loss is the sum of its groups' entries in ascending
 * order of group. So a loss depends on the word alone and no error builds up along the walk. The first word of least
 * loss in the order of w wins. LLRs must be finite.
 */
final class MaximumLikelihoodDecoder implements Decoder {
    /** Positions whose sums are tabulated together. */
    static final int GROUP = 4;

    private static final int PATTERNS = 1 << GROUP;

    private final int n;
    private final int k;
    private final int groups;
    private final long[][] generatorRow;
    private final SparseBitMatrix columns;
    private final float[] table;
    private final float[] loss = new float[FrameBatch.FRAMES];
    private final float[] leastLoss = new float[FrameBatch.FRAMES];
    private final int[] best = new int[FrameBatch.FRAMES];
    private final long[] word;
    private final long[] information;

    MaximumLikelihoodDecoder(BitMatrix generator) {
        this.n = generator.columns();
        this.k = generator.rows();
        this.groups = (n + GROUP - 1) / GROUP;
        this.generatorRow = new long[k][];
        for (int i = 0; i < k; i++) {
            generatorRow[i] = generator.row(i);
        }
        this.columns = SparseBitMatrix.of(generator.transpose());
        this.table = new float[groups * PATTERNS * FrameBatch.FRAMES];
        this.word = new long[generator.wordsPerRow()];
        this.information = new long[k];
    }

    @Override
    public void decode(LlrBatch received, DecodedBatch decoded) {
        tabulate(received.values());
        Arrays.fill(word, 0L);
        Arrays.fill(leastLoss, Float.POSITIVE_INFINITY);
        Arrays.fill(best, 0);
        for (int w = 0; w < 1 << k; w++) {
            if (w > 0) {
                step(generatorRow[Integer.numberOfTrailingZeros(w)]);
            }
            sumLoss();
            keepBest(w);
        }
        encodeBest(decoded.bits());
        Arrays.fill(decoded.iterations(), 0);
        decoded.setDeclaredFailures(0);
    }

    private void tabulate(float[] values) {
        for (int group = 0; group < groups; group++) {
            int first = group * GROUP;
            for (int pattern = 0; pattern < PATTERNS; pattern++) {
                int to = (group * PATTERNS + pattern) * FrameBatch.FRAMES;
                Arrays.fill(table, to, to + FrameBatch.FRAMES, 0f);
                for (int i = 0; i < GROUP && first + i < n; i++) {
                    if ((pattern >> i & 1) != 0) {
                        add(values, FrameBatch.softIndex(first + i, 0), table, to);
                    }
                }
            }
        }
    }

    private void step(long[] row) {
        for (int i = 0; i < word.length; i++) {
            word[i] ^= row[i];
        }
    }

    private void sumLoss() {
        Arrays.fill(loss, 0f);
        for (int group = 0; group < groups; group++) {
            int first = group * GROUP;
            int pattern = (int) (word[first >> 6] >>> (first & 63)) & (PATTERNS - 1);
            add(table, (group * PATTERNS + pattern) * FrameBatch.FRAMES, loss, 0);
        }
    }

    private void keepBest(int w) {
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            if (loss[f] < leastLoss[f]) {
                leastLoss[f] = loss[f];
                best[f] = w;
            }
        }
    }

    private void encodeBest(long[] bits) {
        Arrays.fill(information, 0L);
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            int message = best[f] ^ (best[f] >>> 1);
            for (int i = 0; i < k; i++) {
                information[i] |= (message >>> i & 1L) << f;
            }
        }
        columns.multiplyBatch(information, bits);
    }

    private static void add(float[] values, int from, float[] total, int to) {
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            total[to + f] += values[from + f];
        }
    }
}
