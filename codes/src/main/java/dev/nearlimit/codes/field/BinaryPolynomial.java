package dev.nearlimit.codes.field;

import java.util.Arrays;

/**
 * A polynomial over GF(2), packed 64 coefficients to a word: the coefficient of x^i is bit {@code i % 64} of word
 * {@code i / 64}. Immutable. Invariant: the last word is not zero, so the zero polynomial has no words.
 */
public final class BinaryPolynomial {
    private static final BinaryPolynomial ZERO = new BinaryPolynomial(new long[0]);
    private static final BinaryPolynomial ONE = of(1);

    private final long[] words;

    private BinaryPolynomial(long[] words) {
        this.words = words;
    }

    public static BinaryPolynomial zero() {
        return ZERO;
    }

    public static BinaryPolynomial one() {
        return ONE;
    }

    /** The polynomial whose coefficient of x^i is bit i of {@code bits}; 0x13 is x^4 + x + 1. */
    public static BinaryPolynomial of(long bits) {
        return trimmed(new long[] {bits});
    }

    /** The sum of the given powers of x; a power named twice cancels. */
    public static BinaryPolynomial ofExponents(int... exponents) {
        int highest = Arrays.stream(exponents).max().orElse(0);
        long[] sum = new long[(highest >> 6) + 1];
        for (int exponent : exponents) {
            if (exponent < 0) {
                throw new IllegalArgumentException("exponent is " + exponent + ", must not be negative");
            }
            sum[exponent >> 6] ^= 1L << (exponent & 63);
        }
        return trimmed(sum);
    }

    private static BinaryPolynomial trimmed(long[] words) {
        int length = words.length;
        while (length > 0 && words[length - 1] == 0) {
            length--;
        }
        return new BinaryPolynomial(length == words.length ? words : Arrays.copyOf(words, length));
    }

    public boolean isZero() {
        return words.length == 0;
    }

    /** The highest power with coefficient 1; -1 for the zero polynomial. */
    public int degree() {
        return words.length == 0 ? -1 : degree(words, words.length);
    }

    /** Whether the coefficient of x^exponent is 1; false beyond the degree. */
    public boolean coefficient(int exponent) {
        int word = exponent >> 6;
        return word < words.length && (words[word] >>> (exponent & 63) & 1L) != 0;
    }

    /** Number of coefficients that are 1. */
    public int weight() {
        int weight = 0;
        for (long word : words) {
            weight += Long.bitCount(word);
        }
        return weight;
    }

    /** The coefficients as bits of a {@code long}. @throws ArithmeticException if the degree is 64 or more */
    public long toLong() {
        if (words.length > 1) {
            throw new ArithmeticException("degree is " + degree() + ", a long holds up to 63");
        }
        return words.length == 0 ? 0 : words[0];
    }

    public BinaryPolynomial add(BinaryPolynomial other) {
        long[] sum = Arrays.copyOf(words, Math.max(words.length, other.words.length));
        for (int w = 0; w < other.words.length; w++) {
            sum[w] ^= other.words[w];
        }
        return trimmed(sum);
    }

    /** The product; work is this polynomial's weight times the other's words. */
    public BinaryPolynomial multiply(BinaryPolynomial other) {
        if (isZero() || other.isZero()) {
            return ZERO;
        }
        long[] product = new long[((degree() + other.degree()) >> 6) + 1];
        for (int exponent = 0; exponent <= degree(); exponent++) {
            if (coefficient(exponent)) {
                addShifted(other.words, exponent, product);
            }
        }
        return trimmed(product);
    }

    /** The remainder on division, of lower degree than {@code divisor}. */
    public BinaryPolynomial remainder(BinaryPolynomial divisor) {
        return divide(divisor)[1];
    }

    /** The quotient on division, without the remainder. */
    public BinaryPolynomial quotient(BinaryPolynomial divisor) {
        return divide(divisor)[0];
    }

    private BinaryPolynomial[] divide(BinaryPolynomial divisor) {
        if (divisor.isZero()) {
            throw new ArithmeticException("division of " + this + " by the zero polynomial");
        }
        int divisorDegree = divisor.degree();
        long[] rest = words.clone();
        long[] quotient = new long[words.length];
        for (int degree = degree(); degree >= divisorDegree; degree = degree(rest, rest.length)) {
            int shift = degree - divisorDegree;
            addShifted(divisor.words, shift, rest);
            quotient[shift >> 6] |= 1L << (shift & 63);
        }
        return new BinaryPolynomial[] {trimmed(quotient), trimmed(rest)};
    }

    /** The greatest common divisor; zero only if both are zero. */
    public BinaryPolynomial gcd(BinaryPolynomial other) {
        BinaryPolynomial a = this;
        BinaryPolynomial b = other;
        while (!b.isZero()) {
            BinaryPolynomial rest = a.remainder(b);
            a = b;
            b = rest;
        }
        return a;
    }

    private static int degree(long[] words, int length) {
        for (int w = length - 1; w >= 0; w--) {
            if (words[w] != 0) {
                return (w << 6) + 63 - Long.numberOfLeadingZeros(words[w]);
            }
        }
        return -1;
    }

    /** Adds {@code source * x^shift} to {@code target}, which is long enough for every 1 that is added. */
    private static void addShifted(long[] source, int shift, long[] target) {
        int words = shift >> 6;
        int bits = shift & 63;
        for (int w = 0; w < source.length; w++) {
            target[w + words] ^= source[w] << bits;
            long carried = bits == 0 ? 0 : source[w] >>> (64 - bits);
            if (carried != 0) {
                target[w + words + 1] ^= carried;
            }
        }
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof BinaryPolynomial that && Arrays.equals(words, that.words);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(words);
    }

    /** Highest power first: {@code x^4 + x + 1}. */
    @Override
    public String toString() {
        if (isZero()) {
            return "0";
        }
        StringBuilder text = new StringBuilder();
        for (int exponent = degree(); exponent >= 0; exponent--) {
            if (coefficient(exponent)) {
                text.append(text.isEmpty() ? "" : " + ");
                text.append(exponent == 0 ? "1" : exponent == 1 ? "x" : "x^" + exponent);
            }
        }
        return text.toString();
    }
}
