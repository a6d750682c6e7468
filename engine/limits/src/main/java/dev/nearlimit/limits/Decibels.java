package dev.nearlimit.limits;

/** Power ratios between their linear form and decibels. */
public final class Decibels {
    private Decibels() {}

    /** The linear power ratio of {@code db}. */
    public static double toLinear(double db) {
        return Math.pow(10, db / 10);
    }

    /** A linear power ratio in dB; minus infinity for 0. */
    public static double fromLinear(double ratio) {
        return 10 * Math.log10(ratio);
    }

    /** A power ratio in dB, given its natural logarithm, so that ratios beyond the range of a double have one too. */
    static double fromNaturalLog(double logRatio) {
        return 10 / Math.log(10) * logRatio;
    }
}
