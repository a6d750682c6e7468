package dev.nearlimit.codes.field;

/**
 * The finite field GF(2^m) with a primitive element alpha, a root of its polynomial. An element is an {@code int} of m
 * bits, bit i being the coefficient of alpha^i; the sum of two elements is their XOR. Multiplication goes through tables
 * of logarithms. Immutable.
 *
 * <p>Elements are trusted to lie in 0 .. 2^m-1: the methods are inner loops of decoders.
 */
public final class BinaryField {
    private final int m;
    private final int polynomial;
    private final int order;
    /** alpha^i for i = 0 .. 2*order-1, so that a sum of two logarithms needs no reduction. */
    private final int[] power;

    private final int[] logarithm;

    private BinaryField(int m, int polynomial) {
        this.m = m;
        this.polynomial = polynomial;
        this.order = (1 << m) - 1;
        this.power = new int[2 * order];
        this.logarithm = new int[order + 1];
        int element = 1;
        for (int i = 0; i < order; i++) {
            if (i > 0 && element == 1) {
                throw new IllegalArgumentException(
                        BinaryPolynomial.of(polynomial) + " is not primitive: x has order " + i + ", not " + order);
            }
            power[i] = element;
            power[i + order] = element;
            logarithm[element] = i;
            element <<= 1;
            if (element > order) {
                element ^= polynomial;
            }
        }
        if (element != 1) {
            throw new IllegalArgumentException(BinaryPolynomial.of(polynomial) + " is not primitive");
        }
    }

    /** The field of degree m on the polynomial of {@link PrimitivePolynomials}. */
    public static BinaryField ofDegree(int m) {
        return ofPolynomial(PrimitivePolynomials.ofDegree(m));
    }

    /**
     * The field on a primitive polynomial of degree 2 .. 16.
     *
     * @param polynomial bit i is the coefficient of x^i, the leading term included
     * @throws IllegalArgumentException if the degree is out of range or the polynomial is not primitive
     */
    public static BinaryField ofPolynomial(int polynomial) {
        int m = 31 - Integer.numberOfLeadingZeros(polynomial);
        if (m < 2 || m > 16) {
            throw new IllegalArgumentException(
                    "field polynomial " + BinaryPolynomial.of(polynomial & 0xFFFFFFFFL) + " must have degree 2 .. 16");
        }
        if ((polynomial & 1) == 0) {
            throw new IllegalArgumentException(BinaryPolynomial.of(polynomial) + " is divisible by x");
        }
        return new BinaryField(m, polynomial);
    }

    /** The degree m of the field over GF(2). */
    public int degree() {
        return m;
    }

    /** The field's polynomial, bit i being the coefficient of x^i. */
    public int polynomial() {
        return polynomial;
    }

    /** Order of alpha, 2^m - 1: the number of elements that are not zero. */
    public int order() {
        return order;
    }

    /** alpha to any power, negative ones included. */
    public int alpha(int exponent) {
        return power[Math.floorMod(exponent, order)];
    }

    /** The i with alpha^i = element, 0 .. 2^m-2. @throws ArithmeticException for 0 */
    public int log(int element) {
        if (element == 0) {
            throw new ArithmeticException("0 has no logarithm");
        }
        return logarithm[element];
    }

    public int multiply(int a, int b) {
        return a == 0 || b == 0 ? 0 : power[logarithm[a] + logarithm[b]];
    }

    /** The multiplicative inverse. @throws ArithmeticException for 0 */
    public int inverse(int element) {
        return power[order - log(element)];
    }

    /** {@code a / b}. @throws ArithmeticException if b is 0 */
    public int divide(int a, int b) {
        int log = log(b);
        return a == 0 ? 0 : power[logarithm[a] + order - log];
    }

    /** {@code element} to a power; 0 to the power 0 is 1. @throws ArithmeticException for 0 to a negative power */
    public int power(int element, int exponent) {
        if (element == 0) {
            if (exponent < 0) {
                throw new ArithmeticException("0 has no inverse");
            }
            return exponent == 0 ? 1 : 0;
        }
        return power[(int) Math.floorMod((long) logarithm[element] * exponent, (long) order)];
    }

    /** The value of a polynomial over GF(2) at an element, by Horner's rule. */
    public int evaluate(BinaryPolynomial f, int element) {
        int value = 0;
        for (int exponent = f.degree(); exponent >= 0; exponent--) {
            value = multiply(value, element) ^ (f.coefficient(exponent) ? 1 : 0);
        }
        return value;
    }

    /**
     * The minimal polynomial of alpha^exponent over GF(2): the product of (x - alpha^j) over the cyclotomic coset of the
     * exponent (MacWilliams and Sloane 1977, ch. 4 sec. 3).
     */
    public BinaryPolynomial minimalPolynomial(int exponent) {
        int[] coset = CyclotomicCosets.coset(order, Math.floorMod(exponent, order));
        int[] product = new int[coset.length + 1];
        product[0] = 1;
        for (int factor = 0; factor < coset.length; factor++) {
            int root = alpha(coset[factor]);
            for (int i = factor + 1; i > 0; i--) {
                product[i] = product[i - 1] ^ multiply(root, product[i]);
            }
            product[0] = multiply(root, product[0]);
        }
        long bits = 0;
        for (int i = 0; i < product.length; i++) {
            if (product[i] > 1) {
                throw new IllegalStateException("minimal polynomial of alpha^" + exponent + " is not binary");
            }
            bits |= (long) product[i] << i;
        }
        return BinaryPolynomial.of(bits);
    }

    /** As {@code GF(2^8) on x^8 + x^4 + x^3 + x^2 + 1}. */
    @Override
    public String toString() {
        return "GF(2^" + m + ") on " + BinaryPolynomial.of(polynomial);
    }
}
