package dev.nearlimit.decoders.setting;

import dev.nearlimit.decoders.InvalidDecoderException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * The settings of one designator, taken one by one. Values are checked as they are taken; {@link #finish} refuses what
 * nobody took. Every fault is an {@link InvalidDecoderException} with one line that names the setting, what was found
 * and what is allowed.
 */
public final class SettingReader {
    private final String owner;
    private final Map<String, String> left;

    private SettingReader(String owner, Map<String, String> settings) {
        this.owner = owner;
        this.left = settings;
    }

    /**
     * Splits {@code key=value,key=value}.
     *
     * @param owner name of the decoder or quantiser, for messages
     * @param text the part of the designator after the colon; may be empty
     * @throws InvalidDecoderException if a part is no {@code key=value} or a key comes twice
     */
    public static SettingReader of(String owner, String text) {
        Map<String, String> settings = new LinkedHashMap<>();
        if (!text.isBlank()) {
            for (String part : text.split(",", -1)) {
                int equals = part.indexOf('=');
                String key = equals < 0 ? "" : part.substring(0, equals).trim().toLowerCase(Locale.ROOT);
                String value = equals < 0 ? "" : part.substring(equals + 1).trim();
                if (key.isEmpty() || value.isEmpty()) {
                    throw new InvalidDecoderException(
                            "setting '" + part.trim() + "' of " + owner + " must have the form key=value");
                }
                if (settings.put(key, value) != null) {
                    throw new InvalidDecoderException("setting '" + key + "' of " + owner + " is given twice");
                }
            }
        }
        return new SettingReader(owner, settings);
    }

    /** Whether a setting was given and not yet taken. */
    public boolean has(String key) {
        return left.containsKey(key);
    }

    /** Takes the text of a setting. */
    public Optional<String> text(String key) {
        return Optional.ofNullable(left.remove(key));
    }

    /** Takes a whole number between two bounds, both included. */
    public Optional<Integer> whole(String key, int least, int most) {
        return text(key).map(value -> {
            try {
                int number = Integer.parseInt(value);
                if (number >= least && number <= most) {
                    return number;
                }
            } catch (NumberFormatException e) {
                // Said below, together with numbers out of range.
            }
            throw wrong(key, value, "a whole number " + least + ".." + most);
        });
    }

    /** Takes a number above 0 and at most {@code most}, read to single precision. */
    public Optional<Float> positive(String key, float most) {
        return text(key).map(value -> {
            try {
                float number = Float.parseFloat(value);
                if (number > 0 && number <= most) {
                    return number;
                }
            } catch (NumberFormatException e) {
                // Said below, together with numbers out of range.
            }
            throw wrong(key, value, "a number above 0 and at most " + plain(most));
        });
    }

    /** Takes a number between two bounds, both included, read to single precision. */
    public Optional<Float> number(String key, float least, float most) {
        return text(key).map(value -> {
            try {
                float number = Float.parseFloat(value);
                if (number >= least && number <= most) {
                    return number;
                }
            } catch (NumberFormatException e) {
                // Said below, together with numbers out of range.
            }
            throw wrong(key, value, "a number " + plain(least) + ".." + plain(most));
        });
    }

    /** Takes {@code j/8} and gives j, 1 .. 8. */
    public Optional<Integer> eighths(String key) {
        return text(key).map(value -> {
            if (value.length() == 3 && value.endsWith("/8") && value.charAt(0) >= '1' && value.charAt(0) <= '8') {
                return value.charAt(0) - '0';
            }
            throw wrong(key, value, "1/8 .. 8/8");
        });
    }

    /** Takes {@code true} or {@code false}. */
    public Optional<Boolean> flag(String key) {
        return text(key).map(value -> switch (value.toLowerCase(Locale.ROOT)) {
            case "true" -> true;
            case "false" -> false;
            default -> throw wrong(key, value, "true or false");
        });
    }

    /** Takes one of several words, each given by its {@code toString()}. */
    public <T> Optional<T> word(String key, List<T> allowed) {
        return text(key).map(value -> {
            for (T candidate : allowed) {
                if (candidate.toString().equalsIgnoreCase(value)) {
                    return candidate;
                }
            }
            throw wrong(key, value, allowed.stream().map(Object::toString).collect(Collectors.joining(" or ")));
        });
    }

    /** Refuses two settings that exclude each other, if both are still to be taken. */
    public void refuseTogether(String one, String other) {
        if (has(one) && has(other)) {
            throw new InvalidDecoderException(one + " and " + other + " of " + owner + " exclude each other");
        }
    }

    /**
     * Refuses settings that nobody took.
     *
     * @param allowed names of the settings that there are
     */
    public void finish(List<String> allowed) {
        if (!left.isEmpty()) {
            String key = left.keySet().iterator().next();
            throw new InvalidDecoderException("unknown setting '" + key + "' of " + owner
                    + (allowed.isEmpty() ? ", which takes none" : "; allowed are " + String.join(", ", allowed)));
        }
    }

    /** The exception for a setting with a wrong value. */
    public InvalidDecoderException wrong(String key, String found, String expected) {
        return new InvalidDecoderException(key + " of " + owner + " is " + found + ", must be " + expected);
    }

    /** A number without a decimal point that says nothing: 4, not 4.0. */
    public static String plain(float number) {
        return number == (int) number ? Integer.toString((int) number) : Float.toString(number);
    }
}
