package dev.nearlimit.cli.simulate;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Scheme;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Every combination of the values of one or two swept settings.
 *
 * @param settings names of the swept settings
 * @param combinations the last setting running fastest
 */
record SweepGrid(List<String> settings, List<Combination> combinations) {
    private static final int MOST_SWEEPS = 2;
    private static final int MOST_COMBINATIONS = 1000;

    /**
     * The grid over a decoder and a channel. Every combination is tried on the code, so that none is refused after hours.
     *
     * @param decoder designator, without the swept settings
     * @param channel designator, without the swept settings
     * @throws InputException if there are too many sweeps or combinations, or a setting is unknown or fixed as well
     * @throws dev.nearlimit.decoders.InvalidDecoderException if a combination is impossible
     */
    static SweepGrid of(List<Sweep> sweeps, Code code, String decoder, Modulation modulation, String channel) {
        if (sweeps.size() > MOST_SWEEPS) {
            throw new InputException(
                    "--sweep is given " + sweeps.size() + " times; at most " + MOST_SWEEPS + " settings can be swept");
        }
        List<String> settings = sweeps.stream().map(Sweep::setting).toList();
        if (settings.stream().distinct().count() < settings.size()) {
            throw new InputException(settings.get(0) + " is swept twice");
        }
        settings.forEach(setting -> check(setting, decoder, channel));
        int size = sweeps.stream().mapToInt(sweep -> sweep.values().size()).reduce(1, Math::multiplyExact);
        if (size > MOST_COMBINATIONS) {
            throw new InputException("the sweeps have " + size + " combinations, more than " + MOST_COMBINATIONS
                    + "; sweep fewer values");
        }
        List<Combination> combinations = new ArrayList<>();
        for (int number = 0; number < size; number++) {
            combinations.add(combination(sweeps, number, code, decoder, modulation, channel));
        }
        return new SweepGrid(settings, List.copyOf(combinations));
    }

    /** How many values the last setting takes. */
    int valuesOfLast() {
        return (int) combinations.stream()
                .map(combination -> combination.values().get(settings.size() - 1))
                .distinct()
                .count();
    }

    private static void check(String setting, String decoder, String channel) {
        List<String> ofDecoder = DecoderDesignator.settings(decoder);
        List<String> ofChannel = Channel.settings(channel);
        if (ofDecoder.contains(setting)) {
            if (DecoderDesignator.gives(decoder, setting)) {
                throw new InputException(setting + " is fixed in --decoder and swept as well");
            }
        } else if (ofChannel.contains(setting)) {
            // Names of a channel's settings are no part of each other.
            if (channel.toLowerCase(Locale.ROOT).contains(setting + "=")) {
                throw new InputException(setting + " is fixed in --channel and swept as well");
            }
        } else {
            throw new InputException("unknown setting '" + setting + "' in --sweep; the decoder takes "
                    + (ofDecoder.isEmpty() ? "none" : String.join(", ", ofDecoder)) + ", the channel "
                    + (ofChannel.isEmpty() ? "none" : String.join(", ", ofChannel)));
        }
    }

    private static Combination combination(
            List<Sweep> sweeps, int number, Code code, String decoder, Modulation modulation, String channel) {
        List<String> values = new ArrayList<>();
        int rest = number;
        for (int s = sweeps.size() - 1; s >= 0; s--) {
            List<String> ofSetting = sweeps.get(s).values();
            values.add(0, ofSetting.get(rest % ofSetting.size()));
            rest /= ofSetting.size();
        }
        String decoderHere = decoder;
        String channelHere = channel;
        for (int s = 0; s < sweeps.size(); s++) {
            String setting = sweeps.get(s).setting();
            if (DecoderDesignator.settings(decoder).contains(setting)) {
                decoderHere = DecoderDesignator.with(decoderHere, setting, values.get(s));
            } else {
                channelHere += (channelHere.contains(":") ? "," : ":") + setting + "=" + values.get(s);
            }
        }
        DecoderChoice choice = DecoderDesignator.parse(decoderHere);
        choice.decoder().newDecoder(code, choice.quantiser());
        Scheme scheme = new Scheme(code, choice.decoder(), modulation, choice.quantiser(), Channel.of(channelHere));
        return new Combination(List.copyOf(values), scheme);
    }
}
