package dev.nearlimit.codes.family;

import dev.nearlimit.codes.KnownDistance;
import java.math.BigInteger;
import java.util.Optional;

/**
 * When the minimum distance of a primitive narrow-sense BCH code is certain to be its designed distance 2t+1. It is never
 * less (BCH bound); each rule below shows a word of that weight or excludes every greater distance. A code to which none
 * applies may have a greater distance.
 */
final class BchDistance {
    private BchDistance() {}

    static Optional<KnownDistance> of(BchGenerator code) {
        int n = code.n();
        int designed = 2 * code.t() + 1;
        if (n % designed == 0) {
            // (x^n + 1) / (x^(n/designed) + 1) has weight 2t+1 and vanishes at alpha, .., alpha^2t.
            return Optional.of(new KnownDistance(
                    designed, "designed distance divides n, MacWilliams and Sloane 1977, ch. 9 sec. 3"));
        }
        if (Integer.bitCount(designed + 1) == 1) {
            // The punctured Reed-Muller code of order m-h, distance 2^h - 1, is a subcode.
            return Optional.of(new KnownDistance(
                    designed, "designed distance is 2^h - 1, MacWilliams and Sloane 1977, ch. 9 sec. 3"));
        }
        if (spheresOverlap(n, code.t() + 1, n - code.k())) {
            // Not 2t+3 or more by the sphere-packing bound, and odd because the extended code is invariant under a
            // transitive group (Peterson 1961).
            return Optional.of(new KnownDistance(
                    designed, "sphere packing and odd minimum weight, MacWilliams and Sloane 1977, ch. 9 sec. 3"));
        }
        return Optional.empty();
    }

    /** Whether spheres of a radius around 2^k words cannot be disjoint: the sum of C(n,i) exceeds 2^(n-k). */
    private static boolean spheresOverlap(int n, int radius, int checks) {
        BigInteger binomial = BigInteger.ONE;
        BigInteger volume = BigInteger.ONE;
        for (int i = 1; i <= Math.min(radius, n); i++) {
            binomial = binomial.multiply(BigInteger.valueOf(n - i + 1L)).divide(BigInteger.valueOf(i));
            volume = volume.add(binomial);
        }
        return volume.compareTo(BigInteger.ONE.shiftLeft(checks)) > 0;
    }
}
