package dev.nearlimit.cli.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import dev.nearlimit.cli.output.OutputFile;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * Draws the results of a shortlist as one self-contained HTML page: answer, requirement and link budget, ranked table,
 * charts, and what is needed to reproduce the figures. The page opens offline, asks nothing of any server and carries
 * the results themselves as JSON. Only formatting happens here; fields that the results lack leave gaps on the page,
 * never an error.
 */
public final class HtmlReport {
    private static final String CHART_LIBRARY = "/META-INF/resources/webjars/echarts/5.3.1/dist/echarts.min.js";

    /** The page's own scripts, in the order in which they build on each other. */
    private static final List<String> SCRIPTS = List.of(
            "text.js",
            "tables.js",
            "appearance.js",
            "chart-frame.js",
            "error-rate-chart.js",
            "efficiency-chart.js",
            "page.js");

    private HtmlReport() {}

    /**
     * Writes the page, whole or not at all.
     *
     * @param results the results of the shortlist command, with Eb/N0 in dB, as the JSON contract has them
     * @param target where the page goes; its folder must exist, and a file that is there already is replaced
     * @throws dev.nearlimit.cli.failure.InputException if the page cannot be written there
     */
    public static void write(JsonNode results, Path target) {
        OutputFile.write(target, render(results));
    }

    /**
     * Renders the page.
     *
     * @param results the results of the shortlist command
     * @return the whole page, UTF-8 by declaration
     */
    public static String render(JsonNode results) {
        JsonNode requirement = results.path("requirement");
        List<OperatingPoint> points = new ArrayList<>();
        for (JsonNode point : results.path("operatingPoints")) {
            points.add(OperatingPoint.of(points.size(), point));
        }
        String name = Fields.text(requirement, "name").orElse("Unnamed requirement");
        return PageTemplate.load()
                .fill(Map.of(
                        "title", new Markup().text(name).html(),
                        "style", PageTemplate.resource("report.css"),
                        "main", main(results, requirement, points, name),
                        "results", embeddable(results),
                        "chart-library", withoutEndTags(PageTemplate.resource(CHART_LIBRARY)),
                        "scripts",
                                withoutEndTags(SCRIPTS.stream()
                                        .map(PageTemplate::resource)
                                        .collect(Collectors.joining("\n")))));
    }

    private static String main(JsonNode results, JsonNode requirement, List<OperatingPoint> points, String name) {
        Markup html = new Markup();
        html.open("header").element("p", "Nearlimit shortlist", "class", "kind");
        html.element("h1", name);
        Fields.text(requirement, "description").ifPresent(text -> html.element("p", text, "class", "description"));
        html.closeLine();
        if (!results.path("complete").asBoolean(true)) {
            html.element(
                    "p",
                    "Incomplete: the run was interrupted, and this is what it had found by then. Schemes may be missing, and"
                            + " ranks may change.",
                    "class",
                    "incomplete",
                    "role",
                    "note");
        }
        boolean several = points.size() > 1;
        html.open("section", "id", "answer");
        html.element("h2", several ? "Answers" : "Answer");
        if (points.isEmpty()) {
            html.element("p", "The results hold no operating point.");
        }
        for (OperatingPoint point : points) {
            if (several) {
                html.element("h3", point.name());
            }
            AnswerSection.write(requirement, point, html);
        }
        html.closeLine();
        RequirementSection.write(requirement, points, html);
        for (OperatingPoint point : points) {
            html.open("section", "class", "operating-point");
            html.element("h2", several ? "Schemes: " + point.name() : "Schemes");
            RankedTable.write(point, html);
            RejectedTable.write(point, html);
            ChartSection.write(point, html);
            MeasuredPoints.write(point, html);
            html.closeLine();
        }
        ClosingSections.write(results, html);
        return html.html();
    }

    /** JSON that may stand inside a script element: no tag can begin where there is no less-than sign. */
    private static String embeddable(JsonNode results) {
        try {
            return new ObjectMapper().writeValueAsString(results).replace("<", "\\u003c");
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("the results cannot be written as JSON", e);
        }
    }

    /** A script in which no string ends the element that holds it. */
    private static String withoutEndTags(String script) {
        return script.replaceAll("(?i)</(?=script)", "<\\\\/");
    }
}
