package dev.nearlimit.cli.journal;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.journal.KeptJob;
import java.nio.file.Path;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.OptionalLong;

/**
 * The list of what a journal keeps.
 *
 * @param journal the journal's file
 * @param jobs the last changed last
 */
record RunsReport(Path journal, List<KeptJob> jobs) implements Presentation {
    /** Universal time, so that merged journals of two places make one list. */
    static final DateTimeFormatter MINUTES =
            DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm").withZone(ZoneOffset.UTC);

    private List<KeptRun> runs() {
        return jobs.stream().map(KeptRun::of).toList();
    }

    @Override
    public String table() {
        if (jobs.isEmpty()) {
            return "The journal " + journal + " keeps nothing yet.\n";
        }
        TextTable table = new TextTable()
                .words("ID")
                .numbers("Eb/N0", "dB")
                .numbers("blocks")
                .numbers("frames")
                .words("last kept, UTC")
                .words("scheme");
        for (KeptRun run : runs()) {
            table.row(
                    run.id(),
                    run.ebn0Db().isPresent() ? Numbers.trimmed(run.ebn0DbOrNaN()) : Numbers.UNKNOWN,
                    String.valueOf(run.blocks()),
                    KeptRun.text(run.frames()),
                    MINUTES.format(run.changed()),
                    run.scheme() + ", seed " + KeptRun.text(run.seed()));
        }
        long blocks = jobs.stream().mapToLong(KeptJob::pieces).sum();
        return table + "\n" + jobs.size() + (jobs.size() == 1 ? " point, " : " points, ") + KeptRun.blocks(blocks)
                + " in " + journal + "\n";
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText(
                "id",
                "code",
                "decoder",
                "quantiser",
                "modulation",
                "channel",
                "ebn0Db",
                "seed",
                "blocks",
                "frames",
                "created",
                "changed",
                "tool");
        for (KeptRun run : runs()) {
            csv.record(
                    run.id(),
                    run.code(),
                    run.decoder(),
                    run.quantiser(),
                    run.modulation(),
                    run.channel(),
                    run.ebn0DbOrNaN(),
                    known(run.seed()),
                    run.blocks(),
                    known(run.frames()),
                    run.created(),
                    run.changed(),
                    run.tool());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        root.put("journal", journal.toString());
        ArrayNode list = root.putArray("runs");
        runs().forEach(run -> put(list.addObject(), run));
        return root;
    }

    /** The number, or null. */
    static Long known(OptionalLong number) {
        return number.isPresent() ? number.getAsLong() : null;
    }

    static void put(ObjectNode node, KeptRun run) {
        node.put("id", run.id());
        node.put("code", run.code());
        node.put("decoder", run.decoder());
        node.put("quantiser", run.quantiser());
        node.put("modulation", run.modulation());
        node.put("channel", run.channel());
        JsonText.put(node, "ebn0Db", run.ebn0DbOrNaN());
        node.put("seed", known(run.seed()));
        node.put("blocks", run.blocks());
        node.put("frames", known(run.frames()));
        node.put("created", run.created().toString());
        node.put("changed", run.changed().toString());
        node.put("tool", run.tool());
    }
}
