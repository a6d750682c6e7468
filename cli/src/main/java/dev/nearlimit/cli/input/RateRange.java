package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import picocli.CommandLine.ITypeConverter;

/**
 * A range of code rates, both ends included: {@code 1/3..3/4}; one rate alone is the range of that rate.
 *
 * @param low least rate
 * @param high greatest rate, at least {@code low}
 */
public record RateRange(double low, double high) {
    /** @throws InputException if the text is no range, or its ends are in the wrong order */
    public static RateRange parse(String text) {
        int dots = text.indexOf("..");
        Fraction low = Fraction.parse(dots < 0 ? text : text.substring(0, dots));
        Fraction high = dots < 0 ? low : Fraction.parse(text.substring(dots + 2));
        if (low.value() > high.value()) {
            throw new InputException("range '" + text + "' ends below its start");
        }
        return new RateRange(low.value(), high.value());
    }

    public boolean contains(double rate) {
        return low <= rate && rate <= high;
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<RateRange> {
        @Override
        public RateRange convert(String text) {
            return parse(text);
        }
    }
}
