package dev.nearlimit.decoders.catalogue;

import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.quantiser.NoQuantiser;
import dev.nearlimit.decoders.quantiser.QuantiserDesignator;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * Reads decoder designators: a name, and after a colon settings of the decoder and of the quantiser before it, in any
 * order, such as {@code min-sum:iterations=20,scale=6/8,word=6}.
 */
public final class DecoderDesignator {
    private DecoderDesignator() {}

    /**
     * Reads a designator of the standard catalogue; case does not matter.
     *
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder or a setting is unknown, a value is wrong
     *     or settings exclude each other; one line that says what is allowed
     */
    public static DecoderChoice parse(String designator) {
        DecoderFamily family = family(designator);
        SettingReader reader = reader(designator);
        Quantiser quantiser = family.soft() ? QuantiserDesignator.take(reader) : new NoQuantiser();
        DecoderChoice choice = new DecoderChoice(family.read(reader, quantiser), quantiser);
        reader.finish(names(family));
        return choice;
    }

    /**
     * Names of the settings that the decoder of a designator takes, those of the quantiser included.
     *
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder is unknown
     */
    public static List<String> settings(String designator) {
        return names(family(designator));
    }

    /**
     * Whether a designator gives a setting.
     *
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder is unknown or its settings are ill-formed
     */
    public static boolean gives(String designator, String setting) {
        return reader(designator).has(setting);
    }

    /** A designator with one setting more, unchecked until it is parsed. */
    public static String with(String designator, String setting, String value) {
        return designator + (designator.indexOf(':') < 0 ? ":" : ",") + setting + "=" + value;
    }

    private static DecoderFamily family(String designator) {
        String text = designator.trim().toLowerCase(Locale.ROOT);
        int colon = text.indexOf(':');
        return DecoderCatalogue.standard().family(colon < 0 ? text : text.substring(0, colon));
    }

    private static SettingReader reader(String designator) {
        String text = designator.trim().toLowerCase(Locale.ROOT);
        int colon = text.indexOf(':');
        return SettingReader.of(family(designator).name(), colon < 0 ? "" : text.substring(colon + 1));
    }

    private static List<String> names(DecoderFamily family) {
        List<SettingHelp> known = new ArrayList<>(family.settings());
        if (family.soft()) {
            known.addAll(QuantiserDesignator.settings());
        }
        return known.stream().map(SettingHelp::name).toList();
    }
}
