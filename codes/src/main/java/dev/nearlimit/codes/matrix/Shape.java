package dev.nearlimit.codes.matrix;

/** Holds the shape of a matrix to the limits, with a message in the reader's place. */
final class Shape {
    private Shape() {}

    static void requireRows(long rows, MatrixLimits limits, TextLines lines, int column) {
        requireAtMost(rows, limits.maxRows(), "rows", lines, column);
    }

    static void requireColumns(long columns, MatrixLimits limits, TextLines lines, int column) {
        requireAtMost(columns, limits.maxColumns(), "columns", lines, column);
    }

    /** Both sides are within their limits already, so the product fits. */
    static void requireEntries(long rows, long columns, MatrixLimits limits, TextLines lines) {
        if (rows * columns > limits.maxEntries()) {
            throw lines.error(
                    0,
                    rows + " x " + columns + " entries",
                    "at most " + limits.maxEntries() + " in all, or a raised limit");
        }
    }

    private static void requireAtMost(long found, long limit, String what, TextLines lines, int column) {
        if (found > limit) {
            throw lines.error(column, found + " " + what, "at most " + limit + ", or a raised limit");
        }
    }
}
