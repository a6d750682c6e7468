package dev.nearlimit.decoders;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Random;

/** Seeded input for tests. */
public final class RandomBatches {
    private RandomBatches() {}

    /**
     * LLRs of random codewords on BPSK with Gaussian noise.
     *
     * @param codeword receives the words sent
     * @param deviation of the noise, the signal being +-1
     */
    public static LlrBatch noisy(Code code, Random random, double deviation, long[] codeword) {
        long[] information = new long[code.k()];
        for (int i = 0; i < information.length; i++) {
            information[i] = random.nextLong();
        }
        code.encoder().encode(information, codeword);
        LlrBatch batch = new LlrBatch(code.n());
        for (int i = 0; i < code.n(); i++) {
            for (int f = 0; f < FrameBatch.FRAMES; f++) {
                double sent = (codeword[i] >>> f & 1L) == 0 ? 1 : -1;
                double received = sent + deviation * random.nextGaussian();
                batch.values()[FrameBatch.softIndex(i, f)] = (float) (2 * received / (deviation * deviation));
            }
        }
        return batch;
    }

    /** Bits of one frame. */
    public static boolean[] frame(long[] bits, int frame) {
        boolean[] result = new boolean[bits.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = (bits[i] >>> frame & 1L) != 0;
        }
        return result;
    }

    /** A matrix whose rows have weights between two bounds and whose columns all have a one. */
    public static SparseBitMatrix matrix(Random random, int rows, int columns, int least, int most) {
        int[][] ones = new int[rows][];
        for (int r = 0; r < rows; r++) {
            int[] shuffled = random.ints(0, columns).distinct().limit(columns).toArray();
            ones[r] = java.util.Arrays.copyOf(shuffled, least + random.nextInt(most - least + 1));
        }
        for (int c = 0; c < columns; c++) {
            int wanted = c;
            if (java.util.Arrays.stream(ones)
                    .noneMatch(row -> java.util.Arrays.stream(row).anyMatch(x -> x == wanted))) {
                int r = random.nextInt(rows);
                ones[r] = java.util.Arrays.copyOf(ones[r], ones[r].length + 1);
                ones[r][ones[r].length - 1] = c;
            }
        }
        return SparseBitMatrix.ofRows(columns, ones);
    }

    /** A quasi-cyclic matrix with blocks of the identity, shifted at random, each present with probability 0.7. */
    public static SparseBitMatrix quasiCyclic(Random random, int blockRows, int blockColumns, int size) {
        int[][] ones = new int[blockRows * size][];
        for (int i = 0; i < blockRows; i++) {
            int[] shift = new int[blockColumns];
            int present = 0;
            for (int j = 0; j < blockColumns; j++) {
                shift[j] = j == i || random.nextDouble() < 0.7 ? random.nextInt(size) : -1;
                present += shift[j] >= 0 ? 1 : 0;
            }
            for (int z = 0; z < size; z++) {
                int[] row = new int[present];
                int next = 0;
                for (int j = 0; j < blockColumns; j++) {
                    if (shift[j] >= 0) {
                        row[next++] = j * size + (z + shift[j]) % size;
                    }
                }
                ones[i * size + z] = row;
            }
        }
        return SparseBitMatrix.ofRows(blockColumns * size, ones);
    }
}
