package dev.nearlimit.shortlist.requirement;

import java.util.List;
import java.util.OptionalDouble;

/**
 * What the user's link demands and what is to be considered for it.
 *
 * @param name the user's name for it
 * @param description free text, may be empty
 * @param link the link
 * @param payload payload and target
 * @param latencyS longest time from the first symbol of a payload to its last on air [s], if bounded
 * @param operationsPerBit most operations per information bit that the decoder may take in its worst case, if bounded
 * @param candidates codes with decoders, in the user's order
 */
public record Requirement(
        String name,
        String description,
        Link link,
        Payload payload,
        OptionalDouble latencyS,
        OptionalDouble operationsPerBit,
        List<Candidate> candidates) {
    public Requirement {
        candidates = List.copyOf(candidates);
        requirePositive("latencyS", latencyS, "s");
        requirePositive("decoderBudget.operationsPerBit", operationsPerBit, "operations per information bit");
        if (candidates.isEmpty()) {
            throw new InvalidRequirementException("candidates", "candidates is empty, needs at least one code");
        }
    }

    private static void requirePositive(String field, OptionalDouble value, String unit) {
        if (value.isPresent() && !(value.getAsDouble() > 0 && value.getAsDouble() < Double.POSITIVE_INFINITY)) {
            throw new InvalidRequirementException(
                    field,
                    field.substring(field.indexOf('.') + 1) + " is " + value.getAsDouble() + ", must be above 0 "
                            + unit);
        }
    }
}
