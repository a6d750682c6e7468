package dev.nearlimit.cli.shortlist;

import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.Presentation;

/**
 * A finished shortlist as a result to show.
 *
 * @param run requirement and answer
 * @param all whether the table shows every scheme
 */
record ShortlistReport(ShortlistRun run, boolean all) implements Presentation {
    @Override
    public String table() {
        return ShortlistTable.of(run, all);
    }

    @Override
    public CsvText csv() {
        return ShortlistCsv.of(run.point());
    }

    @Override
    public ObjectNode json() {
        return ShortlistJson.of(run);
    }
}
