package dev.nearlimit.algebra.errorrate;

/** The logarithm of a sum of positive terms given by their logarithms, scaled by the largest so that none overflows. */
final class LogSum {
    private double largest = Double.NEGATIVE_INFINITY;
    private double scaledSum;

    /** Adds a term exp(logTerm); minus infinity adds nothing. */
    void add(double logTerm) {
        if (logTerm == Double.NEGATIVE_INFINITY) {
            return;
        }
        if (logTerm <= largest) {
            scaledSum += Math.exp(logTerm - largest);
        } else {
            scaledSum = scaledSum * Math.exp(largest - logTerm) + 1;
            largest = logTerm;
        }
    }

    /** ln of the sum; minus infinity if it is empty. */
    double value() {
        return largest + (scaledSum == 0 ? 0 : Math.log(scaledSum));
    }
}
