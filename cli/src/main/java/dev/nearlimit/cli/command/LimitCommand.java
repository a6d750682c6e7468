package dev.nearlimit.cli.command;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.Fraction;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.limits.Limit;
import dev.nearlimit.limits.LimitTable;
import dev.nearlimit.limits.Modulation;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code limit}: the least Eb/N0 that physics allows at a rate. */
@Command(
        name = "limit",
        description = "The least Eb/N0 that any code could need at a rate: the bounds that a code is judged by.",
        footer = {
            "%nExamples:",
            "  nearlimit limit --rate 1/2",
            "  nearlimit limit --length 648 --information 324 --fer 1e-3 --ber 1e-5",
            "  nearlimit limit --rate 1/2 --word 4 --step 1",
            "The first shows the limits of unlimited length; the second adds what 324 bits in",
            "648 channel uses can reach, and what uncoded transmission needs at BER 1e-5; the",
            "third what a step of 1 costs a 4-bit quantiser of LLRs beside its best step."
        })
public final class LimitCommand implements Callable<Integer> {
    @Option(
            names = "--rate",
            paramLabel = "R",
            converter = Fraction.Converter.class,
            description = "Information bits per real dimension, above 0 and below 1: 1/2 or 0.5."
                    + " May be left out where --length and --information are given.")
    private Fraction rate;

    @Option(
            names = "--modulation",
            paramLabel = "NAME",
            defaultValue = "bpsk",
            description = "bpsk or qpsk (default: ${DEFAULT-VALUE}).")
    private String modulation;

    @Option(names = "--length", paramLabel = "N", description = "Channel uses (real dimensions) of a frame.")
    private Integer length;

    @Option(names = "--information", paramLabel = "K", description = "Information bits of a frame.")
    private Integer information;

    @Option(
            names = "--fer",
            paramLabel = "P",
            converter = Fraction.Converter.class,
            description = "Frame error rate; with --length and --information gives the estimate for that length.")
    private Fraction fer;

    @Option(
            names = "--ber",
            paramLabel = "P",
            converter = Fraction.Converter.class,
            description = "Bit error rate; gives what uncoded transmission needs.")
    private Fraction ber;

    @Mixin
    private QuantiserOptions quantiser;

    @Mixin
    private OutputOptions output;

    @Override
    public Integer call() {
        double perDimension = ratePerDimension();
        Modulation over = Modulation.of(modulation);
        List<Limit> limits = LimitTable.atRate(perDimension, over, of(length), of(information), of(fer), of(ber));
        output.show(new LimitReport(limits, quantiser.limits(perDimension, over)));
        return 0;
    }

    private double ratePerDimension() {
        if (rate != null) {
            return rate.value();
        }
        if (length == null || information == null) {
            throw new InputException("limit needs --rate, or --length and --information");
        }
        // Out-of-range counts are refused by the table, which names them.
        return (double) information / length;
    }

    private static OptionalInt of(Integer value) {
        return value == null ? OptionalInt.empty() : OptionalInt.of(value);
    }

    private static OptionalDouble of(Fraction value) {
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value.value());
    }
}
