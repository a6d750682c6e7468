package dev.nearlimit.testvectors.published;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A place in a JSON document: a JSON pointer (RFC 6901) with one extension. A step {@code name[field=text]} goes to the
 * array {@code name} and there to the only element whose {@code field}, written as text, is {@code text}:
 * {@code /weightEnumerator[weight=7]/count}. Brackets mean nothing else, so that a plain pointer reads as ever unless a
 * name ends in {@code [..=..]}.
 *
 * <p>Documents are given as maps, lists, strings, numbers and booleans, the form in which any JSON reader can deliver
 * them.
 */
public final class ValuePointer {
    private static final Pattern CHOICE = Pattern.compile("(.*)\\[([^\\[\\]=]+)=([^\\[\\]=]*)]", Pattern.DOTALL);
    private static final Pattern INDEX = Pattern.compile("0|[1-9][0-9]{0,8}");

    private final String text;
    private final List<String> steps;

    private ValuePointer(String text, List<String> steps) {
        this.text = text;
        this.steps = steps;
    }

    /**
     * Reads a pointer.
     *
     * @throws PublishedValueException if it does not begin with a slash, or a tilde is not followed by 0 or 1
     */
    public static ValuePointer of(String text) {
        if (!text.startsWith("/")) {
            throw new PublishedValueException("pointer is '" + text + "', must begin with '/'");
        }
        List<String> steps = new ArrayList<>();
        for (String step : text.substring(1).split("/", -1)) {
            if (step.matches("(?s).*~(?![01]).*")) {
                throw new PublishedValueException("pointer is '" + text + "', '~' must be followed by 0 or 1");
            }
            steps.add(step.replace("~1", "/").replace("~0", "~"));
        }
        return new ValuePointer(text, List.copyOf(steps));
    }

    /**
     * The value at this place.
     *
     * @throws PublishedValueException if there is none; the message names the step that fails
     */
    public Object select(Object document) {
        Object here = document;
        for (String step : steps) {
            Matcher choice = CHOICE.matcher(step);
            here = choice.matches()
                    ? choose(child(here, choice.group(1)), choice.group(2), choice.group(3), step)
                    : child(here, step);
        }
        return here;
    }

    private Object child(Object parent, String step) {
        if (parent instanceof Map<?, ?> object && object.containsKey(step)) {
            return object.get(step);
        }
        if (parent instanceof List<?> array && INDEX.matcher(step).matches()) {
            int index = Integer.parseInt(step);
            if (index < array.size()) {
                return array.get(index);
            }
        }
        throw missing(step);
    }

    private Object choose(Object array, String field, String wanted, String step) {
        Object found = null;
        int matches = 0;
        if (array instanceof List<?> elements) {
            for (Object element : elements) {
                if (element instanceof Map<?, ?> object && wanted.equals(String.valueOf(object.get(field)))) {
                    found = element;
                    matches++;
                }
            }
        }
        if (matches != 1) {
            throw matches == 0
                    ? missing(step)
                    : new PublishedValueException(
                            "pointer " + text + ": step '" + step + "' fits " + matches + " elements, must fit one");
        }
        return found;
    }

    private PublishedValueException missing(String step) {
        return new PublishedValueException("pointer " + text + ": nothing at step '" + step + "'");
    }

    @Override
    public String toString() {
        return text;
    }
}
