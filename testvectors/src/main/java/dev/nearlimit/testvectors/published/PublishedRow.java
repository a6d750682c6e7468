package dev.nearlimit.testvectors.published;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.apache.commons.csv.CSVRecord;

/** One row on its way to a {@link PublishedValue}: every field is checked, every objection names file and line. */
record PublishedRow(String file, long line, CSVRecord record) {
    static final List<String> COLUMNS = List.of(
            "id",
            "quantity",
            "code_or_channel",
            "conditions",
            "designator",
            "command",
            "pointer",
            "value",
            "unit",
            "tolerance_kind",
            "tolerance",
            "source",
            "basis",
            "note",
            "status");

    PublishedValue value() {
        if (record.size() != COLUMNS.size()) {
            throw refuse("has " + record.size() + " fields, must have " + COLUMNS.size());
        }
        ToleranceKind kind = oneOf("tolerance_kind", ToleranceKind.values(), ToleranceKind::label);
        BigDecimal tolerance = number("tolerance");
        if (tolerance.signum() < 0) {
            throw refuse("tolerance is " + tolerance + ", must be at least 0");
        }
        if (kind == ToleranceKind.EXACT && tolerance.signum() != 0) {
            throw refuse("tolerance is " + tolerance + ", must be 0 for an exact value");
        }
        Reach reach = oneOf("status", Reach.values(), Reach::label);
        List<String> command = command(reach);
        return new PublishedValue(
                file,
                line,
                required("id"),
                required("quantity"),
                required("code_or_channel"),
                field("conditions"),
                field("designator"),
                command,
                pointer(reach),
                number("value"),
                field("unit"),
                kind,
                tolerance,
                required("source"),
                oneOf("basis", Basis.values(), Basis::label),
                field("note"),
                reach);
    }

    private List<String> command(Reach reach) {
        String text = field("command");
        requirePresence("command", text, reach);
        return text.isEmpty() ? List.of() : Arrays.asList(text.split(" +"));
    }

    private String pointer(Reach reach) {
        String text = field("pointer");
        requirePresence("pointer", text, reach);
        if (!text.isEmpty()) {
            try {
                ValuePointer.of(text);
            } catch (PublishedValueException e) {
                throw new PublishedValueException(file + " line " + line + ": " + e.getMessage(), e);
            }
        }
        return text;
    }

    private void requirePresence(String column, String text, Reach reach) {
        if (text.isEmpty() == (reach == Reach.COMMAND)) {
            throw refuse(column + " is '" + text + "', must be " + (reach == Reach.COMMAND ? "given" : "empty")
                    + " for status " + reach.label());
        }
    }

    private BigDecimal number(String column) {
        String text = field(column);
        try {
            return new BigDecimal(text);
        } catch (NumberFormatException e) {
            throw new PublishedValueException(
                    file + " line " + line + ": " + column + " is '" + text + "', must be a number", e);
        }
    }

    private <E> E oneOf(String column, E[] values, Function<E, String> label) {
        String text = field(column);
        for (E value : values) {
            if (label.apply(value).equals(text)) {
                return value;
            }
        }
        throw refuse(column + " is '" + text + "', must be one of "
                + Arrays.stream(values).map(label).collect(Collectors.joining(", ")));
    }

    private String required(String column) {
        String text = field(column);
        if (text.isEmpty()) {
            throw refuse(column + " is empty");
        }
        return text;
    }

    private String field(String column) {
        String text = record.get(COLUMNS.indexOf(column));
        if (!text.equals(text.strip())) {
            throw refuse(column + " is '" + text + "', must not begin or end with blanks");
        }
        return text;
    }

    private PublishedValueException refuse(String what) {
        return new PublishedValueException(file + " line " + line + ": " + what);
    }
}
