package dev.nearlimit.decoders;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Optional;

/** What users can choose by one decoder name: its settings, and the codes that it fits. */
public interface DecoderFamily {
    /** The name before the colon, lower case. */
    String name();

    /** What it is, in a few words. */
    String title();

    /** The settings that it takes itself; those of the quantiser are not among them. */
    List<SettingHelp> settings();

    /** Whether it works on soft values, so that a quantiser may stand before it. */
    boolean soft();

    /**
     * Takes this decoder's settings.
     *
     * @param reader the settings given; those of the quantiser have been taken
     * @param quantiser the quantiser chosen
     * @throws InvalidDecoderException if a value is wrong or settings exclude each other
     */
    DecoderSettings read(SettingReader reader, Quantiser quantiser);

    /** Why this decoder does not fit a code, as a clause for users; empty if it fits. */
    Optional<String> objection(Code code);

    /** Whether this decoder can decode a code. */
    default boolean fits(Code code) {
        return objection(code).isEmpty();
    }
}
