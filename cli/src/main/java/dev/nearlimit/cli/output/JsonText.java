package dev.nearlimit.cli.output;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.PrettyPrinter;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.OptionalInt;

/** JSON on its way out: indented, the same digits on every JVM, no value where a number is unknown. */
public final class JsonText {
    private static final ObjectWriter WRITER = JsonMapper.builder()
            // Before JDK 19 Double.toString does not always give the shortest digits.
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .build()
            .writer(new DefaultPrettyPrinter()
                    .withObjectIndenter(new DefaultIndenter("  ", "\n"))
                    .withArrayIndenter(new DefaultIndenter("  ", "\n"))
                    .withSeparators(
                            PrettyPrinter.DEFAULT_SEPARATORS.withObjectFieldValueSpacing(Separators.Spacing.AFTER)));

    private JsonText() {}

    /** An empty object; its fields keep their order. */
    public static ObjectNode object() {
        return JsonNodeFactory.instance.objectNode();
    }

    /** Puts a number, or null where it is not a number or infinite. */
    public static void put(ObjectNode node, String field, double value) {
        if (Double.isFinite(value)) {
            node.put(field, value);
        } else {
            node.putNull(field);
        }
    }

    /** Puts a whole number, or null where there is none. */
    public static void put(ObjectNode node, String field, OptionalInt value) {
        if (value.isPresent()) {
            node.put(field, value.getAsInt());
        } else {
            node.putNull(field);
        }
    }

    /** The document as text with a line break at its end. */
    public static String of(JsonNode node) {
        try {
            return WRITER.writeValueAsString(node) + "\n";
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a tree of values can always be written", e);
        }
    }
}
