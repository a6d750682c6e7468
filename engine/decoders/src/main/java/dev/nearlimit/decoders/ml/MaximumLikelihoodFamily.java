package dev.nearlimit.decoders.ml;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Optional;

/** {@code maximum-likelihood}. */
public final class MaximumLikelihoodFamily implements DecoderFamily {
    @Override
    public String name() {
        return MaximumLikelihoodSettings.NAME;
    }

    @Override
    public String title() {
        return "soft-decision maximum likelihood by correlation with every codeword";
    }

    @Override
    public List<SettingHelp> settings() {
        return List.of();
    }

    @Override
    public boolean soft() {
        return true;
    }

    @Override
    public DecoderSettings read(SettingReader reader, Quantiser quantiser) {
        return new MaximumLikelihoodSettings();
    }

    @Override
    public Optional<String> objection(Code code) {
        return MaximumLikelihoodSettings.objection(code);
    }
}
