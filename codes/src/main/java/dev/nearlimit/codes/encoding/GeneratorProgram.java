package dev.nearlimit.codes.encoding;

import dev.nearlimit.codes.gf2.BitMatrix;

/** Encoding with a systematic generator matrix: each parity word is the XOR of the information words that it names. */
public final class GeneratorProgram {
    private GeneratorProgram() {}

    /** Words that the program for a k x n systematic generator matrix reads: the ones of its parity part. */
    public static long wordOperations(BitMatrix generator) {
        long ones = 0;
        for (int row = 0; row < generator.rows(); row++) {
            ones += generator.rowWeight(row) - 1;
        }
        return ones;
    }

    /**
     * The program that completes a codeword whose information words are in place.
     *
     * @param generator k x n, its column at information position i being the i-th unit vector
     * @param informationPositions k positions
     */
    public static WordProgram of(BitMatrix generator, int[] informationPositions) {
        boolean[] isInformation = InformationSet.mask(generator.columns(), informationPositions);
        BitMatrix columns = generator.transpose();
        WordProgram.Builder program = new WordProgram.Builder();
        for (int position = 0; position < generator.columns(); position++) {
            if (!isInformation[position]) {
                program.set(position);
                for (int i : columns.onesOfRow(position)) {
                    program.add(informationPositions[i]);
                }
            }
        }
        return program.build();
    }
}
