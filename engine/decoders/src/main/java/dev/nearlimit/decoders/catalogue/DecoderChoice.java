package dev.nearlimit.decoders.catalogue;

import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;

/** What a decoder designator stands for: a decoder, and the quantiser before it. */
public record DecoderChoice(DecoderSettings decoder, Quantiser quantiser) {
    /** The designator with every default spelled out; reading it gives an equal choice. */
    public String designator() {
        if (quantiser.wordBits() == 0) {
            return decoder.designator();
        }
        String settings =
                quantiser.designator().substring(quantiser.designator().indexOf(':') + 1);
        return decoder.designator() + (decoder.designator().contains(":") ? "," : ":") + settings;
    }
}
