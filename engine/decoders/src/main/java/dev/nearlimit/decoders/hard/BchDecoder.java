package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.field.BinaryField;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

/**
 * Decodes BCH codes frame by frame: syndromes, error locator by {@link ErrorLocator}, its roots by trying every position
 * (Chien 1964). A locator that has not as many roots among the positions sent as its degree says, or whose degree
 * exceeds t, is a failure; roots at shortened positions do not count.
 *
 * <p>A code with an overall parity bit is decoded without it first; the word found is accepted if it differs from the
 * received one, parity bit included, in at most t positions.
 */
final class BchDecoder implements Decoder {
    private final BinaryField field;
    private final SparseBitMatrix parityCheck;
    private final int t;
    private final boolean extended;
    /** Positions without the parity bit; position j carries the coefficient of x^(inner-1-j). */
    private final int inner;

    private final ErrorLocator locator;
    private final int[] syndrome;
    private final long[] word;
    private final int[] errorAt;

    BchDecoder(BchStructure structure, SparseBitMatrix parityCheck) {
        this.field = BinaryField.ofPolynomial(structure.fieldPolynomial());
        this.parityCheck = parityCheck;
        this.t = structure.t();
        this.extended = structure.extended();
        this.inner = field.order() - structure.shortened();
        int n = inner + (extended ? 1 : 0);
        if (n != parityCheck.columns()) {
            throw new IllegalArgumentException(
                    "structure says n = " + n + ", parity-check matrix has " + parityCheck.columns() + " columns");
        }
        this.locator = new ErrorLocator(field, t);
        this.syndrome = new int[2 * t + 1];
        this.word = new long[BitMatrix.wordsFor(n)];
        this.errorAt = new int[t];
    }

    @Override
    public void decode(LlrBatch received, DecodedBatch decoded) {
        long[] bits = decoded.bits();
        received.hardDecisions(bits);
        long failures = 0;
        for (long rest = parityCheck.unsatisfiedLanes(bits); rest != 0; rest &= rest - 1) {
            int frame = Long.numberOfTrailingZeros(rest);
            if (!correct(frame, bits)) {
                failures |= 1L << frame;
            }
        }
        Arrays.fill(decoded.iterations(), 0);
        decoded.setDeclaredFailures(failures);
    }

    private boolean correct(int frame, long[] bits) {
        FrameBatch.extractFrame(bits, frame, word);
        boolean parityFails = takeSyndromes();
        int errors = locate();
        if (errors < 0) {
            return false;
        }
        // Each correction turns the overall parity, so that it tells whether the parity bit itself is wrong.
        boolean parityBitWrong = extended && (parityFails ^ (errors & 1) != 0);
        if (errors + (parityBitWrong ? 1 : 0) > t) {
            return false;
        }
        for (int i = 0; i < errors; i++) {
            bits[errorAt[i]] ^= 1L << frame;
        }
        if (parityBitWrong) {
            bits[inner] ^= 1L << frame;
        }
        return true;
    }

    /** Fills {@code syndrome[1 .. 2t]} from the word without its parity bit; says whether the overall parity is odd. */
    private boolean takeSyndromes() {
        Arrays.fill(syndrome, 0);
        int ones = 0;
        for (int w = 0; w < word.length; w++) {
            ones += Long.bitCount(word[w]);
            for (long rest = word[w]; rest != 0; rest &= rest - 1) {
                int position = (w << 6) + Long.numberOfTrailingZeros(rest);
                if (position < inner) {
                    int exponent = inner - 1 - position;
                    for (int j = 1; j < 2 * t; j += 2) {
                        syndrome[j] ^= field.alpha(exponent * j);
                    }
                }
            }
        }
        for (int j = 2; j <= 2 * t; j += 2) {
            syndrome[j] = field.multiply(syndrome[j / 2], syndrome[j / 2]);
        }
        return (ones & 1) != 0;
    }

    /** Puts the positions in error into {@code errorAt} and gives their number, or -1 if no t errors explain it. */
    private int locate() {
        int degree = locator.find(syndrome);
        if (degree > t) {
            return -1;
        }
        int found = 0;
        for (int position = 0; position < inner && found < degree; position++) {
            if (locator.at(-(inner - 1 - position)) == 0) {
                errorAt[found++] = position;
            }
        }
        return found == degree ? found : -1;
    }
}
