package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleFunction;

/** What the link demands, and the link budget of each operating point. */
final class RequirementSection {
    private static final Map<String, Demand> KNOWN = Map.ofEntries(
            known("bandwidthHz", "Occupied bandwidth, at most", hz -> Quantities.stated(hz, "Hz")),
            known("rollOff", "Roll-off of the pulse", Quantities::significant),
            known("bitRateBps", "Information bit rate", bps -> Quantities.stated(bps, "bit/s")),
            known("cOverN0DbHz", "Carrier-to-noise density C/N0", db -> Quantities.decibels(db) + " dBHz"),
            known("availableEbn0Db", "Available Eb/N0", db -> Quantities.decibels(db) + " dB"),
            known("payloadBits", "Payload", bits -> Quantities.count(bits) + " bits"),
            known("payloadFer", "Payload frame error rate, at most", Quantities::errorRate),
            known("ber", "Bit error rate, at most", Quantities::errorRate),
            known("undetectedErrorRate", "Undetected frame error rate, at most", Quantities::errorRate),
            known("latencyS", "Latency, at most", Quantities::seconds),
            known(
                    "operationsPerBit",
                    "Decoder operations per information bit, worst case, at most",
                    Quantities::significant),
            known("memoryBits", "Decoder memory, at most", bits -> Quantities.count(bits) + " bits"));

    private RequirementSection() {}

    private record Demand(String label, DoubleFunction<String> format) {}

    private static Map.Entry<String, Demand> known(String field, String label, DoubleFunction<String> format) {
        return Map.entry(field, new Demand(label, format));
    }

    static void write(JsonNode requirement, List<OperatingPoint> points, Markup html) {
        html.open("section", "id", "requirement").element("h2", "Requirement and link budget");
        html.open("div", "class", "side-by-side");
        boolean lossesInBudget = points.stream()
                .anyMatch(point -> !point.node().path("linkBudget").isEmpty());
        writeDemands(
                requirement,
                lossesInBudget ? Set.of("name", "description", "losses") : Set.of("name", "description"),
                html);
        for (OperatingPoint point : points) {
            writeBudget(point, points.size() > 1, html);
        }
        html.close().closeLine();
    }

    private static void writeDemands(JsonNode requirement, Set<String> saidElsewhere, Markup html) {
        html.open("table", "class", "facts").element("caption", "Demands");
        html.open("tbody");
        for (Map.Entry<String, JsonNode> field : requirement.properties()) {
            String value = value(field.getKey(), field.getValue());
            if (!value.isEmpty() && !saidElsewhere.contains(field.getKey())) {
                html.open("tr").element("th", label(field.getKey()), "scope", "row");
                html.element("td", value).closeLine();
            }
        }
        html.close().closeLine();
    }

    private static String label(String field) {
        Demand demand = KNOWN.get(field);
        if (demand != null) {
            return demand.label();
        }
        String words = field.replaceAll("(?<=[a-z0-9])(?=[A-Z])", " ");
        return words.isEmpty() ? field : Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    private static String value(String field, JsonNode value) {
        Demand demand = KNOWN.get(field);
        if (demand != null && value.isNumber()) {
            return demand.format().apply(value.doubleValue());
        }
        if (value.isContainerNode()) {
            List<String> parts = new ArrayList<>();
            if (value.isArray()) {
                value.forEach(element -> parts.add(element(element)));
            } else {
                value.properties().forEach(e -> parts.add(label(e.getKey()) + ": " + element(e.getValue())));
            }
            return String.join(", ", parts);
        }
        return value.isNull() ? "" : value.asText();
    }

    /** One element of a list: a loss with its name and decibels, or anything else as it stands. */
    private static String element(JsonNode element) {
        if (element.isObject() && element.path("db").isNumber()) {
            return Fields.text(element, "name").orElse("loss") + " "
                    + Quantities.decibels(element.path("db").doubleValue()) + " dB";
        }
        return element.isContainerNode() ? element.toString() : element.asText();
    }

    private static void writeBudget(OperatingPoint point, boolean named, Markup html) {
        JsonNode budget = point.node().path("linkBudget");
        if (budget.isEmpty()) {
            return;
        }
        html.open("table", "class", "facts budget");
        html.element("caption", named ? "Link budget: " + point.name() : "Link budget");
        html.open("thead").open("tr");
        html.element("th", "Item", "scope", "col").element("th", "dB", "scope", "col");
        html.close().close().open("tbody");
        for (int i = 0; i < budget.size(); i++) {
            JsonNode line = budget.get(i);
            html.open("tr", "class", i == budget.size() - 1 ? "total" : null);
            html.element("th", Fields.text(line, "item").orElse(""), "scope", "row");
            html.element("td", Quantities.decibels(Fields.number(line, "db"))).closeLine();
        }
        html.close().closeLine();
    }
}
