package dev.nearlimit.codes.matrix;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.matrix.MatrixMarketHeader.Field;
import dev.nearlimit.codes.matrix.MatrixMarketHeader.Format;
import dev.nearlimit.codes.matrix.MatrixMarketHeader.Symmetry;
import java.io.IOException;
import java.math.BigDecimal;
import java.util.List;

/**
 * Reads a matrix of 0 and 1 in Matrix Market form. Lines that start with % and empty lines may stand anywhere after the
 * heading. A coordinate file has the number of entries that it announces, none of them twice, explicit zeros allowed; an
 * array file has every entry, column by column, one a line. A symmetric file is square and gives the diagonal and what is
 * below it.
 */
final class MatrixMarketReader {
    /** Longer numbers are no 0 and no 1 that anyone wrote on purpose. */
    private static final int MAX_NUMBER_LENGTH = 40;

    private static final int MAX_INDEX_DIGITS = 18;

    private final TextLines lines;
    private final MatrixLimits limits;
    private MatrixMarketHeader header;
    private long rows;
    private long columns;

    MatrixMarketReader(TextLines lines, MatrixLimits limits) {
        this.lines = lines;
        this.limits = limits;
    }

    SparseBitMatrix read() throws IOException {
        header = MatrixMarketHeader.read(lines);
        SparseBitMatrix matrix = header.format() == Format.COORDINATE ? readCoordinates() : readArray();
        String extra = nextData();
        if (extra != null) {
            throw lines.error(0, MatrixFormatException.quoted(extra.strip()), "the end of the file");
        }
        return matrix;
    }

    private SparseBitMatrix readCoordinates() throws IOException {
        List<Token> size = readSize(3, "rows, columns and number of entries");
        long entries = number(size.get(2));
        if (entries > rows * columns) {
            throw lines.error(size.get(2).column(), entries + " entries", "at most " + rows + " x " + columns);
        }
        if (entries > limits.maxOnes()) {
            throw lines.error(
                    size.get(2).column(), entries + " entries", "at most " + limits.maxOnes() + ", or a raised limit");
        }
        int words = header.field() == Field.PATTERN ? 2 : 3;
        EntryRegister register = new EntryRegister();
        OnesBuilder ones = new OnesBuilder(lines, limits);
        for (long entry = 0; entry < entries; entry++) {
            String line = nextData();
            if (line == null) {
                throw lines.errorInFile("the end of the file after " + entry + " entries", Long.toString(entries));
            }
            List<Token> tokens = Token.split(line, words);
            if (tokens.size() != words) {
                throw lines.error(
                        0,
                        MatrixFormatException.quoted(line.strip()),
                        words == 2 ? "row and column of an entry" : "row, column and value of an entry");
            }
            int row = index(tokens.get(0), rows, "row");
            int column = index(tokens.get(1), columns, "column");
            if (header.symmetry() == Symmetry.SYMMETRIC && row < column) {
                throw lines.error(
                        tokens.get(0).column(),
                        "entry (" + (row + 1) + "," + (column + 1) + ") above the diagonal",
                        "only the lower triangle of a symmetric matrix");
            }
            register.add(row * columns + column, lines.line());
            if (words == 2 || isOne(tokens.get(2))) {
                add(ones, row, column);
            }
        }
        register.duplicate().ifPresent(duplicate -> {
            throw lines.errorAt(
                    duplicate.secondLine(),
                    "entry (" + (duplicate.key() / columns + 1) + "," + (duplicate.key() % columns + 1)
                            + ") a second time",
                    "each entry once (first in line " + duplicate.firstLine() + ")");
        });
        return ones.build((int) rows, (int) columns);
    }

    private SparseBitMatrix readArray() throws IOException {
        readSize(2, "rows and columns");
        OnesBuilder ones = new OnesBuilder(lines, limits);
        for (int column = 0; column < columns; column++) {
            int firstRow = header.symmetry() == Symmetry.SYMMETRIC ? column : 0;
            for (int row = firstRow; row < rows; row++) {
                String line = nextData();
                if (line == null) {
                    throw lines.errorInFile(
                            "the end of the file",
                            "the entry of row " + (row + 1) + ", column " + (column + 1) + " and those after it");
                }
                List<Token> tokens = Token.split(line, 1);
                if (tokens.size() != 1) {
                    throw lines.error(
                            tokens.get(1).column(), tokens.get(1).quoted(), "one entry a line in format array");
                }
                if (isOne(tokens.get(0))) {
                    add(ones, row, column);
                }
            }
        }
        return ones.build((int) rows, (int) columns);
    }

    private void add(OnesBuilder ones, int row, int column) {
        ones.add(row, column);
        if (header.symmetry() == Symmetry.SYMMETRIC && row != column) {
            ones.add(column, row);
        }
    }

    private List<Token> readSize(int words, String expected) throws IOException {
        String line = nextData();
        if (line == null) {
            throw lines.errorInFile("no line with the size", expected);
        }
        List<Token> tokens = Token.split(line, words);
        if (tokens.size() != words) {
            throw lines.error(0, MatrixFormatException.quoted(line.strip()), expected);
        }
        rows = side(tokens.get(0), "row");
        Shape.requireRows(rows, limits, lines, tokens.get(0).column());
        columns = side(tokens.get(1), "column");
        Shape.requireColumns(columns, limits, lines, tokens.get(1).column());
        Shape.requireEntries(rows, columns, limits, lines);
        if (header.symmetry() == Symmetry.SYMMETRIC && rows != columns) {
            throw lines.error(
                    tokens.get(0).column(),
                    rows + " rows and " + columns + " columns",
                    "as many for a symmetric matrix");
        }
        return tokens;
    }

    private long side(Token token, String what) {
        long value = number(token);
        if (value < 1) {
            throw lines.error(token.column(), "no " + what, "at least one");
        }
        return value;
    }

    private int index(Token token, long count, String what) {
        long value = number(token);
        if (value < 1 || value > count) {
            throw lines.error(token.column(), what + " " + value, "1 .. " + count);
        }
        return (int) (value - 1);
    }

    private long number(Token token) {
        String text = token.text();
        if (text.length() > MAX_INDEX_DIGITS || !text.chars().allMatch(c -> c >= '0' && c <= '9')) {
            throw lines.error(token.column(), token.quoted(), "a whole number");
        }
        return Long.parseLong(text);
    }

    private boolean isOne(Token token) {
        String text = token.text();
        if (text.equals("0") || text.equals("1")) {
            return text.equals("1");
        }
        if (header.field() == Field.REAL && text.length() <= MAX_NUMBER_LENGTH) {
            try {
                BigDecimal value = new BigDecimal(text);
                if (value.signum() == 0) {
                    return false;
                }
                if (value.compareTo(BigDecimal.ONE) == 0) {
                    return true;
                }
            } catch (NumberFormatException e) {
                // Falls through to the message below: no number is as wrong as a wrong number.
            }
        }
        throw lines.error(token.column(), token.quoted(), "0 or 1");
    }

    /** The next line that is neither empty nor a comment; null at the end. */
    private String nextData() throws IOException {
        String line = lines.next();
        while (line != null && (line.isBlank() || line.startsWith("%"))) {
            line = lines.next();
        }
        return line;
    }
}
