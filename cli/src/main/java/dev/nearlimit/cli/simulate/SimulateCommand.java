package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.CodeArgument;
import dev.nearlimit.cli.input.Ebn0List;
import dev.nearlimit.cli.input.ThreadsOption;
import dev.nearlimit.cli.journal.JournalOptions;
import dev.nearlimit.cli.journal.RunJournal;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.cli.output.Presentation;
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
            "  nearlimit simulate ldpc-802.11n:648,1/2 --decoder min-sum --ebn0 2",
            "            --sweep word=4..7 --sweep step=0.25,0.5,1",
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
                    + " which takes no Eb/N0. A receiver off by some dB: awgn:noise-estimate=1,gain=-0.5"
                    + " (default: ${DEFAULT-VALUE}).")
    private String channel;

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "1",
            description = "The same seed gives the same frames (default: ${DEFAULT-VALUE}).")
    private long seed;

    @Mixin
    private StoppingOptions stopping;

    @Option(
            names = "--sweep",
            paramLabel = "SETTING=VALUES",
            converter = Sweep.Converter.class,
            description = "Measure every value of a setting of decoder, quantiser or channel on the same frames and"
                    + " noise, and compare frame by frame: word=4..8, gain=-2..2:0.5, schedule=layered,flooding."
                    + " Given twice, all combinations.")
    private List<Sweep> sweeps = List.of();

    @Option(
            names = "--details",
            description = "Show detected and undetected failures, wrong bits of failed frames and iterations as well;"
                    + " JSON always has them.")
    private boolean details;

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
        Request request = new Request(points(overChannel), seed, stopping.choice(), details);
        Modulation over = Modulation.of(modulation);
        if (sweeps.isEmpty()) {
            DecoderChoice choice = DecoderDesignator.parse(decoder);
            Scheme scheme = new Scheme(argument.code(), choice.decoder(), over, choice.quantiser(), overChannel);
            return run(request, (meter, kept) -> {
                List<MeasuredPoint> measured = new SimulationRun(meter).measure(scheme, request.points());
                return new SimulationReport(
                        scheme,
                        request,
                        measured,
                        meter.endedBy(),
                        meter.performance(scheme.code().n(), kept));
            });
        }
        Code code = argument.code();
        SweepGrid grid = SweepGrid.of(sweeps, code, decoder, over, channel);
        return run(request, (meter, kept) -> {
            List<SweepPoint> measured = new SweepRun(meter).measure(grid, request.points());
            return new SweepReport(
                    grid, decoder, channel, request, measured, meter.endedBy(), meter.performance(code.n(), kept));
        });
    }

    /** What is measured and how it reads. */
    @FunctionalInterface
    private interface Measurement {
        /** @param kept whether blocks are kept in a journal that outlives the run */
        Presentation measure(PointMeter meter, boolean kept);
    }

    private int run(Request request, Measurement measurement) {
        int workers = threads.count();
        // Each point is run once, so that without a file nothing needs to be kept.
        RunJournal kept = journal.open(session, new NoJournal());
        Presentation report;
        try (kept;
                Progress progress =
                        Progress.start(session.terminal(), spec.commandLine().getErr(), "simulating")) {
            PointMeter meter = new PointMeter(
                    new Simulator(workers, kept.journal()),
                    request.seed(),
                    request.stopping(),
                    session.interruption(),
                    progress);
            report = measurement.measure(meter, kept.isFile());
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
