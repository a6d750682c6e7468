package dev.nearlimit.cli.output;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Aligned columns. The heading has the name of each column and below it the unit, where any column has one. A table
 * that would be wider than its width breaks the cells of its last column into several lines.
 */
public final class TextTable {
    /** Columns of the terminal that tables are laid out for. */
    public static final int WIDTH = 80;

    private static final String GAP = "  ";
    private static final int NARROWEST = 20;

    private record Column(String name, String unit, boolean right) {}

    private final List<Column> columns = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    /** Adds a column of words. */
    public TextTable words(String name) {
        columns.add(new Column(name, "", false));
        return this;
    }

    /** Adds a column of numbers without a unit. */
    public TextTable numbers(String name) {
        return numbers(name, "");
    }

    /** Adds a column of numbers. */
    public TextTable numbers(String name, String unit) {
        columns.add(new Column(name, unit.isEmpty() ? "" : "[" + unit + "]", true));
        return this;
    }

    /** Adds a row of as many cells as there are columns. */
    public TextTable row(String... cells) {
        if (cells.length != columns.size()) {
            throw new IllegalArgumentException("row has " + cells.length + " cells, table has " + columns.size());
        }
        rows.add(List.of(cells));
        return this;
    }

    /** The table as lines, each ended by a line break and without blanks at its end. */
    @Override
    public String toString() {
        int[] widths = widths();
        StringBuilder text = new StringBuilder();
        line(text, columns.stream().map(Column::name).toList(), widths);
        if (columns.stream().anyMatch(c -> !c.unit().isEmpty())) {
            line(text, columns.stream().map(Column::unit).toList(), widths);
        }
        text.append("-".repeat(IntStream.of(widths).sum() + GAP.length() * (widths.length - 1)))
                .append('\n');
        for (List<String> row : rows) {
            line(text, row, widths);
        }
        return text.toString();
    }

    private int[] widths() {
        int[] widths = new int[columns.size()];
        for (int c = 0; c < widths.length; c++) {
            int column = c;
            int heading = Math.max(
                    columns.get(c).name().length(), columns.get(c).unit().length());
            widths[c] = rows.stream().mapToInt(row -> row.get(column).length()).reduce(heading, Math::max);
        }
        int last = widths.length - 1;
        int before = IntStream.of(widths).limit(last).map(w -> w + GAP.length()).sum();
        if (!columns.get(last).right()) {
            widths[last] = Math.min(widths[last], Math.max(NARROWEST, WIDTH - before));
        }
        return widths;
    }

    private void line(StringBuilder text, List<String> cells, int[] widths) {
        int last = widths.length - 1;
        List<String> broken = wrap(cells.get(last), widths[last]);
        for (int i = 0; i < broken.size(); i++) {
            StringBuilder line = new StringBuilder();
            for (int c = 0; c < last; c++) {
                line.append(aligned(i == 0 ? cells.get(c) : "", columns.get(c), widths[c]))
                        .append(GAP);
            }
            line.append(aligned(broken.get(i), columns.get(last), widths[last]));
            text.append(line.toString().stripTrailing()).append('\n');
        }
    }

    private static String aligned(String cell, Column column, int width) {
        String blanks = " ".repeat(Math.max(0, width - cell.length()));
        return column.right() ? blanks + cell : cell + blanks;
    }

    /**
     * Breaks a text at blanks into lines of a width. A word that is longer is broken behind its commas, if it has any;
     * what is longer even so stays whole.
     */
    public static List<String> wrap(String text, int width) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : text.split(" ")) {
            String before = line.length() > 0 ? " " : "";
            for (String piece : word.length() > width ? word.split("(?<=,)") : new String[] {word}) {
                if (line.length() > 0 && line.length() + before.length() + piece.length() > width) {
                    lines.add(line.toString());
                    line.setLength(0);
                    before = "";
                }
                line.append(before).append(piece);
                before = "";
            }
        }
        lines.add(line.toString());
        return lines;
    }
}
