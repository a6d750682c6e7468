package dev.nearlimit.journal;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A job in words, as named facts in the order in which they were added. It stands beside the job's hash for people to
 * read, and is no part of the key.
 *
 * @param facts names and values
 */
public record JobDescription(Map<String, String> facts) {
    public static final JobDescription NONE = new JobDescription(Map.of());

    public JobDescription {
        facts = Collections.unmodifiableMap(new LinkedHashMap<>(facts));
    }

    /** This description with one fact more. */
    public JobDescription with(String name, String value) {
        Map<String, String> more = new LinkedHashMap<>(facts);
        more.put(name, value);
        return new JobDescription(more);
    }

    /** The value of a fact, if the description has it. */
    public Optional<String> fact(String name) {
        return Optional.ofNullable(facts.get(name));
    }
}
