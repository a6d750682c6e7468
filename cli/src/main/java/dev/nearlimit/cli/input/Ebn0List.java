package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * Values of Eb/N0 in whole micro-dB: a list {@code 1,1.5,2} or a range {@code 1:0.5:3} of start, step and end, the end
 * included where the step meets it; both may be mixed. Ascending, each value once.
 *
 * @param microDb the values
 */
public record Ebn0List(List<Long> microDb) {
    private static final Pattern NUMBER = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{1,6})?");
    private static final BigDecimal MICRO = BigDecimal.valueOf(1_000_000);
    private static final long LARGEST_MICRO_DB = 100_000_000;
    private static final int MOST = 1000;

    public Ebn0List {
        microDb = List.copyOf(microDb);
    }

    /** @throws InputException if a part is no number, a range runs backwards, or there are too many values */
    public static Ebn0List parse(String text) {
        TreeSet<Long> values = new TreeSet<>();
        for (String part : text.split(",", -1)) {
            String[] ends = part.split(":", -1);
            if (ends.length == 1) {
                values.add(microDb(part));
            } else if (ends.length == 3) {
                values.addAll(range(part, microDb(ends[0]), microDb(ends[1]), microDb(ends[2])));
            } else {
                throw new InputException(
                        "'" + part + "' is no range of Eb/N0; expected start:step:end, such as 1:0.5:3");
            }
        }
        if (values.size() > MOST) {
            throw tooMany(text);
        }
        return new Ebn0List(List.copyOf(values));
    }

    private static List<Long> range(String text, long start, long step, long end) {
        if (step <= 0 || end < start) {
            throw new InputException("range '" + text + "' needs a step above 0 and an end not below its start");
        }
        if ((end - start) / step >= MOST) {
            throw tooMany(text);
        }
        List<Long> values = new ArrayList<>();
        for (long value = start; value <= end; value += step) {
            values.add(value);
        }
        return values;
    }

    private static long microDb(String text) {
        if (!NUMBER.matcher(text).matches()) {
            throw new InputException("Eb/N0 is '" + text
                    + "'; expected a number in dB with at most six decimals, a list 1,1.5,2 or a range 1:0.5:3");
        }
        long value = new BigDecimal(text).multiply(MICRO).longValueExact();
        if (Math.abs(value) > LARGEST_MICRO_DB) {
            throw new InputException("Eb/N0 is " + text + " dB; expected -100 to 100");
        }
        return value;
    }

    private static InputException tooMany(String text) {
        return new InputException("'" + text + "' gives more than " + MOST + " values of Eb/N0");
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<Ebn0List> {
        @Override
        public Ebn0List convert(String text) {
            return parse(text);
        }
    }
}
