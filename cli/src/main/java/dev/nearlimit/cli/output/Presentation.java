package dev.nearlimit.cli.output;

import com.fasterxml.jackson.databind.node.ObjectNode;

/** A result that can be shown in every {@link OutputFormat}. */
public interface Presentation {
    /** For a person at a terminal of 80 columns; ends with a line break. */
    String table();

    /** The part of the result that is a table, as CSV. */
    CsvText csv();

    /** The whole result. */
    ObjectNode json();
}
