package dev.nearlimit.cli.report;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** How a figure was obtained, with the mark that stands beside it in tables. */
enum Provenance {
    EXACT("e", "computed from the structure of the code without sampling; rounding is the only error"),
    BOUND("b", "proven to lie on one side of the true value"),
    SIMULATED("s", "measured over random frames; the interval holds the true value with 95 % confidence or more"),
    ESTIMATED("\u2248", "a calculation with a named approximation; neither proven nor measured"),
    PUBLISHED("p", "taken from a source that is named, not checked here");

    private final String mark;
    private final String meaning;

    Provenance(String mark, String meaning) {
        this.mark = mark;
        this.meaning = meaning;
    }

    String mark() {
        return mark;
    }

    String meaning() {
        return meaning;
    }

    String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** Reads a method such as {@code simulated} or {@code estimated: normal approximation}. */
    static Optional<Provenance> of(String method) {
        return Arrays.stream(values())
                .filter(provenance -> method.equals(provenance.word()) || method.startsWith(provenance.word() + ":"))
                .findFirst();
    }

    /** Writes the mark with the whole method as its title; nothing where the method is not given. */
    static void write(Markup html, String method) {
        of(method)
                .ifPresent(provenance ->
                        html.text("\u00a0").element("abbr", provenance.mark, "class", "how", "title", method));
    }
}
