package dev.nearlimit.cli.journal;

import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.simulation.PointCounts;

/**
 * One point that a journal keeps, counted. There are counts and plain ratios but no intervals, for these depend on the
 * stopping rule, which the journal does not know.
 *
 * @param counts of all frames up to the first gap
 */
record RunReport(KeptRun run, PointCounts counts) implements Presentation {
    private static final String NO_INTERVAL = "No intervals: they depend on the stopping rule, which a journal does not"
            + " know. simulate with this scheme, Eb/N0 and seed takes these blocks and gives them.";

    private double fer() {
        return (double) counts.frameErrors() / counts.frames();
    }

    /** Bit error rate, or not a number where the code's dimension is not known. */
    private double ber() {
        return run.k().isPresent()
                ? counts.bitErrors() / ((double) counts.frames() * run.k().getAsInt())
                : Double.NaN;
    }

    private double averageIterations() {
        return (double) counts.iterations() / counts.frames();
    }

    @Override
    public String table() {
        PropertyList list = new PropertyList()
                .add("ID", run.id())
                .add("code", run.code())
                .add("decoder", run.decoder())
                .add("quantiser", run.quantiser())
                .add("link", run.modulation() + " over " + run.channel());
        if (run.ebn0Db().isPresent()) {
            list.add("Eb/N0", Numbers.trimmed(run.ebn0DbOrNaN()) + " dB");
        }
        list.add("seed", KeptRun.text(run.seed()))
                .add("first kept", RunsReport.MINUTES.format(run.created()) + " UTC, by " + run.tool())
                .add("last kept", RunsReport.MINUTES.format(run.changed()) + " UTC")
                .add("blocks", String.valueOf(run.blocks()))
                .add("frames counted", String.valueOf(counts.frames()))
                .add("frame errors", counts.frameErrors() + ratio("FER", fer()))
                .add("bit errors", counts.bitErrors() + ratio("BER", ber()))
                .add("undetected", String.valueOf(counts.undetectedErrors()));
        if (counts.iterations() > 0) {
            list.add("iterations", Numbers.fixed(averageIterations(), 1) + " on average");
        }
        return list + "\n" + String.join("\n", TextTable.wrap(NO_INTERVAL, TextTable.WIDTH)) + "\n";
    }

    private String ratio(String name, double rate) {
        return counts.frames() > 0 && rate > 0 ? ", " + name + " " + Numbers.errorRate(rate) : "";
    }

    @Override
    public CsvText csv() {
        return new CsvText(
                        "id",
                        "ebn0Db",
                        "seed",
                        "blocks",
                        "frames",
                        "frameErrors",
                        "bitErrors",
                        "undetectedErrors",
                        "fer",
                        "ber",
                        "averageIterations")
                .record(
                        run.id(),
                        run.ebn0DbOrNaN(),
                        RunsReport.known(run.seed()),
                        run.blocks(),
                        counts.frames(),
                        counts.frameErrors(),
                        counts.bitErrors(),
                        counts.undetectedErrors(),
                        fer(),
                        ber(),
                        averageIterations());
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        RunsReport.put(root, run);
        ObjectNode point = root.putObject("counted");
        point.put("frames", counts.frames());
        point.put("frameErrors", counts.frameErrors());
        point.put("bitErrors", counts.bitErrors());
        point.put("undetectedErrors", counts.undetectedErrors());
        JsonText.put(point, "fer", fer());
        JsonText.put(point, "ber", ber());
        JsonText.put(point, "averageIterations", averageIterations());
        return root;
    }
}
