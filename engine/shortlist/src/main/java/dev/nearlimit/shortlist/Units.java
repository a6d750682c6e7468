package dev.nearlimit.shortlist;

import java.util.Locale;

/** Quantities with their units, in the digits that a reader can use. */
final class Units {
    private Units() {}

    static String hertz(double hz) {
        return scaled(hz, "Hz");
    }

    static String seconds(double s) {
        if (s >= 1) {
            return digits(s) + " s";
        }
        return s >= 1e-3 ? digits(s * 1e3) + " ms" : digits(s * 1e6) + " us";
    }

    /** Hundredths of a decibel; a positive difference never looks like none. */
    static String decibels(double db) {
        return db < 0.005 ? "less than 0.01 dB" : String.format(Locale.ROOT, "%.2f dB", db);
    }

    /** An error rate to two significant digits: {@code 1.3e-2}. */
    static String errorRate(double rate) {
        if (rate == 1 || rate == 0) {
            return rate == 1 ? "1" : "0";
        }
        return String.format(Locale.ROOT, "%.1e", rate)
                .replaceFirst("e([+-])0(\\d)$", "e$1$2")
                .replace("e+", "e");
    }

    static String operations(double count) {
        return digits(count) + " operations a bit";
    }

    private static String scaled(double value, String unit) {
        if (value >= 1e6) {
            return digits(value / 1e6) + " M" + unit;
        }
        return value >= 1e3 ? digits(value / 1e3) + " k" + unit : digits(value) + " " + unit;
    }

    /** Three significant digits, whole numbers above a thousand in full. */
    private static String digits(double value) {
        if (value >= 100) {
            return String.format(Locale.ROOT, "%.0f", value);
        }
        return value >= 10 ? String.format(Locale.ROOT, "%.1f", value) : String.format(Locale.ROOT, "%.2f", value);
    }
}
