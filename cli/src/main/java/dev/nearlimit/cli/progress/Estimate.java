package dev.nearlimit.cli.progress;

import dev.nearlimit.cli.output.Numbers;

/** Says how much is done and how much time is left, supposing that the rest goes as fast as what is done. */
final class Estimate {
    private Estimate() {}

    /** As {@code 25 %, about 1 min 0 s left}; without a guess while nothing is done. */
    static String text(double elapsedS, double fraction) {
        String left = fraction > 0 ? ", about " + Numbers.duration(elapsedS * (1 - fraction) / fraction) + " left" : "";
        return share(fraction) + left;
    }

    /** As {@code 25 %}. */
    static String share(double fraction) {
        return Math.round(100 * fraction) + " %";
    }
}
