package dev.nearlimit.cli.command;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.KnownDistance;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.catalogue.DecoderCatalogue;
import java.util.List;
import java.util.OptionalInt;

/**
 * A code as the list shows it.
 *
 * @param family the family's name
 * @param minimumDistance where a theorem gives it
 * @param decoders names of the decoders that fit it
 */
record ListedCode(
        String designator,
        String family,
        int n,
        int k,
        OptionalInt minimumDistance,
        String source,
        List<String> decoders) {
    ListedCode {
        decoders = List.copyOf(decoders);
    }

    static ListedCode of(String family, Code code) {
        OptionalInt distance = code.knownDistance()
                .map(KnownDistance::value)
                .map(OptionalInt::of)
                .orElse(OptionalInt.empty());
        List<String> decoders = DecoderCatalogue.standard().fitting(code).stream()
                .map(DecoderFamily::name)
                .toList();
        return new ListedCode(code.designator(), family, code.n(), code.k(), distance, code.source(), decoders);
    }

    /** k/n, not reduced. */
    String rate() {
        return k + "/" + n;
    }

    double rateValue() {
        return (double) k / n;
    }
}
