package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Optional;

/** {@code syndrome}. */
public final class SyndromeFamily implements DecoderFamily {
    @Override
    public String name() {
        return SyndromeSettings.NAME;
    }

    @Override
    public String title() {
        return "complete hard-decision decoding by coset leaders";
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
        return new SyndromeSettings();
    }

    @Override
    public Optional<String> objection(Code code) {
        return CosetLeaders.objection(code);
    }
}
