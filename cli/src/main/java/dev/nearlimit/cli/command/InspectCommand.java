package dev.nearlimit.cli.command;

import dev.nearlimit.algebra.distance.DistanceReport;
import dev.nearlimit.algebra.errorrate.UnionBound;
import dev.nearlimit.algebra.graph.TannerGraph;
import dev.nearlimit.algebra.weight.InfeasibleEnumerationException;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.input.CodeArgument;
import dev.nearlimit.cli.input.Ebn0List;
import dev.nearlimit.cli.input.ThreadsOption;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.codes.Code;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code inspect}: the exact facts about one code. */
@Command(
        name = "inspect",
        description = "Exact facts about a code: dimension, distance, weights, error bounds, Tanner graph.",
        footer = {
            "%nExamples:",
            "  nearlimit inspect bch:31,16",
            "  nearlimit inspect ./my-code.mtx --matrix parity --format json",
            "Weights are counted where the code or its dual has at most 2^26 words."
        })
public final class InspectCommand implements Callable<Integer> {
    private final Session session;

    @Spec
    private CommandSpec spec;

    @Mixin
    private CodeArgument argument;

    @Option(
            names = "--ebn0",
            paramLabel = "DB",
            defaultValue = "2:1:8",
            converter = Ebn0List.Converter.class,
            description = "Eb/N0 in dB of the error bounds: a list or start:step:end (default: ${DEFAULT-VALUE}).")
    private Ebn0List ebn0;

    @Mixin
    private ThreadsOption threads;

    @Mixin
    private OutputOptions output;

    public InspectCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        Code code = argument.code();
        DistanceReport distances = distances(code);
        List<MaximumLikelihoodBound> bounds = distances
                .weights()
                .map(weights -> MaximumLikelihoodBound.at(ebn0, UnionBound.of(weights)))
                .orElse(List.of());
        TannerGraph graph = TannerGraph.of(code.parityCheck());
        output.show(new InspectReport(code, distances, whyNotEnumerated(code), bounds, graph));
        return 0;
    }

    private DistanceReport distances(Code code) {
        try (Progress progress =
                Progress.start(session.terminal(), spec.commandLine().getErr(), "weighing words")) {
            return DistanceReport.of(code, threads.count(), (done, all) -> {
                progress.at((double) done / all, done + " of " + all + " words");
                return !session.interruption().requested();
            });
        }
    }

    /** Why there is no weight enumerator; empty where there is one. */
    private static String whyNotEnumerated(Code code) {
        if (WeightEnumeration.isFeasible(code)) {
            return "";
        }
        try {
            WeightEnumeration.exact(code);
            return "";
        } catch (InfeasibleEnumerationException e) {
            return e.getMessage();
        }
    }
}
