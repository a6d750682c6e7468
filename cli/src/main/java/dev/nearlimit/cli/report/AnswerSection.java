package dev.nearlimit.cli.report;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The answer for one operating point, in two sentences: which scheme, what it needs, what is left, what it beats. */
final class AnswerSection {
    private static final int SCHEMES_NAMED = 2;
    private static final int FAILURES_NAMED = 3;

    private final JsonNode requirement;
    private final OperatingPoint point;
    private final Markup html;

    private AnswerSection(JsonNode requirement, OperatingPoint point, Markup html) {
        this.requirement = requirement;
        this.point = point;
        this.html = html;
    }

    static void write(JsonNode requirement, OperatingPoint point, Markup html) {
        new AnswerSection(requirement, point, html).write();
    }

    private void write() {
        Optional<SchemeEntry> winner = point.winner();
        Optional<SchemeEntry> spokenOf =
                winner.or(() -> point.schemes().stream().findFirst());
        html.open("div", "class", winner.isPresent() ? "answer" : "answer unmet");
        html.element(
                "p",
                winner.isPresent() ? "\u2713 The requirement can be met" : "\u2717 No scheme meets every demand",
                "class",
                "verdict");
        html.open("p");
        if (winner.isPresent()) {
            writeWinner(winner.get());
        } else if (spokenOf.isPresent()) {
            writeClosest(spokenOf.get());
        } else {
            html.text(Fields.text(point.node(), "verdict").orElse("No scheme was tried."));
        }
        html.close();
        spokenOf.ifPresent(this::writeInFull);
        html.closeLine();
    }

    private void writeWinner(SchemeEntry winner) {
        writeScheme(winner);
        html.text(" ranks first of the schemes that meet every demand");
        writeNeed(winner);
        OptionalDouble margin = winner.number("marginDb");
        if (margin.isPresent()) {
            html.text(", which leaves ");
            html.element("strong", Quantities.decibels(margin) + " dB of margin");
        }
        html.text(". ");
        String gaps = gaps(winner);
        html.text(gaps.isEmpty() ? "" : "It stands " + gaps);
        writeBeaten(winner, gaps.isEmpty() ? "It comes" : ", and comes");
    }

    private void writeClosest(SchemeEntry closest) {
        html.text("What comes closest is ");
        writeScheme(closest);
        writeNeed(closest);
        html.text(". ");
        List<SchemeEntry.Failure> failures = closest.failures();
        if (failures.isEmpty()) {
            html.text(Fields.text(closest.node(), "note")
                    .map(note -> "It was not ranked: " + note + ".")
                    .orElse(""));
            return;
        }
        html.text("It misses ");
        List<String> missed = failures.stream()
                .limit(FAILURES_NAMED)
                .map(failure -> failure.demand() + (failure.by().isEmpty() ? "" : " (" + failure.by() + ")"))
                .toList();
        html.element("strong", enumerate(missed));
        html.text(failures.size() > FAILURES_NAMED ? " and more, listed below" : "");
        String gaps = gaps(closest);
        html.text(gaps.isEmpty() ? "." : "; it stands " + gaps + ".");
    }

    private void writeScheme(SchemeEntry scheme) {
        html.open("strong").designator(scheme.code()).close();
        html.text(" decoded by ").designator(scheme.decoderName());
        html.text(" over ").designator(scheme.modulation());
        html.text(scheme.quantised() ? ", quantised," : "");
    }

    /** The settings that the sentences leave out. */
    private void writeInFull(SchemeEntry scheme) {
        String rest = scheme.channelAndQuantiser();
        if (scheme.decoder().equals(scheme.decoderName()) && rest.isEmpty()) {
            return;
        }
        html.open("p", "class", "in-full").text("In full: ").designator(scheme.decoder());
        if (!rest.isEmpty()) {
            html.text(" \u00b7 ").designator(rest);
        }
        html.close();
    }

    private void writeNeed(SchemeEntry scheme) {
        OptionalDouble needed = scheme.number("neededEbn0Db");
        if (needed.isEmpty()) {
            return;
        }
        html.text(": it needs Eb/N0\u00a0=\u00a0");
        html.element("strong", Quantities.decibels(needed) + " dB");
        List<String> remarks = new ArrayList<>();
        String interval = scheme.neededInterval(" to ");
        if (!interval.isEmpty()) {
            remarks.add("95 % interval " + interval + " dB");
        }
        Fields.text(scheme.node(), "neededMethod").ifPresent(remarks::add);
        html.text(remarks.isEmpty() ? "" : " (" + String.join(", ", remarks) + ")");
        OptionalDouble target = Fields.number(requirement, "payloadFer");
        if (target.isPresent()) {
            html.text(" for a payload frame error rate of " + Quantities.errorRate(target));
        }
        OptionalDouble available = Fields.number(point.node(), "availableEbn0Db");
        if (available.isPresent()) {
            html.text(" where " + Quantities.decibels(available) + " dB are available");
        }
    }

    private static String gaps(SchemeEntry scheme) {
        List<String> gaps = new ArrayList<>();
        addGap(gaps, scheme, "gapToShannonDb", "from the Shannon limit");
        addGap(gaps, scheme, "gapToModulationLimitDb", "from the limit of its modulation");
        addGap(gaps, scheme, "gapToHardDecisionLimitDb", "from the limit of hard decisions");
        addGap(
                gaps,
                scheme,
                "gapToFiniteLengthDb",
                "from the limit at its length"
                        + Fields.text(scheme.node(), "gapToFiniteLengthMethod")
                                .map(method -> " (" + method + ")")
                                .orElse(""));
        return enumerate(gaps);
    }

    private static void addGap(List<String> gaps, SchemeEntry scheme, String field, String words) {
        OptionalDouble gap = scheme.number(field);
        if (gap.isPresent()) {
            gaps.add(Quantities.decibels(gap) + "\u00a0dB " + words);
        }
    }

    private void writeBeaten(SchemeEntry winner, String start) {
        List<SchemeEntry> others = others(winner);
        List<SchemeEntry> tied =
                others.stream().filter(SchemeEntry::tiedWithBest).toList();
        List<SchemeEntry> next =
                others.stream().filter(scheme -> !scheme.tiedWithBest()).toList();
        boolean continues = start.startsWith(",");
        if (!next.isEmpty()) {
            html.text(start + " before ");
            writeNames(next.subList(0, Math.min(next.size(), SCHEMES_NAMED)));
        }
        if (!tied.isEmpty()) {
            html.text(
                    continues || !next.isEmpty()
                            ? "; its interval overlaps that of "
                            : "Its interval overlaps that of ");
            writeNames(tied.subList(0, Math.min(tied.size(), SCHEMES_NAMED)));
            html.text(tied.size() > SCHEMES_NAMED ? " and of others" : "");
        }
        html.text(continues || !others.isEmpty() ? "." : "");
    }

    /** The schemes behind the winner, one for each code with its decoder: the same over another modulation is no rival. */
    private List<SchemeEntry> others(SchemeEntry winner) {
        List<SchemeEntry> others = new ArrayList<>();
        for (SchemeEntry scheme : point.placed()) {
            if (!scheme.sameCodeAndDecoder(winner) && others.stream().noneMatch(scheme::sameCodeAndDecoder)) {
                others.add(scheme);
            }
        }
        return others;
    }

    private void writeNames(List<SchemeEntry> schemes) {
        for (int i = 0; i < schemes.size(); i++) {
            SchemeEntry scheme = schemes.get(i);
            html.text(i == 0 ? "" : i == schemes.size() - 1 ? " and " : ", ");
            html.designator(scheme.code()).text(" by ").designator(scheme.decoderName());
            OptionalDouble needed = scheme.number("neededEbn0Db");
            if (needed.isPresent()) {
                html.text(" (" + Quantities.decibels(needed) + "\u00a0dB"
                        + (scheme.meets() ? "" : ", fails the requirement") + ")");
            }
        }
    }

    private static String enumerate(List<String> items) {
        return items.size() < 2
                ? String.join("", items)
                : String.join(", ", items.subList(0, items.size() - 1)) + " and " + items.get(items.size() - 1);
    }
}
