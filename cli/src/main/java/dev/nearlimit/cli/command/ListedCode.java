package dev.nearlimit.cli.command;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.KnownDistance;
import java.util.OptionalInt;

/**
 * A code as the list shows it.
 *
 * @param family the family's name
 * @param minimumDistance where a theorem gives it
 */
record ListedCode(String designator, String family, int n, int k, OptionalInt minimumDistance, String source) {
    static ListedCode of(String family, Code code) {
        OptionalInt distance = code.knownDistance()
                .map(KnownDistance::value)
                .map(OptionalInt::of)
                .orElse(OptionalInt.empty());
        return new ListedCode(code.designator(), family, code.n(), code.k(), distance, code.source());
    }

    /** k/n, not reduced. */
    String rate() {
        return k + "/" + n;
    }

    double rateValue() {
        return (double) k / n;
    }
}
