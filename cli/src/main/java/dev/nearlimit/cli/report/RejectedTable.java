package dev.nearlimit.cli.report;

import java.util.List;

/** The schemes that fail a demand or were dropped on the way: which demand, by how much, and at which stage. */
final class RejectedTable {
    private RejectedTable() {}

    static void write(OperatingPoint point, Markup html) {
        List<SchemeEntry> rejected = point.rejected();
        if (rejected.isEmpty()) {
            return;
        }
        html.element("h3", "Why schemes were rejected");
        html.open("div", "class", "scroll", "tabindex", "0", "role", "region", "aria-label", "Rejected schemes");
        html.open("table", "class", "rejected foldable");
        html.open("thead").open("tr");
        for (String heading : List.of("#", "Scheme", "Demand that fails, and by how much", "Stage")) {
            html.element("th", heading, "scope", "col");
        }
        html.close().close().open("tbody");
        for (SchemeEntry scheme : rejected) {
            writeRow(scheme, point, html);
        }
        html.close().close().closeLine();
    }

    private static void writeRow(SchemeEntry scheme, OperatingPoint point, Markup html) {
        html.open("tr").element("td", scheme.key(), "class", "rank");
        html.open("th", "class", "scheme", "scope", "row");
        SchemeCell.write(scheme, point, html);
        html.close();
        html.open("td", "class", "reasons");
        List<SchemeEntry.Failure> failures = scheme.failures();
        for (SchemeEntry.Failure failure : failures) {
            html.open("span", "class", "reason").text(failure.demand());
            if (!failure.by().isEmpty()) {
                html.text(": ").element("strong", failure.by());
            }
            html.close();
        }
        String note = Fields.text(scheme.node(), "note").orElse("");
        if (!note.isEmpty()) {
            html.element("span", note, "class", "detail");
        } else if (failures.isEmpty()) {
            html.text(Quantities.NONE);
        }
        html.close();
        html.element("td", Fields.text(scheme.node(), "stage").orElse(Quantities.NONE), "class", "stage")
                .closeLine();
    }
}
