package dev.nearlimit.codes.field;

/**
 * The primitive polynomial that each field GF(2^m) is built on unless a standard demands another. They are the ones that
 * textbooks print (Lin and Costello, Error Control Coding, 2nd ed. 2004, Table 2.7; common practice), so that generator
 * polynomials agree with printed tables. {@link BinaryField} checks that each is primitive.
 */
public final class PrimitivePolynomials {
    /** Entry m-2 belongs to degree m; bit i is the coefficient of x^i. */
    private static final int[] TEXTBOOK = {
        0x7, // x^2 + x + 1
        0xB, // x^3 + x + 1
        0x13, // x^4 + x + 1
        0x25, // x^5 + x^2 + 1
        0x43, // x^6 + x + 1
        0x89, // x^7 + x^3 + 1
        0x11D, // x^8 + x^4 + x^3 + x^2 + 1
        0x211, // x^9 + x^4 + 1
        0x409, // x^10 + x^3 + 1
        0x805, // x^11 + x^2 + 1
        0x1053, // x^12 + x^6 + x^4 + x + 1
        0x201B, // x^13 + x^4 + x^3 + x + 1
        0x4443, // x^14 + x^10 + x^6 + x + 1
        0x8003, // x^15 + x + 1
        0x1100B, // x^16 + x^12 + x^3 + x + 1
    };

    private PrimitivePolynomials() {}

    /**
     * The polynomial of a degree, bit i being the coefficient of x^i.
     *
     * @param m degree, 2 .. 16
     */
    public static int ofDegree(int m) {
        if (m < 2 || m > 16) {
            throw new IllegalArgumentException("field degree is " + m + ", must be 2 .. 16");
        }
        return TEXTBOOK[m - 2];
    }
}
