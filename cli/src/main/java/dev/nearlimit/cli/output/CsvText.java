package dev.nearlimit.cli.output;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** CSV as in RFC 4180, but with line feeds alone: a heading line, then records. Unknown values are empty. */
public final class CsvText {
    private static final CSVFormat FORMAT = CSVFormat.DEFAULT
            .builder()
            .setRecordSeparator('\n')
            .setNullString("")
            .get();

    private final List<String> heading;
    private final List<List<Object>> records = new ArrayList<>();

    /** @param heading names of the columns, each with its unit where it has one */
    public CsvText(String... heading) {
        this.heading = List.of(heading);
    }

    /** Adds a record: as many values as the heading has; null is an unknown value. */
    public CsvText record(Object... values) {
        if (values.length != heading.size()) {
            throw new IllegalArgumentException(
                    "record has " + values.length + " values, heading has " + heading.size());
        }
        records.add(Arrays.stream(values).map(CsvText::exact).toList());
        return this;
    }

    private static Object exact(Object value) {
        if (value instanceof Double number) {
            return number.isNaN() ? "" : Numbers.exact(number);
        }
        return value == null ? "" : value;
    }

    @Override
    public String toString() {
        StringBuilder text = new StringBuilder();
        try (CSVPrinter printer = new CSVPrinter(text, FORMAT)) {
            printer.printRecord(heading);
            printer.printRecords(records);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }
}
