package dev.nearlimit.cli.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import java.util.OptionalDouble;

/**
 * Writes quantities with sensible digits and their unit: hundredths of a decibel, two significant digits of an error
 * rate, three of everything else.
 */
final class Quantities {
    /** What stands where a value is not known. */
    static final String NONE = "\u2013";

    private static final String MINUS = "\u2212";
    private static final String NARROW_SPACE = "\u202f";
    private static final String SUPERSCRIPT_DIGITS = "\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079";

    private Quantities() {}

    /** Decibels to a hundredth, without the unit: {@code -0.81}. */
    static String decibels(double db) {
        String digits = String.format(Locale.ROOT, "%.2f", db);
        return digits.equals("-0.00") ? "0.00" : digits.replace("-", MINUS);
    }

    /** Decibels to a hundredth, without the unit, or a dash. */
    static String decibels(OptionalDouble db) {
        return db.isPresent() ? decibels(db.getAsDouble()) : NONE;
    }

    /** An error rate to two significant digits, in powers of ten below a hundredth. */
    static String errorRate(double rate) {
        if (rate == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(rate).round(new MathContext(2));
        if (rate >= 0.01) {
            return rounded.toPlainString();
        }
        int exponent = rounded.precision() - rounded.scale() - 1;
        String mantissa =
                rounded.scaleByPowerOfTen(-exponent).stripTrailingZeros().toPlainString();
        String power = "10" + superscript(exponent);
        return mantissa.equals("1") ? power : mantissa + "\u00d7" + power;
    }

    /** An error rate, or a dash. */
    static String errorRate(OptionalDouble rate) {
        return rate.isPresent() ? errorRate(rate.getAsDouble()) : NONE;
    }

    /** A frequency in Hz, kHz, MHz or GHz. */
    static String hertz(double hz) {
        return scaled(hz, "Hz");
    }

    /** A bit rate in bit/s, kbit/s and so on. */
    static String bitsPerSecond(double bps) {
        return scaled(bps, "bit/s");
    }

    /** A time in s, ms, \u00b5s or ns. */
    static String seconds(double s) {
        double size = Math.abs(s);
        if (size == 0 || size >= 1) {
            return significant(s) + " s";
        }
        if (size >= 1e-3) {
            return significant(s * 1e3) + " ms";
        }
        return size >= 1e-6 ? significant(s * 1e6) + " \u00b5s" : significant(s * 1e9) + " ns";
    }

    /** A whole number with its thousands set apart. */
    static String count(double value) {
        String digits = new BigDecimal(value)
                .setScale(0, java.math.RoundingMode.HALF_UP)
                .toPlainString()
                .replace("-", MINUS);
        return groupThousands(digits);
    }

    /** Three significant digits; whole digits are never dropped and large numbers have their thousands set apart. */
    static String significant(double value) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return NONE;
        }
        if (Math.abs(value) >= 100) {
            return count(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(3));
        String digits = rounded.signum() == 0
                ? "0"
                : rounded.stripTrailingZeros().toPlainString().replace("-", MINUS);
        return digits;
    }

    private static String scaled(double value, String unit) {
        double size = Math.abs(value);
        if (size >= 1e9) {
            return significant(value / 1e9) + " G" + unit;
        }
        if (size >= 1e6) {
            return significant(value / 1e6) + " M" + unit;
        }
        return size >= 1e3 ? significant(value / 1e3) + " k" + unit : significant(value) + " " + unit;
    }

    private static String groupThousands(String digits) {
        if (digits.length() <= 4) {
            return digits;
        }
        StringBuilder grouped = new StringBuilder(digits);
        for (int i = digits.length() - 3; i > 0 && Character.isDigit(digits.charAt(i - 1)); i -= 3) {
            grouped.insert(i, NARROW_SPACE);
        }
        return grouped.toString();
    }

    private static String superscript(int exponent) {
        StringBuilder raised = new StringBuilder(exponent < 0 ? "\u207b" : "");
        for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
            raised.append(SUPERSCRIPT_DIGITS.charAt(digit - '0'));
        }
        return raised.toString();
    }
}
