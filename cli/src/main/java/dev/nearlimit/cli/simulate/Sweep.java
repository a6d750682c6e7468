package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.failure.InputException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * One setting and the values that it is to take: {@code word=4..8}, {@code gain=-2..2:0.5} with a step,
 * {@code step=0.25,0.5,1} or {@code schedule=layered,flooding}; ranges and single values may be mixed.
 *
 * @param setting name of the setting, lower case
 * @param values in the order given, each once
 */
record Sweep(String setting, List<String> values) {
    private static final String NUMBER = "[+-]?\\d{1,6}(?:\\.\\d{1,6})?";
    private static final Pattern RANGE =
            Pattern.compile("(" + NUMBER + ")\\.\\.(" + NUMBER + ")(?::(" + NUMBER + "))?");
    private static final int MOST = 1000;

    Sweep {
        values = List.copyOf(values);
    }

    /** @throws InputException if the text is no such sweep, a range is empty or there are too many values */
    static Sweep parse(String text) {
        int equals = text.indexOf('=');
        String setting = equals < 0 ? "" : text.substring(0, equals).trim().toLowerCase(Locale.ROOT);
        if (setting.isEmpty()) {
            throw new InputException("sweep '" + text + "' names no setting; expected such as word=4..8, step=0.25,0.5"
                    + " or gain=-2..2:0.5");
        }
        Set<String> values = new LinkedHashSet<>();
        for (String part : text.substring(equals + 1).split(",", -1)) {
            String value = part.trim();
            if (value.isEmpty()) {
                throw new InputException("sweep '" + text + "' has an empty value");
            }
            if (value.contains("..")) {
                values.addAll(range(value, text));
            } else {
                values.add(value.toLowerCase(Locale.ROOT));
            }
        }
        return new Sweep(setting, List.copyOf(values));
    }

    private static List<String> range(String range, String text) {
        Matcher ends = RANGE.matcher(range);
        if (!ends.matches()) {
            throw new InputException("'" + range + "' in sweep '" + text
                    + "' is no range; expected start..end or start..end:step, such as 4..8 or -2..2:0.5");
        }
        BigDecimal value = new BigDecimal(ends.group(1));
        BigDecimal end = new BigDecimal(ends.group(2));
        BigDecimal step = ends.group(3) == null ? BigDecimal.ONE : new BigDecimal(ends.group(3));
        if (step.signum() <= 0 || end.compareTo(value) < 0) {
            throw new InputException("range '" + range + "' in sweep '" + text
                    + "' is empty: needs a step above 0 and an end not below its start");
        }
        if (end.subtract(value).divideToIntegralValue(step).compareTo(BigDecimal.valueOf(MOST)) >= 0) {
            throw new InputException(
                    "range '" + range + "' in sweep '" + text + "' gives more than " + MOST + " values");
        }
        List<String> values = new ArrayList<>();
        for (; value.compareTo(end) <= 0; value = value.add(step)) {
            values.add(value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString());
        }
        return values;
    }

    /** For options. */
    static final class Converter implements ITypeConverter<Sweep> {
        @Override
        public Sweep convert(String text) {
            return parse(text);
        }
    }
}
