package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.input.TimeLimit;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.simulation.StoppingRule;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * When points end.
 *
 * @param rule applied to each point at the exact frame
 * @param relativeWidth the relative width of the interval that the rule's frame errors were chosen for; empty if none
 * @param timeLimit for all points together; what it ends is incomplete
 */
record StoppingChoice(StoppingRule rule, OptionalDouble relativeWidth, Optional<TimeLimit> timeLimit) {
    private static final double MILLISECONDS = 1000;

    /** As {@code until 100 frame errors or 1000000 frames}. */
    String text() {
        return "until " + rule.frameErrors() + " frame errors"
                + (relativeWidth.isPresent()
                        ? " (interval within " + Numbers.exact(relativeWidth.getAsDouble()) + " of the FER)"
                        : "")
                + " or " + rule.maxFrames() + " frames";
    }

    ObjectNode json() {
        ObjectNode node = JsonText.object();
        node.put("frames", rule.maxFrames()).put("frameErrors", rule.frameErrors());
        JsonText.put(node, "relativeWidth", relativeWidth.orElse(Double.NaN));
        JsonText.put(
                node,
                "timeLimitS",
                timeLimit
                        .map(limit -> limit.duration().toMillis() / MILLISECONDS)
                        .orElse(Double.NaN));
        return node;
    }
}
