package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** Results of an invented scenario, whole and in variants. The figures look plausible; none was measured. */
final class SampleResults {
    private SampleResults() {}

    /** Ten schemes, of which five meet the requirement, three are ranked and fail, and two were dropped. */
    static ObjectNode whole() {
        try (InputStream in = SampleResults.class.getResourceAsStream("glacier-sensor.json")) {
            return (ObjectNode) new ObjectMapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The schemes of the first operating point. */
    static ArrayNode schemes(JsonNode results) {
        return (ArrayNode) results.at("/operatingPoints/0/schemes");
    }

    static ObjectNode scheme(JsonNode results, int index) {
        return (ObjectNode) schemes(results).get(index);
    }

    /** The same with every ranked scheme failing. */
    static ObjectNode nothingMeets() {
        ObjectNode results = whole();
        for (JsonNode scheme : schemes(results)) {
            ObjectNode fields = (ObjectNode) scheme;
            fields.put("meets", false).put("tiedWithBest", false);
            if (fields.path("fails").isEmpty()) {
                fields.putArray("fails")
                        .addObject()
                        .put("demand", "available Eb/N0 1.20 dB")
                        .put(
                                "by",
                                "needs "
                                        + Quantities.decibels(
                                                fields.path("marginDb").asDouble()) + " dB more");
            }
        }
        return results;
    }

    /** Forty schemes: as the first, over and over with other shortening. */
    static ObjectNode many() {
        ObjectNode results = whole();
        ArrayNode schemes = schemes(results);
        int once = schemes.size();
        for (int i = once; i < 40; i++) {
            ObjectNode copy = schemes.get(i % once).deepCopy();
            copy.put("code", copy.path("code").asText() + ",shorten=" + i);
            if (copy.path("rank").isNumber()) {
                copy.put("rank", i);
            }
            schemes.add(copy);
        }
        return results;
    }
}
