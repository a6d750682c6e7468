package dev.nearlimit.cli.command;

import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.input.CodeArgument;
import dev.nearlimit.cli.input.Ebn0List;
import dev.nearlimit.cli.input.ShiftList;
import dev.nearlimit.cli.input.ThreadsOption;
import dev.nearlimit.cli.input.TimeLimit;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.importance.ImportanceSampler;
import dev.nearlimit.simulation.importance.NoiseBias;
import dev.nearlimit.simulation.importance.RareErrorEstimate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code rare-errors}: the part of a low error rate that is due to given sets of positions. */
@Command(
        name = "rare-errors",
        description = "Estimates the part of a frame error rate too low to count that is due to codewords of low"
                + " weight or to trapping sets, by importance sampling on awgn.",
        footer = {
            "%nExamples:",
            "  nearlimit rare-errors golay:24,12 --decoder maximum-likelihood",
            "            --sets lightest --ebn0 6:1:9",
            "  nearlimit rare-errors my-code.mtx --matrix parity",
            "            --decoder min-sum:word=5 --sets trapping-sets.txt --ebn0 5",
            "The file has one set a line: its positions counted from 0, separated by blanks.",
            "An estimate is a part of the frame error rate of this decoder and quantiser,",
            "never all of it: errors with other causes are not in it. Where errors can be",
            "counted, compare it with nearlimit simulate."
        })
public final class RareErrorsCommand implements Callable<Integer> {
    private static final double NANOSECONDS = 1e9;

    private final Session session;

    @Spec
    private CommandSpec spec;

    @Mixin
    private CodeArgument argument;

    @Option(
            names = "--decoder",
            paramLabel = "DECODER",
            required = true,
            description = "Decoder with settings, as in nearlimit simulate.")
    private String decoder;

    @Option(
            names = "--sets",
            paramLabel = "SETS",
            required = true,
            description = "lightest: all codewords of minimum weight; weight:W: all up to weight W; or the path of a"
                    + " file of sets.")
    private String sets;

    @Option(
            names = "--ebn0",
            paramLabel = "DB",
            required = true,
            converter = Ebn0List.Converter.class,
            description = "Eb/N0 in dB: a list 6,7,8 or a range start:step:end such as 6:0.5:8.")
    private Ebn0List ebn0;

    @Option(
            names = "--shifts",
            paramLabel = "LIST",
            defaultValue = "0.5,0.75,1",
            converter = ShiftList.Converter.class,
            description = "How far noise is moved towards a set, in signal amplitudes; 1 is the boundary of a codeword"
                    + " under maximum likelihood (default: ${DEFAULT-VALUE}).")
    private ShiftList shifts;

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
            description = "awgn, or awgn with the receiver's mistakes as in nearlimit simulate"
                    + " (default: ${DEFAULT-VALUE}).")
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
            defaultValue = "100000",
            description = "Biased frames a point (default: ${DEFAULT-VALUE}).")
    private long frames;

    @Option(
            names = "--time-limit",
            paramLabel = "TIME",
            converter = TimeLimit.Converter.class,
            description = "End after this time with what there is, marked incomplete: 90s, 5m, 2h.")
    private TimeLimit timeLimit;

    @Mixin
    private ThreadsOption threads;

    @Mixin
    private OutputOptions output;

    public RareErrorsCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        Modulation over = Modulation.of(modulation);
        int workers = threads.count();
        Code code = argument.code();
        Scheme scheme = new Scheme(code, choice.decoder(), over, choice.quantiser(), Channel.of(channel));
        ImportanceSampler sampler =
                new ImportanceSampler(scheme, new NoiseBias(new ErrorSetSource(sets).sets(code), shifts.values()));
        long start = System.nanoTime();
        List<RareErrorsReport.Entry> entries;
        try (Progress progress =
                Progress.start(session.terminal(), spec.commandLine().getErr(), "simulating")) {
            entries = estimate(sampler, workers, progress);
        }
        double elapsedS = (System.nanoTime() - start) / NANOSECONDS;
        output.show(new RareErrorsReport(
                sampler, sets, seed, frames, entries, ebn0.microDb().size(), workers, elapsedS));
        return session.interruption().requested() ? ExitCode.INTERRUPTED : ExitCode.OK;
    }

    private List<RareErrorsReport.Entry> estimate(ImportanceSampler sampler, int workers, Progress progress) {
        RunControl control = RunControl.none().withCancellation(session.interruption()::requested);
        if (timeLimit != null) {
            control = control.withTimeLimit(timeLimit.duration());
        }
        List<Long> points = ebn0.microDb();
        List<RareErrorsReport.Entry> entries = new ArrayList<>();
        for (int i = 0; i < points.size(); i++) {
            int index = i;
            Point point = new Point(OptionalLong.of(points.get(i)));
            RareErrorEstimate estimate = sampler.run(
                    point,
                    seed,
                    frames,
                    workers,
                    control.withProgress((done, errors) -> progress.at(
                            (index + (double) done / frames) / points.size(),
                            point + ", " + (index + 1) + " of " + points.size())));
            if (estimate.frames() > 0) {
                entries.add(new RareErrorsReport.Entry(point.ebn0Db(), estimate, sampler.unionBound(point)));
            }
            if (!estimate.complete()) {
                break;
            }
        }
        return entries;
    }
}
