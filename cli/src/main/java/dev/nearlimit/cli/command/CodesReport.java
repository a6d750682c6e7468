package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.TextTable;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * The list of codes as a result to show.
 *
 * @param codes family by family
 * @param decoders names of all decoders; the table refers to them by number
 */
record CodesReport(List<ListedCode> codes, List<String> decoders) implements Presentation {
    @Override
    public String table() {
        if (codes.isEmpty()) {
            return "no code in the list has these properties\n";
        }
        TextTable table = new TextTable()
                .words("code")
                .numbers("n", "bit")
                .numbers("k", "bit")
                .numbers("rate")
                .numbers("min. distance")
                .words("decoders");
        for (ListedCode code : codes) {
            table.row(
                    code.designator(),
                    String.valueOf(code.n()),
                    String.valueOf(code.k()),
                    Numbers.fixed(code.rateValue(), 4),
                    code.minimumDistance().isPresent()
                            ? String.valueOf(code.minimumDistance().getAsInt())
                            : Numbers.UNKNOWN,
                    marks(code));
        }
        return table + "\n" + sources() + "\n" + legend()
                + "\nOther members of a family are named the same way; a distance shown as - may be\n"
                + "computed by nearlimit inspect CODE.\n";
    }

    /** The numbers of the decoders that fit, each in its own place. */
    private String marks(ListedCode code) {
        StringBuilder marks = new StringBuilder();
        for (int d = 0; d < decoders.size(); d++) {
            marks.append(code.decoders().contains(decoders.get(d)) ? String.valueOf(d + 1) : "-")
                    .append(' ');
        }
        return marks.toString().stripTrailing();
    }

    private String legend() {
        String names = IntStream.range(0, decoders.size())
                .mapToObj(d -> (d + 1) + " " + decoders.get(d))
                .collect(Collectors.joining(", "));
        return String.join("\n", TextTable.wrap("decoders: " + names, TextTable.WIDTH)) + "\n";
    }

    /** Where each family comes from, once. */
    private String sources() {
        Map<String, Set<String>> byFamily = new LinkedHashMap<>();
        for (ListedCode code : codes) {
            byFamily.computeIfAbsent(code.family(), family -> new LinkedHashSet<>())
                    .add(code.source());
        }
        TextTable table = new TextTable().words("family").words("source");
        byFamily.forEach((family, sources) -> table.row(family, String.join("; ", sources)));
        return table.toString();
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText("code", "n", "k", "rate", "minimumDistance", "decoders", "source");
        for (ListedCode code : codes) {
            csv.record(
                    code.designator(),
                    code.n(),
                    code.k(),
                    code.rate(),
                    code.minimumDistance().isPresent() ? code.minimumDistance().getAsInt() : null,
                    String.join(" ", code.decoders()),
                    code.source());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        ArrayNode list = root.putArray("codes");
        for (ListedCode code : codes) {
            ObjectNode entry = list.addObject();
            entry.put("code", code.designator());
            entry.put("n", code.n());
            entry.put("k", code.k());
            entry.put("rate", code.rate());
            JsonText.put(entry, "minimumDistance", code.minimumDistance());
            ArrayNode fitting = entry.putArray("decoders");
            code.decoders().forEach(fitting::add);
            entry.put("source", code.source());
        }
        return root;
    }
}
