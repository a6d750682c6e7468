package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.importance.ErrorSet;
import dev.nearlimit.simulation.importance.ImportanceSampler;
import dev.nearlimit.simulation.importance.RareErrorEstimate;
import java.util.IntSummaryStatistics;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Parts of error rates as a result to show.
 *
 * @param source where the sets came from, as the user named it
 * @param frames biased frames asked for at each point
 * @param entries points of which any frame was simulated; the last may be incomplete
 * @param asked how many points were asked for
 */
record RareErrorsReport(
        ImportanceSampler sampler,
        String source,
        long seed,
        long frames,
        List<Entry> entries,
        int asked,
        int threads,
        double elapsedS)
        implements Presentation {

    private static final String DEFINITION =
            "part of the frame error rate due to these sets, for this decoder and quantiser; errors with other causes"
                    + " are not in it. A frame counts if it is in error, most of a set is decided wrong, and the noise"
                    + " moved that set's mean at least half way to 0.";

    /** With fewer, an interval hangs on single frames. */
    private static final double FEW = 20;

    /** A single frame with more of the sum than this stands for others that were not met. */
    private static final double LARGE_SHARE = 0.1;

    /**
     * A point.
     *
     * @param unionBound over the sets, for maximum-likelihood decoding
     */
    record Entry(double ebn0Db, RareErrorEstimate estimate, double unionBound) {}

    private boolean allCodewords() {
        return sampler.codewords() == sampler.bias().sets().size();
    }

    @Override
    public String table() {
        Scheme scheme = sampler.scheme();
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
                .add("sets", describeSets())
                .add(
                        "each point",
                        frames + " frames of noise biased by " + shifts() + " of the signal's amplitude, seed " + seed);
        TextTable table = new TextTable()
                .numbers("Eb/N0", "dB")
                .numbers("FER part")
                .words("95 % interval")
                .numbers("variance")
                .numbers("effective", "errors")
                .numbers("frames");
        if (allCodewords()) {
            table.numbers("ML bound");
        }
        entries.forEach(entry -> addRow(table, entry));
        return about + "\n" + table + "\n" + wrapped("FER part: " + DEFINITION) + explained() + doubts()
                + incompleteness() + closingLine();
    }

    private String describeSets() {
        IntSummaryStatistics weights = weights();
        String range = weights.getMin() == weights.getMax()
                ? "weight " + weights.getMin()
                : "weights " + weights.getMin() + " to " + weights.getMax();
        String kind = allCodewords() ? "all codewords" : sampler.codewords() + " of them codewords";
        return weights.getCount() + " of " + range + ", " + kind + " (" + source + ")";
    }

    private IntSummaryStatistics weights() {
        return sampler.bias().sets().stream().mapToInt(ErrorSet::weight).summaryStatistics();
    }

    private String shifts() {
        return sampler.bias().shifts().stream().map(Numbers::exact).collect(Collectors.joining(", "));
    }

    private void addRow(TextTable table, Entry entry) {
        RareErrorEstimate estimate = entry.estimate();
        String[] cells = {
            Numbers.trimmed(entry.ebn0Db()),
            Numbers.errorRate(estimate.frameErrorRatePart()),
            Numbers.errorRates(estimate.interval().low(), estimate.interval().high()),
            Numbers.errorRate(estimate.variance()),
            Numbers.fixed(estimate.effectiveSampleSize(), 1),
            String.valueOf(estimate.frames()),
            Numbers.errorRate(entry.unionBound())
        };
        table.row(allCodewords() ? cells : java.util.Arrays.copyOf(cells, cells.length - 1));
    }

    private String explained() {
        String text = "Effective: how many counted frame errors would tell as much.";
        return wrapped(
                allCodewords()
                        ? text + " ML bound: union bound over these codewords for maximum-likelihood decoding of"
                                + " unquantised values."
                        : text);
    }

    private String doubts() {
        String points = entries.stream()
                .filter(entry -> entry.estimate().effectiveSampleSize() < FEW
                        || entry.estimate().largestShare() > LARGE_SHARE)
                .map(entry -> Numbers.trimmed(entry.ebn0Db()))
                .collect(Collectors.joining(", "));
        return points.isEmpty()
                ? ""
                : wrapped(
                        "At " + points + " dB a few frames carry the estimate; --frames takes more, other --shifts may"
                                + " reach them sooner.");
    }

    private String incompleteness() {
        long finished =
                entries.stream().filter(entry -> entry.estimate().complete()).count();
        return finished == asked ? "" : "Incomplete: " + finished + " of " + asked + " points were finished.\n";
    }

    private String closingLine() {
        return wrapped("Took " + Numbers.duration(elapsedS) + " on " + threads
                + (threads == 1 ? " thread (" : " threads (") + Kernels.name() + " kernels): "
                + Numbers.engineering(framesPerS()) + " frames/s.");
    }

    private double framesPerS() {
        return entries.stream().mapToLong(entry -> entry.estimate().frames()).sum() / elapsedS;
    }

    private static String wrapped(String text) {
        return String.join("\n", TextTable.wrap(text, TextTable.WIDTH)) + "\n";
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText(
                "ebn0Db",
                "frames",
                "errors",
                "ferPart",
                "ferPartLow",
                "ferPartHigh",
                "variance",
                "effectiveSampleSize",
                "largestShare",
                "unionBound",
                "complete");
        for (Entry entry : entries) {
            RareErrorEstimate estimate = entry.estimate();
            csv.record(
                    entry.ebn0Db(),
                    estimate.frames(),
                    estimate.errors(),
                    estimate.frameErrorRatePart(),
                    estimate.interval().low(),
                    estimate.interval().high(),
                    estimate.variance(),
                    estimate.effectiveSampleSize(),
                    estimate.largestShare(),
                    allCodewords() ? entry.unionBound() : null,
                    estimate.complete());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        Scheme scheme = sampler.scheme();
        ObjectNode root = JsonText.object();
        root.putObject("scheme")
                .put("code", scheme.code().designator())
                .put("decoder", scheme.decoder().designator())
                .put("modulation", scheme.modulation().designator())
                .put("quantiser", scheme.quantiser().designator())
                .put("channel", scheme.channel().designator());
        root.put("seed", seed);
        root.put("frames", frames);
        ArrayNode shifts = root.putArray("shifts");
        sampler.bias().shifts().forEach(shifts::add);
        IntSummaryStatistics weights = weights();
        root.putObject("sets")
                .put("source", source)
                .put("count", weights.getCount())
                .put("codewords", sampler.codewords())
                .put("leastWeight", weights.getMin())
                .put("greatestWeight", weights.getMax());
        root.put("definition", DEFINITION);
        ArrayNode list = root.putArray("points");
        entries.forEach(entry -> putPoint(list.addObject(), entry));
        ObjectNode cost = root.putObject("performance");
        cost.put("kernel", Kernels.name());
        cost.put("threads", threads);
        JsonText.put(cost, "framesPerS", framesPerS());
        JsonText.put(cost, "elapsedS", elapsedS);
        return root;
    }

    private void putPoint(ObjectNode node, Entry entry) {
        RareErrorEstimate estimate = entry.estimate();
        JsonText.put(node, "ebn0Db", entry.ebn0Db());
        node.put("frames", estimate.frames());
        node.put("errors", estimate.errors());
        JsonText.put(node, "ferPart", estimate.frameErrorRatePart());
        JsonText.put(node, "ferPartLow", estimate.interval().low());
        JsonText.put(node, "ferPartHigh", estimate.interval().high());
        JsonText.put(node, "variance", estimate.variance());
        JsonText.put(node, "relativeError", estimate.relativeError());
        JsonText.put(node, "effectiveSampleSize", estimate.effectiveSampleSize());
        JsonText.put(node, "largestShare", estimate.largestShare());
        JsonText.put(node, "unionBound", allCodewords() ? entry.unionBound() : Double.NaN);
        node.put("complete", estimate.complete());
    }
}
