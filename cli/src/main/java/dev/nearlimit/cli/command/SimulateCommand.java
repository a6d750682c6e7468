package dev.nearlimit.cli.command;

import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.Ebn0List;
import dev.nearlimit.cli.input.ThreadsOption;
import dev.nearlimit.cli.input.TimeLimit;
import dev.nearlimit.cli.journal.JournalOptions;
import dev.nearlimit.cli.journal.RunJournal;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.NoJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.StoppingRule;
import java.util.List;
import java.util.OptionalLong;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code simulate}: measures the error rates of one scheme. */
@Command(
        name = "simulate",
        description = "Measures frame, bit and undetected error rates of a code with its decoder, point by point.",
        footer = {
            "%nExamples:",
            "  nearlimit simulate ldpc-802.11n:648,1/2 --decoder min-sum:scale=6/8",
            "            --modulation qpsk --ebn0 1:0.25:2.5",
            "  nearlimit simulate golay:23,12 --decoder syndrome --channel bsc:0.01",
            "Every rate stands beside its 95 %% interval. Counts depend on code, decoder,",
            "channel, Eb/N0, seed and stopping rule alone: not on threads, machine or time.",
            "The same command goes on where a run was cut off; nearlimit runs lists what is",
            "kept."
        })
public final class SimulateCommand implements Callable<Integer> {
    private final Session session;

    @Spec
    private CommandSpec spec;

    @Mixin
    private CodeArgument argument;

    @Option(
            names = "--decoder",
            paramLabel = "DECODER",
            required = true,
            description = "Decoder with settings: syndrome, bounded-distance, maximum-likelihood,"
                    + " sum-product:iterations=50, min-sum:iterations=20,scale=6/8,word=6.")
    private String decoder;

    @Option(
            names = "--ebn0",
            paramLabel = "DB",
            converter = Ebn0List.Converter.class,
            description = "Eb/N0 in dB: a list 1,1.5,2 or a range start:step:end such as 1:0.5:3.")
    private Ebn0List ebn0;

    @Option(
            names = "--modulation",
            paramLabel = "NAME",
            defaultValue = "bpsk",
            description = "bpsk or qpsk (default: ${DEFAULT-VALUE}).")
    private String modulation;

    @Option(
            names = "--channel",
            paramLabel = "CHANNEL",
            defaultValue = "awgn",
            description = "awgn; bsc, which is awgn after hard decisions; or bsc:p with a crossover probability,"
                    + " which takes no Eb/N0 (default: ${DEFAULT-VALUE}).")
    private String channel;

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "1",
            description = "The same seed gives the same frames (default: ${DEFAULT-VALUE}).")
    private long seed;

    @Option(
            names = "--frames",
            paramLabel = "N",
            defaultValue = "1000000",
            description = "Frames a point at most (default: ${DEFAULT-VALUE}).")
    private long frames;

    @Option(
            names = "--frame-errors",
            paramLabel = "N",
            defaultValue = "100",
            description = "Frame errors after which a point is finished (default: ${DEFAULT-VALUE}).")
    private long frameErrors;

    @Option(
            names = "--time-limit",
            paramLabel = "TIME",
            converter = TimeLimit.Converter.class,
            description = "End after this time with what was counted, marked incomplete: 90s, 5m, 2h.")
    private TimeLimit timeLimit;

    @Mixin
    private ThreadsOption threads;

    @Mixin
    private JournalOptions journal;

    @Mixin
    private OutputOptions output;

    public SimulateCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        Channel overChannel = Channel.of(channel);
        List<Point> points = points(overChannel);
        StoppingRule rule = new StoppingRule(frames, frameErrors);
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        Modulation over = Modulation.of(modulation);
        Code code = argument.code();
        Scheme scheme = new Scheme(code, choice.decoder(), over, choice.quantiser(), overChannel);
        int workers = threads.count();
        // Each point is run once, so that without a file nothing needs to be kept.
        RunJournal kept = journal.open(session, new NoJournal());
        SimulationReport report;
        try (kept;
                Progress progress =
                        Progress.start(session.terminal(), spec.commandLine().getErr(), "simulating")) {
            SimulationRun run = new SimulationRun(
                    new Simulator(workers, kept.journal()), scheme, seed, rule, session.interruption());
            report = run.measure(points, timeLimit, kept.isFile(), progress);
        }
        output.show(report);
        if (session.interruption().requested()) {
            return ExitCode.INTERRUPTED;
        }
        return kept.failed() ? ExitCode.TOOL_FAILED : ExitCode.OK;
    }

    private List<Point> points(Channel overChannel) {
        if (overChannel.hasEbn0()) {
            if (ebn0 == null) {
                throw new InputException("channel " + overChannel.designator() + " needs --ebn0");
            }
            return ebn0.microDb().stream()
                    .map(microDb -> new Point(OptionalLong.of(microDb)))
                    .toList();
        }
        if (ebn0 != null) {
            throw new InputException(
                    "channel " + overChannel.designator() + " has a fixed parameter and takes no --ebn0");
        }
        return List.of(Point.ofFixedParameter());
    }
}
