package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.algebra.distance.DistanceBounds;
import dev.nearlimit.algebra.distance.DistanceReport;
import dev.nearlimit.algebra.distance.MinimumDistance;
import dev.nearlimit.algebra.errorrate.ErrorRate;
import dev.nearlimit.algebra.graph.TannerGraph;
import dev.nearlimit.algebra.weight.WeightEnumerator;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.codes.Code;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.stream.Collectors;

/** The facts about one code as a result to show. */
final class InspectReport implements Presentation {
    /** A longer enumerator is shown by its lightest and heaviest weights. */
    private static final int LIGHTEST_SHOWN = 12;

    private static final int HEAVIEST_SHOWN = 3;

    private final Code code;
    private final DistanceReport distances;
    private final String whyNotEnumerated;
    private final List<MaximumLikelihoodBound> bounds;
    private final TannerGraph graph;
    private final OptionalInt girth;

    /** @param whyNotEnumerated empty where there is a weight enumerator */
    InspectReport(
            Code code,
            DistanceReport distances,
            String whyNotEnumerated,
            List<MaximumLikelihoodBound> bounds,
            TannerGraph graph) {
        this.code = code;
        this.distances = distances;
        this.whyNotEnumerated = whyNotEnumerated;
        this.bounds = List.copyOf(bounds);
        this.graph = graph;
        this.girth = graph.girth();
    }

    @Override
    public String table() {
        DistanceBounds upper = distances.bounds();
        PropertyList facts = new PropertyList()
                .add("code", code.designator())
                .add("source", code.source())
                .add("length n", code.n() + " bit")
                .add("dimension k", code.k() + " bit")
                .add("rate", code.rate() + " = " + Numbers.fixed(code.rate().value(), 4))
                .add("minimum distance", distanceText())
                .add(
                        "at most, any code",
                        upper.best() + " (Singleton " + upper.singleton() + ", Hamming " + upper.hamming()
                                + ", Griesmer " + upper.griesmer() + ")")
                .add(
                        "parity checks",
                        code.parityCheck().rows() + ", of which " + code.redundantChecks() + " depend on others")
                .add(
                        "Tanner graph",
                        graph.edges() + " edges, "
                                + (girth.isPresent() ? "girth " + girth.getAsInt() : "no cycle")
                                + ", " + graph.fourCycles() + " cycles of length 4")
                .add("bit degrees", degreeText(graph.bitDegrees()))
                .add("check degrees", degreeText(graph.checkDegrees()));
        if (distances.weights().isEmpty()) {
            facts.add("weights", "not counted: " + whyNotEnumerated);
            return facts.toString();
        }
        return facts + "\n" + weightTable(distances.weights().get().weights()) + "\n" + boundTable();
    }

    private String boundTable() {
        TextTable table =
                new TextTable().numbers("Eb/N0", "dB").numbers("FER at most").numbers("BER at most");
        for (MaximumLikelihoodBound bound : bounds) {
            table.row(Numbers.trimmed(bound.ebn0Db()), atMost(bound.fer()), atMost(bound.ber()));
        }
        return "union bounds: soft maximum-likelihood decoding, bpsk or qpsk over awgn\n" + table
                + "No decoder but maximum likelihood is promised to stay below them.\n";
    }

    /** A bound above 1 says nothing. */
    private static String atMost(ErrorRate rate) {
        return rate.value() >= 1 ? "1" : Numbers.errorRate(rate.value());
    }

    private String distanceText() {
        MinimumDistance distance = distances.minimumDistance();
        String value = distance.value().isPresent()
                ? String.valueOf(distance.value().getAsInt())
                : distance.low() + " to " + distance.high();
        return value + " (" + status(distance) + ": " + distance.how() + ")";
    }

    /** Few degrees in full, many by their range. */
    private static String degreeText(SortedMap<Integer, Integer> degrees) {
        if (degrees.size() > LIGHTEST_SHOWN) {
            return degrees.firstKey() + " to " + degrees.lastKey();
        }
        return degrees.entrySet().stream()
                .map(entry -> entry.getKey() + " (" + entry.getValue() + " times)")
                .collect(Collectors.joining(", "));
    }

    private static String weightTable(WeightEnumerator weights) {
        int[] occurring = weights.weights();
        TextTable table = new TextTable().numbers("weight").numbers("words");
        boolean whole = occurring.length <= LIGHTEST_SHOWN + HEAVIEST_SHOWN + 1;
        for (int i = 0; i < occurring.length; i++) {
            if (whole || i < LIGHTEST_SHOWN || i >= occurring.length - HEAVIEST_SHOWN) {
                table.row(String.valueOf(occurring[i]), Numbers.count(weights.count(occurring[i])));
            } else if (i == LIGHTEST_SHOWN) {
                table.row("..", "..");
            }
        }
        String rest = whole ? "" : " (" + occurring.length + " weights occur; --format csv or json lists all)";
        return "weight enumerator, exact" + rest + "\n" + table;
    }

    @Override
    public CsvText csv() {
        MinimumDistance distance = distances.minimumDistance();
        CsvText csv = new CsvText("quantity", "at", "value", "basis")
                .record("code", null, code.designator(), code.source())
                .record("n", null, code.n(), "exact")
                .record("k", null, code.k(), "exact")
                .record("rank", null, code.n() - code.k(), "exact")
                .record("redundantChecks", null, code.redundantChecks(), "exact")
                .record("minimumDistanceLow", null, distance.low(), distance.how())
                .record("minimumDistanceHigh", null, distance.high(), distance.how())
                .record("girth", null, girth.isPresent() ? girth.getAsInt() : null, "exact")
                .record("fourCycles", null, graph.fourCycles(), "exact");
        graph.bitDegrees().forEach((degree, bits) -> csv.record("bitsOfDegree", degree, bits, "exact"));
        graph.checkDegrees().forEach((degree, checks) -> csv.record("checksOfDegree", degree, checks, "exact"));
        distances.weights().ifPresent(known -> {
            for (int weight : known.weights().weights()) {
                csv.record("wordsOfWeight", weight, known.weights().count(weight), "exact");
            }
        });
        for (MaximumLikelihoodBound bound : bounds) {
            csv.record(
                    "unionBoundFer",
                    bound.ebn0Db(),
                    bound.fer().value(),
                    bound.fer().basis().label());
            csv.record(
                    "unionBoundBer",
                    bound.ebn0Db(),
                    bound.ber().value(),
                    bound.ber().basis().label());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        root.put("code", code.designator());
        root.put("source", code.source());
        root.put("n", code.n());
        root.put("k", code.k());
        root.put("rate", code.rate().toString());
        MinimumDistance distance = distances.minimumDistance();
        ObjectNode minimum = root.putObject("minimumDistance");
        JsonText.put(minimum, "value", distance.value());
        minimum.put("low", distance.low());
        minimum.put("high", distance.high());
        minimum.put("status", status(distance));
        minimum.put("how", distance.how());
        DistanceBounds best = distances.bounds();
        ObjectNode upper = root.putObject("distanceBounds");
        upper.put("singleton", best.singleton());
        upper.put("hamming", best.hamming());
        upper.put("griesmer", best.griesmer());
        putWeights(root);
        ArrayNode list = root.putArray("bounds");
        for (MaximumLikelihoodBound bound : bounds) {
            ObjectNode entry = list.addObject();
            JsonText.put(entry, "ebn0Db", bound.ebn0Db());
            JsonText.put(entry, "fer", bound.fer().value());
            entry.put("ferBasis", bound.fer().basis().label());
            JsonText.put(entry, "ber", bound.ber().value());
            entry.put("berBasis", bound.ber().basis().label());
            entry.put("method", bound.fer().method());
        }
        JsonText.put(root, "girth", girth);
        root.put("fourCycles", graph.fourCycles());
        root.put("edges", graph.edges());
        root.put("rank", code.n() - code.k());
        root.put("redundantChecks", code.redundantChecks());
        putDegrees(root.putArray("bitDegrees"), graph.bitDegrees());
        putDegrees(root.putArray("checkDegrees"), graph.checkDegrees());
        return root;
    }

    private void putWeights(ObjectNode root) {
        ArrayNode list = root.putArray("weightEnumerator");
        root.put(
                "weightEnumeratorStatus",
                distances.weights().isPresent() ? "exact" : "not counted: " + whyNotEnumerated);
        distances.weights().ifPresent(known -> {
            for (int weight : known.weights().weights()) {
                ObjectNode entry = list.addObject();
                entry.put("weight", weight);
                // As text: counts go far beyond what readers of JSON keep exactly.
                entry.put("count", known.weights().count(weight).toString());
            }
        });
    }

    private static void putDegrees(ArrayNode list, SortedMap<Integer, Integer> degrees) {
        for (Map.Entry<Integer, Integer> entry : degrees.entrySet()) {
            list.addObject().put("degree", entry.getKey()).put("count", entry.getValue());
        }
    }

    private static String status(MinimumDistance distance) {
        return distance.status().name().toLowerCase(Locale.ROOT);
    }
}
