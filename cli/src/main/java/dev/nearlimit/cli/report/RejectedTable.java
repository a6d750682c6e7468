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
        html.open("table", "class", "rejected");
        html.open("thead").open("tr");
        for (String heading : List.of("#", "Scheme", "Demand that fails, and by how much", "Stage")) {
            html.element("th", heading, "scope", "col");
        }
        html.close().close().open("tbody");
        for (SchemeEntry scheme : rejected) {
            writeRow(scheme, html);
        }
        html.close().close().closeLine();
    }

    private static void writeRow(SchemeEntry scheme, Markup html) {
        html.open("tr").element("td", scheme.key(), "class", "rank");
        html.open("th", "scope", "row", "class", "scheme");
        html.open("span", "class", "code").designator(scheme.code()).close();
        html.open("span", "class", "detail").designator(scheme.decoder());
        html.text(" \u00b7 " + scheme.modulation()).close().close();
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
        html.element("td", Fields.text(scheme.node(), "stage").orElse(Quantities.NONE))
                .closeLine();
    }
}
