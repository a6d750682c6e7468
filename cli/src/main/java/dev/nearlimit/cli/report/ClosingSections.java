package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** What every figure on the page rests on: how it was obtained, how to obtain it again, and what it does not say. */
final class ClosingSections {
    /** The cautions of a report whose results bring none of their own. */
    private static final List<String> STANDING_CAUTIONS = List.of(
            "Simulation by itself does not qualify a link on which safety depends.",
            "Undetected errors, and error floors below the rates that were simulated, are not ruled out.",
            "Transmit power, bandwidth and spectral masks are set by the radio regulator and by the governing standard.",
            "Where licensed or certified practice is asked for, final sign-off is for those who hold it.");

    private ClosingSections() {}

    static void write(JsonNode results, Markup html) {
        writeProvenance(html);
        writeReproduction(results, html);
        writeCautions(results, html);
    }

    private static void writeProvenance(Markup html) {
        html.open("section", "id", "obtained").element("h2", "How the figures were obtained");
        html.open("table", "class", "facts legend-of-marks").open("tbody");
        for (Provenance provenance : Provenance.values()) {
            html.open("tr").open("th", "scope", "row");
            html.element("abbr", provenance.mark(), "class", "how").text(" " + provenance.word());
            html.close().element("td", provenance.meaning()).closeLine();
        }
        html.close().close();
        html.element(
                "p",
                "Limits are taken per real dimension in use, at the scheme's own rate. Gap is the Eb/N0 that a scheme needs"
                        + " at the target, minus the limit; margin is the available Eb/N0 minus the needed one; coding gain is"
                        + " what uncoded transmission with the same modulation needs at the same bit error rate, minus what the"
                        + " scheme needs.");
        html.closeLine();
    }

    private static void writeReproduction(JsonNode results, Markup html) {
        Map<String, String> facts = new LinkedHashMap<>();
        JsonNode tool = results.path("tool");
        JsonNode performance = results.path("performance");
        put(facts, "Command", Fields.text(tool, "command").orElse(""));
        put(
                facts,
                "Requirement file",
                Fields.text(results.path("requirement"), "file").orElse(""));
        put(facts, "Seed", Fields.text(results, "seed").orElse(""));
        put(
                facts,
                "Tool",
                (Fields.text(tool, "name").orElse("") + " "
                                + Fields.text(tool, "version").orElse(""))
                        .trim());
        put(
                facts,
                "Kernel",
                Fields.text(tool, "kernel")
                        .or(() -> Fields.text(performance, "kernel"))
                        .orElse(""));
        put(facts, "Java", Fields.text(tool, "jvm").orElse(""));
        put(facts, "Threads", Fields.text(performance, "threads").orElse(""));
        putNumber(facts, "Frames simulated", Fields.number(performance, "framesSimulated"), "");
        putNumber(facts, "Elapsed", Fields.number(performance, "elapsedS"), " s");
        putNumber(facts, "Coded throughput", Fields.number(performance, "codedMbPerS"), " Mbit/s");
        html.open("section", "id", "reproduce").element("h2", "To reproduce");
        html.open("table", "class", "facts").open("tbody");
        facts.forEach((label, value) -> {
            html.open("tr").element("th", label, "scope", "row");
            html.open("td").element(label.equals("Command") ? "code" : "span", value);
            html.close().closeLine();
        });
        html.close().close();
        html.element(
                "p",
                "Error counts depend on the scheme, the channel, Eb/N0, the seed and the stopping rule alone: not on the"
                        + " number of threads, the kernel, the Java version or the machine.");
        html.closeLine();
    }

    private static void put(Map<String, String> facts, String label, String value) {
        if (!value.isEmpty()) {
            facts.put(label, value);
        }
    }

    private static void putNumber(Map<String, String> facts, String label, OptionalDouble value, String unit) {
        if (value.isPresent()) {
            facts.put(label, Quantities.significant(value.getAsDouble()) + unit);
        }
    }

    private static void writeCautions(JsonNode results, Markup html) {
        html.open("section", "id", "cautions").element("h2", "Cautions").open("ul");
        List<String> cautions = new ArrayList<>();
        for (JsonNode caution : results.path("cautions")) {
            if (caution.isTextual() && !caution.asText().isBlank()) {
                cautions.add(caution.asText());
            }
        }
        (cautions.isEmpty() ? STANDING_CAUTIONS : cautions).forEach(caution -> html.element("li", caution));
        html.close().closeLine();
    }
}
