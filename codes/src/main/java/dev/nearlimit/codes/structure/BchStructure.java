package dev.nearlimit.codes.structure;

/**
 * A primitive narrow-sense binary BCH code, possibly extended by an overall parity bit and possibly shortened.
 * Position j of the codeword carries the coefficient of {@code x^(2^m - 2 - shortened - j)} in
 * 2^m - 1 - shortened positions, so that information comes first; the parity bit, when there is one, is the last.
 *
 * @param m degree of the field GF(2^m), 2 .. 16
 * @param fieldPolynomial primitive polynomial of the field with its leading term, bit i being the coefficient of x^i
 * @param t errors corrected: alpha, alpha^2, .., alpha^(2t) are zeros of the generator polynomial
 * @param extended whether an overall parity bit follows
 * @param shortened information bits left out: the coefficients of the highest powers, which are zero and not sent
 */
public record BchStructure(int m, int fieldPolynomial, int t, boolean extended, int shortened) implements Structure {
    public BchStructure {
        if (m < 2 || m > 16) {
            throw new IllegalArgumentException("field degree is " + m + ", must be 2 .. 16");
        }
        if (t < 1) {
            throw new IllegalArgumentException("t is " + t + ", must be at least 1");
        }
        if (shortened < 0) {
            throw new IllegalArgumentException("shortened is " + shortened + ", must not be negative");
        }
    }
}
