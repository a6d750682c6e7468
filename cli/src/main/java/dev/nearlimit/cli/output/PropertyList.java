package dev.nearlimit.cli.output;

/** Names and values, one pair a line, values aligned and broken at blanks. */
public final class PropertyList {
    private static final int NAME_WIDTH = 18;

    private final StringBuilder text = new StringBuilder();

    public PropertyList add(String name, String value) {
        String start = name + " ".repeat(Math.max(1, NAME_WIDTH - name.length()));
        for (String line : TextTable.wrap(value, TextTable.WIDTH - NAME_WIDTH)) {
            text.append(start).append(line).append('\n');
            start = " ".repeat(NAME_WIDTH);
        }
        return this;
    }

    @Override
    public String toString() {
        return text.toString();
    }
}
