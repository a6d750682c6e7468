package dev.nearlimit.cli.output;

import com.fasterxml.jackson.core.io.NumberOutput;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.Locale;

/** Numbers as people read them, with the digits that matter and no more. Unknown values are a dash. */
public final class Numbers {
    /** What stands for a value that is not known or does not exist. */
    public static final String UNKNOWN = "-";

    private static final int COUNT_DIGITS = 18;

    private Numbers() {}

    /** The shortest digits that give the number back, the same on every JVM. */
    public static String exact(double value) {
        return NumberOutput.toString(value, true);
    }

    /** A level or a distance between levels: hundredths of a decibel. */
    public static String db(double value) {
        return fixed(value, 2);
    }

    /** A fixed number of decimals. */
    public static String fixed(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return UNKNOWN;
        }
        String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
        // No negative zero: it would say that there is a sign to think about.
        return text.matches("-0(\\.0*)?") ? text.substring(1) : text;
    }

    /** At least two decimals and as many more as the number has, up to six: {@code 1.50}, {@code 1.125}. */
    public static String trimmed(double value) {
        String text = fixed(value, 6);
        int end = text.length();
        int least = text.indexOf('.') + 3;
        while (end > least && text.charAt(end - 1) == '0') {
            end--;
        }
        return text.substring(0, end);
    }

    /** An error rate: two significant digits, {@code 1.2e-3}; 0 and 1 as they are. */
    public static String errorRate(double value) {
        if (!Double.isFinite(value)) {
            return UNKNOWN;
        }
        if (value == 0 || value == 1) {
            return value == 0 ? "0" : "1";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(2));
        int exponent = rounded.precision() - rounded.scale() - 1;
        String mantissa = rounded.scaleByPowerOfTen(-exponent).setScale(1).toPlainString();
        return mantissa + "e" + exponent;
    }

    /** An interval of error rates, {@code 1.0e-3 .. 1.5e-3}. */
    public static String errorRates(double low, double high) {
        return errorRate(low) + " .. " + errorRate(high);
    }

    /** A count in full up to 18 digits, beyond that to five significant ones, {@code 1.2345e27}. */
    public static String count(BigInteger value) {
        String digits = value.toString();
        if (digits.length() <= COUNT_DIGITS) {
            return digits;
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(5));
        int exponent = rounded.precision() - rounded.scale() - 1;
        return rounded.scaleByPowerOfTen(-exponent).setScale(4).toPlainString() + "e" + exponent;
    }

    /** A quantity to three significant digits with a decimal prefix, {@code 12.3 M}. */
    public static String engineering(double value) {
        if (!Double.isFinite(value)) {
            return UNKNOWN;
        }
        double scaled = value;
        String[] prefixes = {"", " k", " M", " G"};
        int prefix = 0;
        while (Math.abs(scaled) >= 999.5 && prefix < prefixes.length - 1) {
            scaled /= 1000;
            prefix++;
        }
        int decimals = Math.abs(scaled) >= 99.95 ? 0 : Math.abs(scaled) >= 9.995 ? 1 : 2;
        return fixed(scaled, decimals) + prefixes[prefix];
    }

    /** A duration for a person: {@code 0.8 s}, {@code 42 s}, {@code 3 min 5 s}, {@code 2 h 10 min}. */
    public static String duration(double seconds) {
        if (!Double.isFinite(seconds) || seconds < 0) {
            return UNKNOWN;
        }
        if (seconds < 9.95) {
            return fixed(seconds, 1) + " s";
        }
        long whole = Math.round(seconds);
        if (whole < 60) {
            return whole + " s";
        }
        return whole < 3600
                ? whole / 60 + " min " + whole % 60 + " s"
                : whole / 3600 + " h " + whole % 3600 / 60 + " min";
    }
}
