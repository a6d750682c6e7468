package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * The ranked schemes, one a row. Every column can be sorted by the button in its heading; the value it is sorted by
 * stands in the cell's {@code data-value}. A column that no scheme has a value for is left out.
 */
final class RankedTable {
    private static final List<Column> COLUMNS = List.of(
            new Column("", "#", "rank", RankedTable::order, (s, point, html) -> html.text(s.key())),
            new Column("", "Scheme", "scheme", s -> s.code() + " " + s.decoder(), SchemeCell::write),
            new Column("", "Verdict", "verdict", s -> s.meets() ? "0" : "1", RankedTable::writeVerdict),
            new Column("", "Needed Eb/N0 [dB]", "number", s -> raw(s.number("neededEbn0Db")), RankedTable::writeNeeded),
            decibels("", "Margin [dB]", "marginDb", null),
            decibels("", "Coding gain [dB]", "codingGainDb", "codingGainMethod"),
            decibels("Gap [dB] to the limit", "Shannon", "gapToShannonDb", null),
            decibels("Gap [dB] to the limit", "Modula\u00adtion", "gapToModulationLimitDb", null),
            decibels("Gap [dB] to the limit", "Hard decision", "gapToHardDecisionLimitDb", null),
            decibels("Gap [dB] to the limit", "Finite length", "gapToFiniteLengthDb", "gapToFiniteLengthMethod"),
            new Column("", "Rate k/n", "number", RankedTable::rate, RankedTable::writeRate),
            new Column(
                    "",
                    "Band\u00adwidth",
                    "number",
                    s -> raw(s.number("occupiedBandwidthHz")),
                    quantity("occupiedBandwidthHz", Quantities::hertz)),
            new Column(
                    "",
                    "Latency",
                    "number",
                    s -> raw(Fields.number(s.node().path("latencyS"), "total")),
                    RankedTable::writeLatency),
            new Column(
                    "",
                    "Opera\u00adtions per bit",
                    "number",
                    s -> raw(Fields.number(s.node().path("operationsPerBit"), "total")),
                    RankedTable::writeOperations),
            new Column(
                    "",
                    "How obtained",
                    "obtained",
                    s -> Fields.text(s.node(), "neededMethod").orElse(""),
                    RankedTable::writeObtained));

    private RankedTable() {}

    /**
     * A column.
     *
     * @param group the heading shared with its neighbours, or an empty text
     * @param heading its own heading
     * @param style the class of its cells
     * @param sortValue what it is sorted by; an empty text where the scheme has no value
     * @param cell writes the cell's content
     */
    private record Column(
            String group, String heading, String style, Function<SchemeEntry, String> sortValue, Cell cell) {}

    /** Writes what stands in a cell: of one scheme among those of its operating point. */
    private interface Cell {
        void write(SchemeEntry scheme, OperatingPoint point, Markup html);
    }

    private static Column decibels(String group, String heading, String field, String methodField) {
        return new Column(group, heading, "number", s -> raw(s.number(field)), (s, point, html) -> {
            html.text(Quantities.decibels(s.number(field)));
            if (methodField != null && s.number(field).isPresent()) {
                Provenance.write(html, Fields.text(s.node(), methodField).orElse(""));
            }
        });
    }

    private static Cell quantity(String field, Function<Double, String> format) {
        return (s, point, html) -> html.text(
                s.number(field).isPresent() ? format.apply(s.number(field).getAsDouble()) : Quantities.NONE);
    }

    static void write(OperatingPoint point, Markup html) {
        List<SchemeEntry> placed = point.placed();
        if (placed.isEmpty()) {
            html.element("p", "For no scheme the needed Eb/N0 is known.");
            return;
        }
        List<Column> columns = COLUMNS.stream()
                .filter(column -> placed.stream()
                        .anyMatch(s -> !column.sortValue().apply(s).isEmpty()))
                .toList();
        html.element("p", "Press a heading to sort by it; press again to turn the order.", "class", "hint");
        html.open("div", "class", "scroll", "tabindex", "0", "role", "region", "aria-label", "Ranked schemes");
        html.open("table", "class", "ranked sortable foldable");
        writeHeadings(columns, html);
        html.open("tbody");
        for (SchemeEntry scheme : placed) {
            html.open("tr", "class", scheme.meets() ? "meets" : "fails");
            for (Column column : columns) {
                boolean heading = column.style().equals("scheme");
                html.open(
                        heading ? "th" : "td",
                        "class",
                        column.style(),
                        "scope",
                        heading ? "row" : null,
                        "data-value",
                        column.sortValue().apply(scheme));
                column.cell().write(scheme, point, html);
                html.close();
            }
            html.closeLine();
        }
        html.close().close().closeLine();
    }

    private static void writeHeadings(List<Column> columns, Markup html) {
        html.open("thead").open("tr");
        for (int i = 0; i < columns.size(); ) {
            Column column = columns.get(i);
            if (column.group().isEmpty()) {
                writeHeading(column, "2", i == 0 ? "ascending" : "none", html);
                i++;
            } else {
                int first = i;
                while (i < columns.size() && columns.get(i).group().equals(column.group())) {
                    i++;
                }
                html.element(
                        "th",
                        column.group(),
                        "class",
                        "group",
                        "scope",
                        "colgroup",
                        "colspan",
                        String.valueOf(i - first));
            }
        }
        html.close().open("tr");
        for (Column column : columns) {
            if (!column.group().isEmpty()) {
                writeHeading(column, null, "none", html);
            }
        }
        html.close().closeLine();
    }

    private static void writeHeading(Column column, String rows, String sorted, Markup html) {
        html.open("th", "class", column.style(), "scope", "col", "rowspan", rows, "aria-sort", sorted);
        html.element("button", column.heading(), "type", "button").close();
    }

    /** The order of ranks, with schemes that have none behind. */
    private static String order(SchemeEntry scheme) {
        return scheme.number("rank").isPresent() ? raw(scheme.number("rank")) : "1e6";
    }

    private static String rate(SchemeEntry scheme) {
        OptionalDouble k = scheme.number("k");
        OptionalDouble n = scheme.number("n");
        return k.isPresent() && n.isPresent() ? Double.toString(k.getAsDouble() / n.getAsDouble()) : "";
    }

    private static void writeVerdict(SchemeEntry scheme, OperatingPoint point, Markup html) {
        if (scheme.meets()) {
            html.element("span", "\u2713\u00a0meets", "class", "yes");
        } else {
            String reasons = String.join(
                    "; ",
                    scheme.failures().stream()
                            .map(SchemeEntry.Failure::sentence)
                            .toList());
            html.element("span", "\u2717\u00a0fails", "class", "no", "title", reasons.isEmpty() ? null : reasons);
        }
        if (Fields.flag(scheme.node(), "pareto")) {
            html.element(
                    "span",
                    "Pareto",
                    "class",
                    "detail",
                    "title",
                    "No scheme that meets every demand is at least as good in Eb/N0, bandwidth, latency and operations and"
                            + " better in one of them.");
        }
        if (scheme.tiedWithBest() && point.hasTie()) {
            html.element(
                    "span",
                    "tied",
                    "class",
                    "detail",
                    "title",
                    "The intervals overlap: these measurements do not tell the schemes apart.");
        }
    }

    private static void writeNeeded(SchemeEntry scheme, OperatingPoint point, Markup html) {
        html.text(Quantities.decibels(scheme.number("neededEbn0Db")));
        Provenance.write(html, Fields.text(scheme.node(), "neededMethod").orElse(""));
        String interval = scheme.neededInterval("\u2009\u2026\u2009");
        if (!interval.isEmpty()) {
            html.element("span", interval, "class", "detail", "title", "95 % interval [dB]");
        }
    }

    private static void writeRate(SchemeEntry scheme, OperatingPoint point, Markup html) {
        html.text(Fields.text(scheme.node(), "rate").orElse(Quantities.NONE));
        OptionalDouble codewords = scheme.number("codewordsPerPayload");
        if (codewords.isPresent() && codewords.getAsDouble() > 1) {
            html.element("span", Quantities.count(codewords.getAsDouble()) + " codewords", "class", "detail");
        }
    }

    private static void writeLatency(SchemeEntry scheme, OperatingPoint point, Markup html) {
        JsonNode latency = scheme.node().path("latencyS");
        OptionalDouble total = Fields.number(latency, "total");
        List<String> parts = new ArrayList<>();
        for (String part : List.of("fill", "air", "interleaver", "decode")) {
            Fields.number(latency, part).ifPresent(s -> parts.add(part + " " + Quantities.seconds(s)));
        }
        html.element(
                "span",
                total.isPresent() ? Quantities.seconds(total.getAsDouble()) : Quantities.NONE,
                "title",
                parts.isEmpty() ? null : String.join(", ", parts));
    }

    private static void writeOperations(SchemeEntry scheme, OperatingPoint point, Markup html) {
        JsonNode operations = scheme.node().path("operationsPerBit");
        OptionalDouble total = Fields.number(operations, "total");
        List<String> parts = new ArrayList<>();
        for (String part : List.of("additions", "comparisons", "lookups")) {
            Fields.number(operations, part).ifPresent(n -> parts.add(part + " " + Quantities.significant(n)));
        }
        html.element(
                "span",
                total.isPresent() ? Quantities.significant(total.getAsDouble()) : Quantities.NONE,
                "title",
                parts.isEmpty() ? null : String.join(", ", parts));
        OptionalDouble worst = Fields.number(operations, "worstCase");
        if (worst.isPresent()) {
            html.element("span", "worst " + Quantities.significant(worst.getAsDouble()), "class", "detail");
        }
    }

    private static void writeObtained(SchemeEntry scheme, OperatingPoint point, Markup html) {
        String method = Fields.text(scheme.node(), "neededMethod").orElse(Quantities.NONE);
        String how = Fields.text(scheme.node(), "neededHow").orElse("");
        if (how.isEmpty()) {
            html.text(method);
        } else {
            html.open("details").element("summary", method);
            html.element("span", how, "class", "detail").close();
        }
        OptionalDouble undetected = scheme.number("uerUpper");
        if (undetected.isPresent()) {
            html.element(
                    "span",
                    "UER\u00a0\u2264\u00a0" + Quantities.errorRate(undetected),
                    "class",
                    "detail",
                    "title",
                    "Undetected frame error rate: upper end of its interval");
        }
    }

    private static String raw(OptionalDouble value) {
        return value.isPresent() ? Double.toString(value.getAsDouble()) : "";
    }
}
