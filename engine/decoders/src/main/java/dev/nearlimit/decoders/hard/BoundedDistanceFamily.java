package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Optional;

/** {@code bounded-distance}. */
public final class BoundedDistanceFamily implements DecoderFamily {
    @Override
    public String name() {
        return BoundedDistanceSettings.NAME;
    }

    @Override
    public String title() {
        return "hard-decision decoding of t errors, by Berlekamp-Massey or by table";
    }

    @Override
    public List<SettingHelp> settings() {
        return List.of();
    }

    @Override
    public boolean soft() {
        return false;
    }

    @Override
    public DecoderSettings read(SettingReader reader, Quantiser quantiser) {
        return new BoundedDistanceSettings();
    }

    @Override
    public Optional<String> objection(Code code) {
        return BoundedDistanceSettings.objection(code);
    }
}
