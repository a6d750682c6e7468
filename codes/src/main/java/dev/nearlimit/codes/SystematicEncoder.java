package dev.nearlimit.codes;

import dev.nearlimit.codes.gf2.BitMatrix;

/**
 * Encodes with a generator matrix that carries information bit i unchanged at position {@code informationPositions[i]}:
 * information is copied, and every other position is the sum of the information bits that its column names. Plain and
 * general; costs as many word operations a batch as the parity part has ones.
 */
final class SystematicEncoder implements Encoder {
    private final int n;
    private final int[] informationPositions;
    private final int[] parityPositions;
    private final int[][] sourcesOfParity;

    SystematicEncoder(BitMatrix generator, int[] informationPositions) {
        this.n = generator.columns();
        this.informationPositions = informationPositions.clone();
        boolean[] isInformation = new boolean[n];
        for (int position : informationPositions) {
            isInformation[position] = true;
        }
        this.parityPositions = new int[n - informationPositions.length];
        this.sourcesOfParity = new int[parityPositions.length][];
        BitMatrix columns = generator.transpose();
        int next = 0;
        for (int position = 0; position < n; position++) {
            if (!isInformation[position]) {
                parityPositions[next] = position;
                sourcesOfParity[next++] = columns.onesOfRow(position);
            }
        }
    }

    @Override
    public void encode(long[] information, long[] codeword) {
        if (information.length < informationPositions.length || codeword.length < n) {
            throw new IllegalArgumentException("code is (" + n + "," + informationPositions.length
                    + "), information has " + information.length + " words, codeword " + codeword.length);
        }
        for (int i = 0; i < informationPositions.length; i++) {
            codeword[informationPositions[i]] = information[i];
        }
        for (int p = 0; p < parityPositions.length; p++) {
            long sum = 0;
            for (int source : sourcesOfParity[p]) {
                sum ^= information[source];
            }
            codeword[parityPositions[p]] = sum;
        }
    }
}
