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
        String text = designator.trim().toLowerCase(Locale.ROOT);
        int colon = text.indexOf(':');
        DecoderFamily family = DecoderCatalogue.standard().family(colon < 0 ? text : text.substring(0, colon));
        SettingReader reader = SettingReader.of(family.name(), colon < 0 ? "" : text.substring(colon + 1));
        List<SettingHelp> known = new ArrayList<>(family.settings());
        Quantiser quantiser = new NoQuantiser();
        if (family.soft()) {
            known.addAll(QuantiserDesignator.settings());
            quantiser = QuantiserDesignator.take(reader);
        }
        DecoderChoice choice = new DecoderChoice(family.read(reader, quantiser), quantiser);
        reader.finish(known.stream().map(SettingHelp::name).toList());
        return choice;
    }
}
