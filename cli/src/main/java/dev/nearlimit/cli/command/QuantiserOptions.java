package dev.nearlimit.cli.command;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.limits.QuantisedLimit;
import dev.nearlimit.limits.QuantiserRise;
import dev.nearlimit.limits.UniformLlrQuantiser;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Option;

/** The options of {@code limit} that put a quantiser before the decoder; named like the settings of a scheme's. */
final class QuantiserOptions {
    @Option(
            names = "--word",
            paramLabel = "BITS",
            description =
                    "Bits of a quantised LLR, 1 to 8; gives the limit behind such a quantiser, and its best step.")
    private Integer word;

    @Option(
            names = "--step",
            paramLabel = "LLR",
            description = "Distance of its levels in LLR units; gives what this step loses beside the best.")
    private Double step;

    @Option(names = "--clip", paramLabel = "LLR", description = "Its outermost level in LLR units, instead of --step.")
    private Double clip;

    @Option(
            names = "--rise",
            paramLabel = "RISE",
            description = "mid-tread, which has a level at 0, or mid-rise, which has a threshold there"
                    + " (default: mid-tread).")
    private String rise;

    /** The limits behind the quantiser: that of the step given, if any, then that of the best, if steps matter. */
    List<QuantisedLimit> limits(double rate, Modulation modulation) {
        if (word == null) {
            refuseWithoutWord("--step", step);
            refuseWithoutWord("--clip", clip);
            refuseWithoutWord("--rise", rise);
            return List.of();
        }
        if (step != null && clip != null) {
            throw new InputException("--step and --clip exclude each other");
        }
        QuantiserRise levels = rise == null ? QuantiserRise.MID_TREAD : QuantiserRise.of(rise);
        List<QuantisedLimit> limits = new ArrayList<>();
        if (step != null || clip != null) {
            UniformLlrQuantiser asked = clip != null
                    ? UniformLlrQuantiser.ofClip(word, clip, levels)
                    : new UniformLlrQuantiser(word, step, levels);
            limits.add(QuantisedLimit.of(rate, modulation, asked));
        }
        if (word != 1) {
            limits.add(QuantisedLimit.ofBestStep(rate, modulation, word, levels));
        } else if (limits.isEmpty()) {
            limits.add(QuantisedLimit.of(rate, modulation, new UniformLlrQuantiser(word, 1, levels)));
        }
        return limits;
    }

    private static void refuseWithoutWord(String option, Object value) {
        if (value != null) {
            throw new InputException(option + " needs --word, the bits of the quantised LLR, beside it");
        }
    }
}
