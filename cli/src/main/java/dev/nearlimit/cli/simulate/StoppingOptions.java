package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.TimeLimit;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.statistics.RelativeWidth;
import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Option;

/** The options that say when a point is finished. */
final class StoppingOptions {
    private static final long USUAL_FRAME_ERRORS = 100;

    @Option(
            names = "--frames",
            paramLabel = "N",
            defaultValue = "1000000",
            description = "Frames a point at most; there is always such a limit, so that a point without errors ends,"
                    + " too (default: ${DEFAULT-VALUE}).")
    private long frames;

    @Option(
            names = "--frame-errors",
            paramLabel = "N",
            description = "Frame errors after which a point is finished (default: " + USUAL_FRAME_ERRORS
                    + ", or what --relative-width takes).")
    private Long frameErrors;

    @Option(
            names = "--relative-width",
            paramLabel = "W",
            description = "Finish a point when the 95 %% interval is at most W times the FER wide, 0.001 to 4. This is"
                    + " turned into frame errors beforehand (0.2 takes 384), so that the interval stays exact. Of all"
                    + " these limits the first that is reached counts.")
    private Double relativeWidth;

    @Option(
            names = "--time-limit",
            paramLabel = "TIME",
            converter = TimeLimit.Converter.class,
            description = "End after this time with what was counted, marked incomplete: 90s, 5m, 2h. The one limit"
                    + " that another run does not reproduce.")
    private TimeLimit timeLimit;

    /**
     * What was asked for.
     *
     * @throws InputException if a point could never get there
     */
    StoppingChoice choice() {
        if (relativeWidth == null) {
            StoppingRule rule = new StoppingRule(frames, frameErrors == null ? USUAL_FRAME_ERRORS : frameErrors);
            return new StoppingChoice(rule, OptionalDouble.empty(), Optional.ofNullable(timeLimit));
        }
        long needed = RelativeWidth.frameErrors(relativeWidth);
        StoppingRule rule = new StoppingRule(frames, frameErrors == null ? needed : Math.min(needed, frameErrors));
        if (needed > frames) {
            throw new InputException("--relative-width " + Numbers.exact(relativeWidth) + " takes " + needed
                    + " frame errors, which --frames " + frames + " can never give");
        }
        return new StoppingChoice(
                rule,
                rule.frameErrors() == needed ? OptionalDouble.of(relativeWidth) : OptionalDouble.empty(),
                Optional.ofNullable(timeLimit));
    }
}
