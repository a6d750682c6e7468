package dev.nearlimit.codes;

import dev.nearlimit.codes.encoding.GeneratorProgram;
import dev.nearlimit.codes.encoding.ParityCheckProgram;
import dev.nearlimit.codes.encoding.WordProgram;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;

/**
 * Copies information bit i to position {@code informationPositions[i]} and computes the other positions by a program.
 * Parity is a function of the information, so that every correct program gives the same codeword.
 */
final class SystematicEncoder implements Encoder {
    private final int n;
    private final int[] informationPositions;
    private final WordProgram parity;

    private SystematicEncoder(int n, int[] informationPositions, WordProgram parity) {
        this.n = n;
        this.informationPositions = informationPositions.clone();
        this.parity = parity;
    }

    /**
     * The encoder that reads the fewest words: by the parity-check matrix where its structure allows, else by the
     * generator.
     *
     * @param generator k x n, systematic at {@code informationPositions}
     * @param parityCheck m x n, defining the same code
     */
    static SystematicEncoder of(BitMatrix generator, int[] informationPositions, SparseBitMatrix parityCheck) {
        WordProgram parity = ParityCheckProgram.cheaperThan(
                        GeneratorProgram.wordOperations(generator), parityCheck, informationPositions)
                .orElseGet(() -> GeneratorProgram.of(generator, informationPositions));
        return new SystematicEncoder(generator.columns(), informationPositions, parity);
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
        parity.run(codeword);
    }
}
