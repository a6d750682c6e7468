package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;

/**
 * A range of lengths in bits, both ends included: {@code 100..700}; one length alone is the range of that length.
 *
 * @param low least length
 * @param high greatest length, at least {@code low}
 */
public record LengthRange(int low, int high) {
    private static final Pattern RANGE = Pattern.compile("(\\d{1,9})(?:\\.\\.(\\d{1,9}))?");

    /** @throws InputException if the text is no range, or its ends are in the wrong order */
    public static LengthRange parse(String text) {
        Matcher range = RANGE.matcher(text);
        if (!range.matches()) {
            throw new InputException("'" + text + "' is no range of lengths; expected such as 100..700");
        }
        int low = Integer.parseInt(range.group(1));
        int high = range.group(2) == null ? low : Integer.parseInt(range.group(2));
        if (low > high) {
            throw new InputException("range '" + text + "' ends below its start");
        }
        return new LengthRange(low, high);
    }

    public boolean contains(int length) {
        return low <= length && length <= high;
    }

    /** For options. */
    public static final class Converter implements ITypeConverter<LengthRange> {
        @Override
        public LengthRange convert(String text) {
            return parse(text);
        }
    }
}
