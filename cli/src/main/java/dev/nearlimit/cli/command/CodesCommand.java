package dev.nearlimit.cli.command;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.LengthRange;
import dev.nearlimit.cli.input.RateRange;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.family.CodeFamily;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.catalogue.DecoderCatalogue;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code codes}: what the catalogue has. */
@Command(
        name = "codes",
        description = "Lists codes that can be named, with length, dimension, rate, distance, decoders and source.",
        footer = {
            "%nExamples:",
            "  nearlimit codes --rate 1/2",
            "  nearlimit codes --family bch --length 63..127 --format csv"
        })
public final class CodesCommand implements Callable<Integer> {
    @Option(
            names = "--family",
            paramLabel = "NAME",
            description = "One family alone: hamming, bch, reed-muller, ldpc-802.11n and so on.")
    private String family;

    @Option(
            names = "--rate",
            paramLabel = "LOW..HIGH",
            converter = RateRange.Converter.class,
            description = "Rates within, both ends included: 1/3..3/4; one rate alone: 1/2.")
    private RateRange rates;

    @Option(
            names = "--length",
            paramLabel = "LOW..HIGH",
            converter = LengthRange.Converter.class,
            description = "Lengths in bits within, both ends included: 100..700; one length alone: 648.")
    private LengthRange lengths;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        Catalogue catalogue = Catalogue.standard();
        List<ListedCode> codes = families(catalogue).stream()
                .flatMap(member -> listed(catalogue, member))
                .filter(code -> rates == null || rates.contains(code.rateValue()))
                .filter(code -> lengths == null || lengths.contains(code.n()))
                .toList();
        List<String> decoders = DecoderCatalogue.standard().families().stream()
                .map(DecoderFamily::name)
                .toList();
        output.show(new CodesReport(codes, decoders));
        return 0;
    }

    private static Stream<ListedCode> listed(Catalogue catalogue, CodeFamily family) {
        return family.listed().stream().map(designator -> ListedCode.of(family.name(), catalogue.build(designator)));
    }

    private List<CodeFamily> families(Catalogue catalogue) {
        if (family == null) {
            return catalogue.families();
        }
        List<CodeFamily> found = catalogue.families().stream()
                .filter(member -> member.name().equalsIgnoreCase(family))
                .toList();
        if (found.isEmpty()) {
            throw new InputException("unknown code family '" + family + "'; known are "
                    + catalogue.families().stream().map(CodeFamily::name).collect(Collectors.joining(", ")));
        }
        return found;
    }
}
