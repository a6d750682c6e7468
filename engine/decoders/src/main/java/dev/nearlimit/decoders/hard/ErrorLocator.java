package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.field.BinaryField;
import java.util.Arrays;

/**
 * The shortest linear feedback shift register that yields a sequence of syndromes (Massey 1969, "Shift-register synthesis
 * and BCH decoding"); its connection polynomial is the error locator, whose roots are the inverses of alpha^e for errors
 * at the coefficients of x^e. Allocates nothing after it is made.
 */
final class ErrorLocator {
    private final BinaryField field;
    private final int t;
    /** Coefficients of the connection polynomial, of the one before the last change of length, and room for a copy. */
    private int[] locator;

    private int[] before;
    private int[] spare;
    private int degree;

    ErrorLocator(BinaryField field, int t) {
        this.field = field;
        this.t = t;
        this.locator = new int[2 * t + 2];
        this.before = new int[2 * t + 2];
        this.spare = new int[2 * t + 2];
    }

    /**
     * Finds the locator.
     *
     * @param syndrome S_1 .. S_2t at 1 .. 2t
     * @return the register's length; above t when t errors cannot explain the syndromes
     */
    int find(int[] syndrome) {
        Arrays.fill(locator, 0);
        Arrays.fill(before, 0);
        locator[0] = 1;
        before[0] = 1;
        int length = 0;
        int sinceChange = 1;
        int discrepancyBefore = 1;
        for (int step = 1; step <= 2 * t; step++) {
            int discrepancy = syndrome[step];
            for (int i = 1; i <= length; i++) {
                discrepancy ^= field.multiply(locator[i], syndrome[step - i]);
            }
            if (discrepancy == 0) {
                sinceChange++;
                continue;
            }
            int factor = field.divide(discrepancy, discrepancyBefore);
            boolean grows = 2 * length < step;
            if (grows) {
                System.arraycopy(locator, 0, spare, 0, locator.length);
            }
            for (int i = 0; i + sinceChange < locator.length; i++) {
                locator[i + sinceChange] ^= field.multiply(factor, before[i]);
            }
            if (grows) {
                length = step - length;
                discrepancyBefore = discrepancy;
                sinceChange = 1;
                int[] old = before;
                before = spare;
                spare = old;
            } else {
                sinceChange++;
            }
        }
        degree = length;
        return length;
    }

    /** The locator's value at alpha^exponent. */
    int at(int exponent) {
        int x = field.alpha(exponent);
        int value = 0;
        for (int i = Math.min(degree, t); i >= 0; i--) {
            value = field.multiply(value, x) ^ locator[i];
        }
        return value;
    }
}
