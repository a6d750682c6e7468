package dev.nearlimit.testvectors.published;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/** Reads the files of published values. Strict: whatever is not as it should be is an error that names the line. */
public final class PublishedValues {
    private static final List<String> FILES = List.of("limits.csv", "weights.csv", "mindist.csv");
    private static final CSVFormat FORMAT = CSVFormat.RFC4180;

    private PublishedValues() {}

    /** The names of the files. */
    public static List<String> files() {
        return FILES;
    }

    /** The rows of all files, in the order of {@link #files()}. */
    public static List<PublishedValue> all() {
        List<PublishedValue> all = new ArrayList<>();
        for (String file : FILES) {
            all.addAll(of(file));
        }
        requireDistinctIds(all);
        return List.copyOf(all);
    }

    /** The rows of one of the project's files. */
    public static List<PublishedValue> of(String file) {
        try (InputStream stream = PublishedValues.class.getResourceAsStream("/published/" + file)) {
            if (stream == null) {
                throw new PublishedValueException("published/" + file + " is missing");
            }
            return read(file, new InputStreamReader(stream, StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new PublishedValueException("published/" + file + ": " + e.getMessage(), e);
        }
    }

    /**
     * Reads rows from any source.
     *
     * @param file its name, for messages
     * @throws PublishedValueException if a row is malformed or an id occurs twice
     */
    public static List<PublishedValue> read(String file, Reader source) {
        List<PublishedValue> values = new ArrayList<>();
        try (CSVParser parser = CSVParser.parse(source, FORMAT)) {
            Iterator<CSVRecord> records = parser.iterator();
            long line = 1;
            while (records.hasNext()) {
                CSVRecord record = records.next();
                if (values.isEmpty() && line == 1) {
                    requireHeader(file, record);
                } else {
                    values.add(new PublishedRow(file, line, record).value());
                }
                // The parser stands at the end of the record, quoted line breaks included.
                line = parser.getCurrentLineNumber() + 1;
            }
            if (line == 1) {
                throw new PublishedValueException(file + " is empty, must begin with a header");
            }
        } catch (IOException | UncheckedIOException e) {
            throw new PublishedValueException(file + ": " + e.getMessage(), e);
        }
        requireDistinctIds(values);
        return List.copyOf(values);
    }

    private static void requireHeader(String file, CSVRecord record) {
        if (!record.toList().equals(PublishedRow.COLUMNS)) {
            throw new PublishedValueException(file + " line 1: header is '" + String.join(",", record.toList())
                    + "', must be '" + String.join(",", PublishedRow.COLUMNS) + "'");
        }
    }

    private static void requireDistinctIds(List<PublishedValue> values) {
        Map<String, PublishedValue> seen = new HashMap<>();
        for (PublishedValue value : values) {
            PublishedValue first = seen.putIfAbsent(value.id(), value);
            if (first != null) {
                throw new PublishedValueException(value.file() + " line " + value.line() + ": id '" + value.id()
                        + "' occurs already in " + first.file() + " line " + first.line());
            }
        }
    }
}
