package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * One scheme of an operating point as the results hold it.
 *
 * @param key the short mark by which tables and charts name the scheme: its rank, or f1, f2, ... for schemes that
 *     have none because they fail
 * @param index the scheme's place in the results
 * @param node the scheme's fields
 */
record SchemeEntry(String key, int index, JsonNode node) {
    String code() {
        return Fields.text(node, "code").orElse("(unnamed code)");
    }

    String decoder() {
        return Fields.text(node, "decoder").orElse("(unnamed decoder)");
    }

    String modulation() {
        return Fields.text(node, "modulation").orElse("(unnamed modulation)");
    }

    /** The decoder without its settings. */
    String decoderName() {
        return decoder().split(":", 2)[0];
    }

    boolean quantised() {
        return Fields.text(node, "quantiser").filter(q -> !q.equals("none")).isPresent();
    }

    /** The channel's input where it is not plain floating-point LLRs from white noise, else an empty text. */
    String channelAndQuantiser() {
        String channel =
                Fields.text(node, "channel").filter(c -> !c.equals("awgn")).orElse("");
        String quantiser =
                Fields.text(node, "quantiser").filter(q -> !q.equals("none")).orElse("");
        return channel.isEmpty() || quantiser.isEmpty() ? channel + quantiser : channel + ", " + quantiser;
    }

    /** Whether it has a place in the table: a rank, or at least an Eb/N0 that it was found to need. */
    boolean placed() {
        return node.path("rank").isNumber() || number("neededEbn0Db").isPresent();
    }

    /** Whether another scheme is the same but for the modulation, and so lies on the same curve for BPSK and QPSK. */
    boolean sameCodeAndDecoder(SchemeEntry other) {
        return code().equals(other.code())
                && decoder().equals(other.decoder())
                && channelAndQuantiser().equals(other.channelAndQuantiser());
    }

    boolean meets() {
        return Fields.flag(node, "meets");
    }

    boolean tiedWithBest() {
        return Fields.flag(node, "tiedWithBest");
    }

    boolean hasCurve() {
        return node.path("points").size() > 0 || node.path("exactCurve").size() > 0;
    }

    OptionalDouble number(String field) {
        return Fields.number(node, field);
    }

    /** A needed Eb/N0 interval as low and high end in dB; an empty text where there is none or it has no width. */
    String neededInterval(String between) {
        OptionalDouble low = number("neededEbn0DbLow");
        OptionalDouble high = number("neededEbn0DbHigh");
        if (low.isEmpty() || high.isEmpty()) {
            return "";
        }
        String from = Quantities.decibels(low);
        String to = Quantities.decibels(high);
        return from.equals(to) ? "" : from + between + to;
    }

    /** Each demand that the scheme fails, and by how much. */
    List<Failure> failures() {
        List<Failure> failures = new ArrayList<>();
        for (JsonNode failure : node.path("fails")) {
            failures.add(new Failure(
                    Fields.text(failure, "demand").orElse("a demand"),
                    Fields.text(failure, "by").orElse("")));
        }
        return failures;
    }

    /** A demand that is failed, and by how much in words. */
    record Failure(String demand, String by) {
        String sentence() {
            return by.isEmpty() ? demand : demand + ": " + by;
        }
    }
}
