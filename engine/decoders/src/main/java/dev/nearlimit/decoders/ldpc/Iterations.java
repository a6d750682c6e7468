package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;

/**
 * How an iterative decoder goes on and when it stops.
 *
 * @param most iterations at most, 1 .. 1000
 * @param schedule order of the messages
 * @param earlyStop whether a frame stops, and is frozen, once its hard decisions satisfy every check; looked at before
 *     the first iteration and after each
 */
public record Iterations(int most, Schedule schedule, boolean earlyStop) {
    static final int LARGEST = 1000;
    private static final int STANDARD = 20;

    public Iterations {
        if (most < 1 || most > LARGEST) {
            throw new InvalidDecoderException("iterations is " + most + ", must be 1.." + LARGEST);
        }
    }

    /** Layered, stopping early. */
    public static Iterations atMost(int most) {
        return new Iterations(most, Schedule.LAYERED, true);
    }

    static Iterations take(SettingReader reader) {
        return new Iterations(
                reader.whole("iterations", 1, LARGEST).orElse(STANDARD),
                reader.word("schedule", List.of(Schedule.values())).orElse(Schedule.LAYERED),
                reader.flag("early-stop").orElse(true));
    }

    static List<SettingHelp> settings() {
        return List.of(
                new SettingHelp("iterations", "1.." + LARGEST, Integer.toString(STANDARD), "iterations at most"),
                new SettingHelp("schedule", "layered|flooding", "layered", "order of the messages"),
                new SettingHelp("early-stop", "true|false", "true", "a frame stops when every check is satisfied"));
    }

    String designator() {
        return "iterations=" + most + ",schedule=" + schedule + ",early-stop=" + earlyStop;
    }
}
