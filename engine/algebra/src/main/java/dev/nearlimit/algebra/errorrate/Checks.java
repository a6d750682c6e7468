package dev.nearlimit.algebra.errorrate;

/** Guards on what users ask for; every condition is written so that a value that is not a number fails. */
final class Checks {
    /** Beyond this nothing is physical, and energies stay well inside the range of a double. */
    private static final double LARGEST_DB = 200;

    private Checks() {}

    static double ebn0Db(double value) {
        if (!(Math.abs(value) <= LARGEST_DB)) {
            throw new InvalidErrorRateException("Eb/N0 is " + value + " dB, must lie between -200 and 200 dB");
        }
        return value;
    }

    static double crossover(double p) {
        if (!(p >= 0 && p <= 0.5)) {
            throw new InvalidErrorRateException("crossover probability is " + p + ", must lie between 0 and 1/2");
        }
        return p;
    }

    static double target(double errorRate) {
        if (!(errorRate > 0 && errorRate < 1)) {
            throw new InvalidErrorRateException(
                    "target error rate is " + errorRate + ", must lie between 0 and 1, both excluded");
        }
        return errorRate;
    }

    static void block(int n, int k) {
        if (k < 1 || n < k) {
            throw new IllegalArgumentException("(n,k) is (" + n + "," + k + "), needs 1 <= k <= n");
        }
    }
}
