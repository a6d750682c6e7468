package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import java.time.Duration;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * A span of time with its unit: {@code 90s}, {@code 5m} or {@code 2h}.
 *
 * @param duration more than zero
 */
public record TimeLimit(Duration duration) {
    private static final Pattern SPAN = Pattern.compile("(\\d{1,6})([smh])");

    /** @throws InputException if the text is no such span */
    public static TimeLimit parse(String text) {
        Matcher span = SPAN.matcher(text);
        if (!span.matches() || Integer.parseInt(span.group(1)) == 0) {
            throw new InputException("time limit is '" + text + "'; expected such as 90s, 5m or 2h");
        }
        long amount = Long.parseLong(span.group(1));
        return new TimeLimit(
                switch (span.group(2)) {
                    case "s" -> Duration.ofSeconds(amount);
                    case "m" -> Duration.ofMinutes(amount);
                    default -> Duration.ofHours(amount);
                });
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<TimeLimit> {
        @Override
        public TimeLimit convert(String text) {
            return parse(text);
        }
    }
}
