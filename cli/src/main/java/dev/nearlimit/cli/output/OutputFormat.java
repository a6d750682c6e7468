package dev.nearlimit.cli.output;

/** The forms that every result is offered in. */
public enum OutputFormat {
    /** Aligned columns for a terminal of 80 columns; numbers rounded to what matters. */
    TABLE,
    /** One record a line with a heading; all digits. */
    CSV,
    /** One object; all digits; field names do not change. */
    JSON;

    @Override
    public String toString() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
