package dev.nearlimit.codes.matrix;

import java.io.IOException;
import java.util.List;
import java.util.Locale;

/**
 * The first line of a Matrix Market file: {@code %%MatrixMarket matrix format field symmetry}
 * (R. F. Boisvert, R. Pozo and K. A. Remington, The Matrix Market exchange formats, NISTIR 5935, 1996).
 */
record MatrixMarketHeader(Format format, Field field, Symmetry symmetry) {
    static final String BANNER = "%%matrixmarket";

    enum Format {
        COORDINATE,
        ARRAY
    }

    enum Field {
        PATTERN,
        INTEGER,
        REAL
    }

    enum Symmetry {
        GENERAL,
        SYMMETRIC
    }

    static MatrixMarketHeader read(TextLines lines) throws IOException {
        String line = lines.next();
        List<Token> tokens = Token.split(line == null ? "" : line, 5);
        if (tokens.isEmpty() || !lower(tokens.get(0)).equals(BANNER)) {
            throw lines.error(
                    tokens.isEmpty() ? 0 : tokens.get(0).column(),
                    tokens.isEmpty() ? "no heading" : tokens.get(0).quoted(),
                    "%%MatrixMarket matrix coordinate|array pattern|integer|real general|symmetric");
        }
        if (tokens.size() != 5) {
            throw lines.error(
                    0,
                    tokens.size() < 5 ? "a heading of " + tokens.size() + " words" : "more after the heading",
                    "%%MatrixMarket matrix format field symmetry");
        }
        if (!lower(tokens.get(1)).equals("matrix")) {
            throw error(lines, tokens.get(1), "matrix");
        }
        MatrixMarketHeader header = new MatrixMarketHeader(
                one(lines, tokens.get(2), Format.values()),
                one(lines, tokens.get(3), Field.values()),
                one(lines, tokens.get(4), Symmetry.values()));
        if (header.format == Format.ARRAY && header.field == Field.PATTERN) {
            throw error(lines, tokens.get(3), "integer or real with format array");
        }
        return header;
    }

    private static <E extends Enum<E>> E one(TextLines lines, Token token, E[] choices) {
        StringBuilder expected = new StringBuilder();
        for (E choice : choices) {
            String name = choice.name().toLowerCase(Locale.ROOT);
            if (name.equals(lower(token))) {
                return choice;
            }
            expected.append(expected.isEmpty() ? "" : " or ").append(name);
        }
        throw error(lines, token, expected.toString());
    }

    private static MatrixFormatException error(TextLines lines, Token token, String expected) {
        return lines.error(token.column(), token.quoted(), expected);
    }

    private static String lower(Token token) {
        return token.text().toLowerCase(Locale.ROOT);
    }
}
