package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * A ratio as typed: {@code 1/2}, {@code 324/648} or {@code 0.5}.
 *
 * @param value the ratio; finite and not negative
 * @param text as typed
 */
public record Fraction(double value, String text) {
    private static final Pattern QUOTIENT = Pattern.compile("(\\d{1,9})/(\\d{1,9})");
    private static final Pattern DECIMAL = Pattern.compile("(\\d{1,9}(\\.\\d{1,15})?|\\.\\d{1,15})(e-?\\d{1,2})?");

    /** @throws InputException if the text is no such ratio */
    public static Fraction parse(String text) {
        Matcher quotient = QUOTIENT.matcher(text);
        if (quotient.matches()) {
            BigInteger below = new BigInteger(quotient.group(2));
            if (below.signum() == 0) {
                throw unusable(text);
            }
            return new Fraction(Double.parseDouble(quotient.group(1)) / below.doubleValue(), text);
        }
        if (!DECIMAL.matcher(text).matches()) {
            throw unusable(text);
        }
        return new Fraction(new BigDecimal(text).doubleValue(), text);
    }

    private static InputException unusable(String text) {
        return new InputException(
                "'" + text + "' is no ratio; expected a fraction such as 1/2 or a number such as 0.5");
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<Fraction> {
        @Override
        public Fraction convert(String text) {
            return parse(text);
        }
    }
}
