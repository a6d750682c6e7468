package dev.nearlimit.codes.matrix;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.io.IOException;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Reads a matrix written as lines of 0 and 1. Entries are separated by commas, or by semicolons where the first row has
 * semicolons and no comma; blanks around an entry do not count; there is no heading and there are no quotes. Empty lines
 * and lines that start with {@code #} are skipped.
 */
final class CsvReader {
    private static final String EXPECTED_ENTRY = "0 or 1, entries separated by commas or semicolons";

    private final TextLines lines;
    private final MatrixLimits limits;

    CsvReader(TextLines lines, MatrixLimits limits) {
        this.lines = lines;
        this.limits = limits;
    }

    SparseBitMatrix read() throws IOException {
        OnesBuilder ones = new OnesBuilder(lines, limits);
        CSVFormat format = null;
        int firstRowLine = 0;
        int rows = 0;
        int columns = 0;
        for (String text = lines.next(); text != null; text = lines.next()) {
            if (text.isBlank() || text.startsWith("#")) {
                continue;
            }
            if (format == null) {
                char delimiter = text.indexOf(';') >= 0 && text.indexOf(',') < 0 ? ';' : ',';
                format = CSVFormat.DEFAULT
                        .builder()
                        .setDelimiter(delimiter)
                        .setQuote(null)
                        .get();
                // Entries are counted before they become objects.
                columns = 1 + (int) text.chars().filter(c -> c == delimiter).count();
                Shape.requireColumns(columns, limits, lines, 0);
                firstRowLine = lines.line();
            }
            Shape.requireRows(rows + 1L, limits, lines, 0);
            Shape.requireEntries(rows + 1L, columns, limits, lines);
            requireEntries(text, format.getDelimiterString().charAt(0), columns, firstRowLine);
            addRow(text, format, rows++, ones);
        }
        if (rows == 0) {
            throw lines.errorInFile("no row", "a matrix of 0 and 1");
        }
        return ones.build(rows, columns);
    }

    private void requireEntries(String text, char delimiter, int expected, int firstRowLine) {
        long found = 1 + text.chars().filter(c -> c == delimiter).count();
        if (found != expected) {
            throw lines.error(
                    0, found + (found == 1 ? " entry" : " entries"), expected + " as in line " + firstRowLine);
        }
    }

    private void addRow(String text, CSVFormat format, int row, OnesBuilder ones) throws IOException {
        try (CSVParser parser = CSVParser.parse(text, format)) {
            for (CSVRecord entries : parser) {
                int start = 1;
                for (int column = 0; column < entries.size(); column++) {
                    String raw = entries.get(column);
                    String entry = raw.strip();
                    if (entry.equals("1")) {
                        ones.add(row, column);
                    } else if (!entry.equals("0")) {
                        int blanks = raw.length() - raw.stripLeading().length();
                        throw lines.error(
                                start + (entry.isEmpty() ? 0 : blanks),
                                entry.isEmpty() ? "an empty entry" : MatrixFormatException.quoted(entry),
                                EXPECTED_ENTRY);
                    }
                    start += raw.length() + 1;
                }
            }
        }
    }
}
