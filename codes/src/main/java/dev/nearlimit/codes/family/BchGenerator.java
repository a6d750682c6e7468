package dev.nearlimit.codes.family;

import dev.nearlimit.codes.field.BinaryField;
import dev.nearlimit.codes.field.BinaryPolynomial;
import dev.nearlimit.codes.field.CyclotomicCosets;
import java.util.ArrayList;
import java.util.List;

/**
 * The generator polynomial of a primitive narrow-sense binary BCH code.
 *
 * @param m degree of the field; the code has length 2^m - 1
 * @param fieldPolynomial the field's primitive polynomial
 * @param t the largest t for which alpha, alpha^2, .., alpha^(2t) are all zeros, so that 2t+1 is the Bose distance
 * @param generator the product of the distinct minimal polynomials of those zeros
 */
record BchGenerator(int m, int fieldPolynomial, int t, BinaryPolynomial generator) {
    int n() {
        return (1 << m) - 1;
    }

    int k() {
        return n() - generator.degree();
    }

    /** All codes of length 2^m - 1 in the order of falling k, the repetition code last. */
    static List<BchGenerator> allOfDegree(int m) {
        BinaryField field = BinaryField.ofDegree(m);
        int n = field.order();
        boolean[] isZero = new boolean[n];
        BinaryPolynomial generator = BinaryPolynomial.one();
        List<BchGenerator> codes = new ArrayList<>();
        // Every even exponent is in the coset of a smaller one, so odd exponents are all that can add zeros.
        for (int first = 1; first < n; first += 2) {
            if (isZero[first]) {
                continue;
            }
            for (int member : CyclotomicCosets.coset(n, first)) {
                isZero[member] = true;
            }
            generator = generator.multiply(field.minimalPolynomial(first));
            codes.add(new BchGenerator(m, field.polynomial(), errorsCorrected(isZero), generator));
        }
        return List.copyOf(codes);
    }

    private static int errorsCorrected(boolean[] isZero) {
        int run = 0;
        while (run + 1 < isZero.length && isZero[run + 1]) {
            run++;
        }
        // The run ends at an even exponent: the next is odd or it would be a zero with its half.
        return run / 2;
    }
}
