package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Optional;

/** {@code sum-product}. */
public final class SumProductFamily implements DecoderFamily {
    @Override
    public String name() {
        return SumProductSettings.NAME;
    }

    @Override
    public String title() {
        return "belief propagation with the box-plus check rule, single precision";
    }

    @Override
    public List<SettingHelp> settings() {
        return Iterations.settings();
    }

    @Override
    public boolean soft() {
        return true;
    }

    @Override
    public DecoderSettings read(SettingReader reader, Quantiser quantiser) {
        return new SumProductSettings(Iterations.take(reader));
    }

    @Override
    public Optional<String> objection(Code code) {
        return MessageMemory.objection(code);
    }
}
