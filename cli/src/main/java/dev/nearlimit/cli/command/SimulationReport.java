package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.simulation.BlockOrigins;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.StoppingRule;
import java.util.List;

/**
 * Measured error rates as a result to show.
 *
 * @param points those of which any frame was counted; the last may be incomplete
 * @param asked how many points were asked for
 */
record SimulationReport(
        Scheme scheme, long seed, StoppingRule rule, List<MeasuredPoint> points, int asked, Performance performance)
        implements Presentation {
    private static final double MEGA = 1e6;

    /**
     * What the run cost; depends on the machine, and so stands apart from the results.
     *
     * @param kernel which kernels did the arithmetic
     * @param blocks where the blocks of frames came from
     * @param kept whether blocks are kept in a journal that outlives the run
     */
    record Performance(String kernel, int threads, double elapsedS, BlockOrigins blocks, boolean kept) {}

    @Override
    public String table() {
        PropertyList about = new PropertyList()
                .add(
                        "code",
                        scheme.code().designator() + ", rate " + scheme.code().rate())
                .add("decoder", scheme.decoder().designator())
                .add("quantiser", scheme.quantiser().designator())
                .add(
                        "link",
                        scheme.modulation().designator() + " over "
                                + scheme.channel().designator())
                .add(
                        "each point",
                        "until " + rule.frameErrors() + " frame errors or " + rule.maxFrames() + " frames, seed "
                                + seed);
        TextTable table = new TextTable()
                .numbers("Eb/N0", "dB")
                .words("rate")
                .numbers("measured")
                .words("95 % interval")
                .numbers("errors")
                .numbers("frames")
                .numbers("iterations")
                .words("");
        points.forEach(point -> addRows(table, point));
        return about + "\n" + table + "\n" + incompleteness() + closingLine();
    }

    private void addRows(TextTable table, MeasuredPoint point) {
        PointCounts counts = point.counts();
        table.row(
                Numbers.trimmed(point.ebn0Db()),
                "FER",
                Numbers.errorRate(point.fer()),
                Numbers.errorRates(
                        point.ferInterval().low(), point.ferInterval().high()),
                String.valueOf(counts.frameErrors()),
                String.valueOf(counts.frames()),
                scheme.decoder().maxIterations() > 0 ? Numbers.fixed(point.averageIterations(), 1) : Numbers.UNKNOWN,
                counts.complete() ? "" : "incomplete");
        table.row(
                "",
                "BER",
                Numbers.errorRate(point.ber()),
                Numbers.errorRates(
                        point.berInterval().low(), point.berInterval().high()),
                String.valueOf(counts.bitErrors()),
                "",
                "",
                "");
        table.row(
                "",
                "UER",
                Numbers.errorRate(point.uer()),
                "at most " + Numbers.errorRate(point.uerHigh()),
                String.valueOf(counts.undetectedErrors()),
                "",
                "",
                "");
    }

    private String incompleteness() {
        long finished =
                points.stream().filter(point -> point.counts().complete()).count();
        return finished == asked ? "" : "Incomplete: " + finished + " of " + asked + " points were finished.\n";
    }

    private String closingLine() {
        String line = "Took " + Numbers.duration(performance.elapsedS()) + " on " + performance.threads()
                + (performance.threads() == 1 ? " thread (" : " threads (")
                + performance.kernel() + " kernels): " + Numbers.engineering(framesPerS()) + " frames/s, "
                + Numbers.fixed(codedMbPerS(), codedMbPerS() < 10 ? 2 : 0) + " Mb/s of code bits."
                + (performance.kept() ? " " + fromJournal(performance.blocks()) : "");
        return String.join("\n", TextTable.wrap(line, TextTable.WIDTH)) + "\n";
    }

    private static String fromJournal(BlockOrigins blocks) {
        return "Of " + (blocks.found() + blocks.computed()) + " blocks of frames " + blocks.found()
                + " came from the journal.";
    }

    /** Of the frames that were computed: what the journal had says nothing about this machine. */
    private double framesPerS() {
        return performance.blocks().framesComputed() / performance.elapsedS();
    }

    private double codedMbPerS() {
        return framesPerS() * scheme.code().n() / MEGA;
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText(
                "ebn0Db",
                "frames",
                "frameErrors",
                "bitErrors",
                "undetectedErrors",
                "fer",
                "ferLow",
                "ferHigh",
                "ber",
                "berLow",
                "berHigh",
                "averageIterations",
                "complete");
        for (MeasuredPoint point : points) {
            csv.record(
                    point.ebn0Db(),
                    point.counts().frames(),
                    point.counts().frameErrors(),
                    point.counts().bitErrors(),
                    point.counts().undetectedErrors(),
                    point.fer(),
                    point.ferInterval().low(),
                    point.ferInterval().high(),
                    point.ber(),
                    point.berInterval().low(),
                    point.berInterval().high(),
                    point.averageIterations(),
                    point.counts().complete());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        ObjectNode about = root.putObject("scheme");
        about.put("code", scheme.code().designator());
        about.put("decoder", scheme.decoder().designator());
        about.put("modulation", scheme.modulation().designator());
        about.put("quantiser", scheme.quantiser().designator());
        about.put("channel", scheme.channel().designator());
        root.put("seed", seed);
        root.putObject("stoppingRule").put("frames", rule.maxFrames()).put("frameErrors", rule.frameErrors());
        ArrayNode list = root.putArray("points");
        points.forEach(point -> putPoint(list.addObject(), point));
        ObjectNode cost = root.putObject("performance");
        cost.put("kernel", performance.kernel());
        cost.put("threads", performance.threads());
        JsonText.put(cost, "codedMbPerS", codedMbPerS());
        JsonText.put(cost, "framesPerS", framesPerS());
        JsonText.put(cost, "elapsedS", performance.elapsedS());
        cost.put("blocksComputed", performance.blocks().computed());
        cost.put("blocksFromJournal", performance.blocks().found());
        return root;
    }

    private static void putPoint(ObjectNode entry, MeasuredPoint point) {
        JsonText.put(entry, "ebn0Db", point.ebn0Db());
        entry.put("frames", point.counts().frames());
        entry.put("frameErrors", point.counts().frameErrors());
        entry.put("bitErrors", point.counts().bitErrors());
        entry.put("undetectedErrors", point.counts().undetectedErrors());
        JsonText.put(entry, "fer", point.fer());
        JsonText.put(entry, "ferLow", point.ferInterval().low());
        JsonText.put(entry, "ferHigh", point.ferInterval().high());
        JsonText.put(entry, "ber", point.ber());
        JsonText.put(entry, "berLow", point.berInterval().low());
        JsonText.put(entry, "berHigh", point.berInterval().high());
        JsonText.put(entry, "averageIterations", point.averageIterations());
        entry.put("complete", point.counts().complete());
    }
}
