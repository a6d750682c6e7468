package dev.nearlimit.limits;

/** Guards on what users ask for; every condition is written so that a value that is not a number fails. */
final class Checks {
    private Checks() {}

    static double finite(double value, String name) {
        if (!Double.isFinite(value)) {
            throw new InvalidLimitException(name + " is " + value + ", must be a finite number");
        }
        return value;
    }

    static double energy(double esn0) {
        if (!(esn0 >= 0 && Double.isFinite(esn0))) {
            throw new InvalidLimitException("Es/N0 is " + esn0 + ", must be a finite ratio of at least 0");
        }
        return esn0;
    }

    static double insideUnitInterval(double value, String name) {
        if (!(value > 0 && value < 1)) {
            throw new InvalidLimitException(name + " is " + value + ", must lie between 0 and 1, both excluded");
        }
        return value;
    }

    static double positive(double value, String name) {
        if (!(value > 0 && Double.isFinite(value))) {
            throw new InvalidLimitException(name + " is " + value + ", must be a finite number above 0");
        }
        return value;
    }

    static void block(int n, int k) {
        if (n < 1) {
            throw new InvalidLimitException("n is " + n + ", must be at least 1 channel use");
        }
        if (k < 1 || k > n) {
            throw new InvalidLimitException("k is " + k + ", must be between 1 and n = " + n);
        }
    }
}
