package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * Shifts of biased noise in signal amplitudes, as typed: {@code 0.5,0.75,1}.
 *
 * @param values in the order given
 */
public record ShiftList(List<Double> values) {
    private static final Pattern NUMBER = Pattern.compile("\\d{1,3}(\\.\\d{1,9})?");

    public ShiftList {
        values = List.copyOf(values);
    }

    /** @throws InputException if a part is no number */
    public static ShiftList parse(String text) {
        List<Double> values = new ArrayList<>();
        for (String part : text.split(",", -1)) {
            if (!NUMBER.matcher(part).matches()) {
                throw new InputException("shift is '" + part + "'; expected a list of numbers such as 0.5,0.75,1");
            }
            values.add(Double.valueOf(part));
        }
        return new ShiftList(values);
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<ShiftList> {
        @Override
        public ShiftList convert(String text) {
            return parse(text);
        }
    }
}
