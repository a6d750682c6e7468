package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.result.SchemeResult;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;

/** The answer in a sentence or two, from the ranked schemes. */
final class Verdict {
    private Verdict() {}

    static String of(List<SchemeResult> ranked, boolean complete) {
        if (ranked.isEmpty()) {
            return "Nothing was considered.";
        }
        SchemeResult first = ranked.get(0);
        if (!first.meets() && !complete) {
            return "The run was cut short before it found a scheme that meets every demand.";
        }
        return (complete ? "" : "So far: ") + (first.meets() ? winner(first, ranked) : closest(first));
    }

    private static String winner(SchemeResult best, List<SchemeResult> ranked) {
        String sentence = String.format(
                Locale.ROOT,
                "%s needs %.2f dB of Eb/N0 and leaves %.2f dB of margin",
                name(best),
                best.neededEbn0Db(),
                best.marginDb());
        List<SchemeResult> others = ranked.stream()
                .filter(SchemeResult::meets)
                .filter(scheme -> !sameCodeAndDecoder(scheme, best))
                .toList();
        long tied = others.stream().filter(SchemeResult::tiedWithBest).count();
        String ties = tied == 0
                ? ""
                : String.format(
                        Locale.ROOT,
                        "; %d other %s cannot be told apart from it",
                        tied,
                        tied == 1 ? "scheme" : "schemes");
        String next = others.stream()
                .filter(scheme -> !scheme.tiedWithBest())
                .findFirst()
                .map(scheme -> String.format(
                        Locale.ROOT,
                        "; the next, %s, needs %.2f dB more",
                        name(scheme),
                        scheme.neededEbn0Db() - best.neededEbn0Db()))
                .orElse("");
        return sentence + ties + next + ".";
    }

    private static String closest(SchemeResult scheme) {
        String misses = scheme.fails().stream()
                .map(failure -> failure.demand() + ": " + failure.by())
                .collect(Collectors.joining("; "));
        return "No scheme meets every demand. " + name(scheme) + " comes closest; it misses " + misses + ".";
    }

    private static boolean sameCodeAndDecoder(SchemeResult a, SchemeResult b) {
        return a.code().equals(b.code())
                && a.decoder().equals(b.decoder())
                && a.quantiser().equals(b.quantiser());
    }

    private static String name(SchemeResult scheme) {
        return scheme.code() + " with " + scheme.shortDecoder() + " on "
                + scheme.modulation().toUpperCase(Locale.ROOT);
    }
}
