package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.OptionalDouble;

/** The points behind the curves, folded away: how many frames, how many errors, which interval. */
final class MeasuredPoints {
    private static final List<String> HEADINGS = List.of(
            "#",
            "Scheme",
            "Eb/N0 [dB]",
            "Frames",
            "Frame errors",
            "FER",
            "95 % interval",
            "BER",
            "95 % interval",
            "Mean iterations");

    private MeasuredPoints() {}

    static void write(OperatingPoint point, Markup html) {
        if (point.schemes().stream()
                .allMatch(scheme -> scheme.node().path("points").isEmpty())) {
            return;
        }
        html.open("details", "class", "simulated-points").element("summary", "Simulated points in figures");
        html.open("div", "class", "scroll", "tabindex", "0", "role", "region", "aria-label", "Simulated points");
        html.open("table", "class", "points").open("thead").open("tr");
        HEADINGS.forEach(heading -> html.element("th", heading, "scope", "col"));
        html.close().close().open("tbody");
        for (SchemeEntry scheme : point.schemes()) {
            for (JsonNode measured : scheme.node().path("points")) {
                writeRow(scheme, measured, html);
            }
        }
        html.close().close().close().closeLine();
    }

    private static void writeRow(SchemeEntry scheme, JsonNode measured, Markup html) {
        html.open("tr").element("td", scheme.key(), "class", "rank");
        html.open("td", "class", "scheme").designator(scheme.code()).close();
        cell(html, Quantities.decibels(Fields.number(measured, "ebn0Db")));
        OptionalDouble frames = Fields.number(measured, "frames");
        boolean complete = measured.path("complete").asBoolean(true);
        cell(html, count(frames) + (complete ? "" : " (incomplete)"));
        cell(html, count(Fields.number(measured, "frameErrors")));
        writeRate(html, measured, "fer");
        writeRate(html, measured, "ber");
        OptionalDouble iterations = Fields.number(measured, "averageIterations");
        cell(html, iterations.isPresent() ? Quantities.significant(iterations.getAsDouble()) : Quantities.NONE);
        html.closeLine();
    }

    private static void writeRate(Markup html, JsonNode measured, String rate) {
        cell(html, Quantities.errorRate(Fields.number(measured, rate)));
        OptionalDouble low = Fields.number(measured, rate + "Low");
        OptionalDouble high = Fields.number(measured, rate + "High");
        cell(
                html,
                low.isPresent() && high.isPresent()
                        ? Quantities.errorRate(low) + " to " + Quantities.errorRate(high)
                        : Quantities.NONE);
    }

    private static String count(OptionalDouble value) {
        return value.isPresent() ? Quantities.count(value.getAsDouble()) : Quantities.NONE;
    }

    private static void cell(Markup html, String text) {
        html.element("td", text, "class", "number");
    }
}
