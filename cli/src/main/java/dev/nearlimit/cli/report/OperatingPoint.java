package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * One operating point of the requirement with its schemes.
 *
 * @param index its place in the results
 * @param node its fields
 * @param schemes the ranked schemes in rank order, then the others as they stand, the nearest first
 */
record OperatingPoint(int index, JsonNode node, List<SchemeEntry> schemes) {
    /** How many curves the error-rate chart shows before the reader picks others: more would hide each other. */
    private static final int CURVES_AT_FIRST = 5;

    static OperatingPoint of(int index, JsonNode node) {
        List<SchemeEntry> ranked = new ArrayList<>();
        List<SchemeEntry> others = new ArrayList<>();
        int i = 0;
        for (JsonNode scheme : node.path("schemes")) {
            if (scheme.path("rank").isNumber()) {
                ranked.add(new SchemeEntry(scheme.path("rank").asText(), i, scheme));
            } else {
                others.add(new SchemeEntry("f" + (others.size() + 1), i, scheme));
            }
            i++;
        }
        ranked.sort(Comparator.comparingInt(scheme -> scheme.node().path("rank").asInt()));
        ranked.addAll(others);
        return new OperatingPoint(index, node, List.copyOf(ranked));
    }

    String name() {
        return Fields.text(node, "name").orElse("Operating point " + (index + 1));
    }

    /** Schemes with a rank, then those that fail but have an Eb/N0 that they need. */
    List<SchemeEntry> placed() {
        return schemes.stream().filter(SchemeEntry::placed).toList();
    }

    /** Schemes that fail a demand or were dropped before anything was found. */
    List<SchemeEntry> rejected() {
        return schemes.stream()
                .filter(scheme -> !scheme.meets() || !scheme.placed())
                .toList();
    }

    /** Whether more than one scheme may be the best, as far as the measurements tell. */
    boolean hasTie() {
        return schemes.stream().filter(SchemeEntry::tiedWithBest).count() > 1;
    }

    /** The best scheme that meets every demand. */
    Optional<SchemeEntry> winner() {
        return schemes.stream().filter(SchemeEntry::meets).findFirst();
    }

    /**
     * The schemes whose curves are shown at first, by their index in the results: the best scheme of each of the best
     * codes, since the same code with another decoder or modulation mostly lies on the same curve.
     */
    Set<Integer> shownAtFirst() {
        Map<String, Integer> bestOfCode = new LinkedHashMap<>();
        for (SchemeEntry scheme : placed()) {
            if (scheme.hasCurve() && bestOfCode.size() < CURVES_AT_FIRST) {
                bestOfCode.putIfAbsent(scheme.code(), scheme.index());
            }
        }
        return Set.copyOf(bestOfCode.values());
    }
}
