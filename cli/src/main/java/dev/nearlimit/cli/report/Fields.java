package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads optional fields of the results: a field that is absent, null or of another type is simply not there. */
final class Fields {
    private Fields() {}

    /** The number under a field's name. A number too large for JSON may stand as a string. */
    static OptionalDouble number(JsonNode node, String name) {
        JsonNode value = node.path(name);
        if (value.isNumber()) {
            return OptionalDouble.of(value.doubleValue());
        }
        if (value.isTextual()) {
            try {
                return OptionalDouble.of(Double.parseDouble(value.textValue()));
            } catch (NumberFormatException e) {
                return OptionalDouble.empty();
            }
        }
        return OptionalDouble.empty();
    }

    /** The text under a field's name, if there is one and it is not blank; a number or a boolean as it stands. */
    static Optional<String> text(JsonNode node, String name) {
        JsonNode value = node.path(name);
        return value.isValueNode() && !value.isNull()
                ? Optional.of(value.asText()).filter(text -> !text.isBlank())
                : Optional.empty();
    }

    /** Whether the field is there and true. */
    static boolean flag(JsonNode node, String name) {
        return node.path(name).asBoolean(false);
    }
}
