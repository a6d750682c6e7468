package dev.nearlimit.cli.requirement;

import dev.nearlimit.cli.failure.InputException;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;

/**
 * Takes the fields of one mapping by name and remembers which were asked for, so that {@link #refuseUnknown()} can name
 * the others.
 */
final class FieldReader {
    private final String file;
    private final String path;
    private final YamlNode.Mapping mapping;
    private final Set<String> known = new LinkedHashSet<>();

    /**
     * @param file the file's name, for messages
     * @param path dotted path of the mapping, empty at the top
     */
    FieldReader(String file, String path, YamlNode.Mapping mapping) {
        this.file = file;
        this.path = path;
        this.mapping = mapping;
    }

    String file() {
        return file;
    }

    /** The fields of a group, which must be there. */
    FieldReader group(String name) {
        return asGroup(name, required(name));
    }

    Optional<FieldReader> optionalGroup(String name) {
        return find(name).map(value -> asGroup(name, value));
    }

    String text(String name) {
        return scalar(name, required(name));
    }

    Optional<String> optionalText(String name) {
        return find(name).map(value -> scalar(name, value));
    }

    /** A number, which must be there. */
    double number(String name, String unit) {
        return number(name, unit, required(name));
    }

    OptionalDouble optionalNumber(String name, String unit) {
        Optional<YamlNode> value = find(name);
        return value.isPresent() ? OptionalDouble.of(number(name, unit, value.get())) : OptionalDouble.empty();
    }

    /** A whole number, which must be there. */
    int wholeNumber(String name, String unit) {
        YamlNode value = required(name);
        try {
            return Integer.parseInt(scalar(name, value));
        } catch (NumberFormatException e) {
            throw at(value, dotted(name) + " is " + value.kind() + ", expected a whole number of " + unit);
        }
    }

    /** The items of a list, or a single value as a list of one; none if the field is absent. */
    List<YamlNode> list(String name) {
        Optional<YamlNode> value = find(name);
        if (value.isEmpty()) {
            return List.of();
        }
        if (value.get() instanceof YamlNode.Sequence sequence) {
            return sequence.items();
        }
        return List.of(value.get());
    }

    /** A list of single values, each read by a function whose complaint is reported at the value. */
    <T> List<T> values(String name, Function<String, T> read) {
        List<T> values = new ArrayList<>();
        for (YamlNode item : list(name)) {
            values.add(located(item, () -> read.apply(scalar(name, item))));
        }
        return values;
    }

    /** The fields of an item of a list. */
    FieldReader item(String name, int index, YamlNode item) {
        return asGroup(name + "[" + index + "]", item);
    }

    /** Whether the field is there, without having to be. */
    boolean has(String name) {
        return find(name).isPresent();
    }

    /** Refuses fields that nobody asked for. */
    void refuseUnknown() {
        mapping.fields().forEach((name, field) -> {
            if (!known.contains(name)) {
                throw new InputException(
                        "unknown field '" + dotted(name) + "'; known here are " + String.join(", ", known),
                        file,
                        field.line(),
                        field.column());
            }
        });
    }

    /** Runs something and reports a user mistake that it throws at the place of a node. */
    <T> T located(YamlNode node, java.util.function.Supplier<T> action) {
        return Located.at(file, node.line(), node.column(), action);
    }

    /** The place of a field by name, or of the mapping itself if the field is absent. */
    YamlNode place(String name) {
        YamlNode.Field field = mapping.fields().get(name);
        return field == null ? mapping : field.value();
    }

    InputException at(YamlNode node, String message) {
        return new InputException(message, file, node.line(), node.column());
    }

    String dotted(String name) {
        return path.isEmpty() ? name : path + "." + name;
    }

    private YamlNode required(String name) {
        return find(name)
                .orElseThrow(() -> new InputException(
                        "field '" + dotted(name) + "' is missing; found here are "
                                + String.join(", ", mapping.fields().keySet()),
                        file,
                        mapping.line(),
                        mapping.column()));
    }

    private Optional<YamlNode> find(String name) {
        known.add(name);
        return Optional.ofNullable(mapping.fields().get(name)).map(YamlNode.Field::value);
    }

    private FieldReader asGroup(String name, YamlNode value) {
        if (value instanceof YamlNode.Mapping group) {
            return new FieldReader(file, dotted(name), group);
        }
        throw at(value, dotted(name) + " is " + value.kind() + ", expected a group of fields");
    }

    private String scalar(String name, YamlNode value) {
        if (value instanceof YamlNode.Scalar scalar && !scalar.text().isEmpty()) {
            return scalar.text();
        }
        throw at(value, dotted(name) + " is " + value.kind() + ", expected a single value");
    }

    private double number(String name, String unit, YamlNode value) {
        String text = scalar(name, value);
        try {
            double number = Double.parseDouble(text);
            if (Double.isFinite(number) && !text.endsWith("d") && !text.endsWith("f")) {
                return number;
            }
        } catch (NumberFormatException e) {
            // Reported below, with the place, like a number that is not finite.
        }
        throw at(value, dotted(name) + " is " + value.kind() + ", expected a number" + unitText(unit));
    }

    private static String unitText(String unit) {
        return unit.isEmpty() ? "" : " [" + unit + "]";
    }
}
