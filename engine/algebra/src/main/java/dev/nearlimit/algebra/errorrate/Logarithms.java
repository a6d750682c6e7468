package dev.nearlimit.algebra.errorrate;

import java.math.BigInteger;

/** Natural logarithms of whole numbers of any size. */
final class Logarithms {
    private static final double LN2 = Math.log(2);
    private static final int SAFE_BITS = 1000;

    private Logarithms() {}

    /** ln of a number that is not negative; minus infinity for 0. Relative error about 1e-16 of the result or of 1. */
    static double of(BigInteger number) {
        int excess = Math.max(0, number.bitLength() - SAFE_BITS);
        return Math.log(number.shiftRight(excess).doubleValue()) + excess * LN2;
    }

    /** ln(1 - p) where {@code logP} is ln p, p at most 1/2. */
    static double ofComplement(double logP) {
        return Math.log1p(-Math.exp(logP));
    }
}
