package dev.nearlimit.decoders.quantiser;

import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.decoders.setting.SettingHelp;
import dev.nearlimit.decoders.setting.SettingReader;
import java.util.List;
import java.util.Locale;

/** Reads quantisers: their own designators, and their settings among those of a decoder. */
public final class QuantiserDesignator {
    /** Beyond any LLR that a receiver computes; larger numbers are typing errors. */
    private static final float MOST_LLR = 1e4f;

    private QuantiserDesignator() {}

    /**
     * Reads {@code none} or {@code uniform:word=6,step=0.25,rise=mid-tread}.
     *
     * @throws InvalidDecoderException if it names no quantiser
     */
    public static Quantiser parse(String designator) {
        String text = designator.trim().toLowerCase(Locale.ROOT);
        if (text.equals("none")) {
            return new NoQuantiser();
        }
        if (!text.startsWith("uniform:")) {
            throw new InvalidDecoderException(
                    "unknown quantiser '" + designator + "'; known are none, uniform:word=b,step=s,rise=r");
        }
        SettingReader reader = SettingReader.of("uniform quantiser", text.substring("uniform:".length()));
        if (!reader.has("word")) {
            throw new InvalidDecoderException("quantiser '" + designator + "' lacks word=");
        }
        Quantiser quantiser = take(reader);
        reader.finish(settings().stream().map(SettingHelp::name).toList());
        return quantiser;
    }

    /** Takes the settings of a quantiser; {@code none} if there is no {@code word}. */
    public static Quantiser take(SettingReader reader) {
        reader.refuseTogether("clip", "step");
        if (!reader.has("word")) {
            for (SettingHelp setting : settings()) {
                if (reader.has(setting.name())) {
                    throw new InvalidDecoderException(
                            setting.name() + " needs word=, the bits of the quantised LLR, beside it");
                }
            }
            return new NoQuantiser();
        }
        int word = reader.whole("word", 1, 8).orElseThrow();
        Rise rise = reader.word("rise", List.of(Rise.values())).orElse(Rise.MID_TREAD);
        Float clip = reader.positive("clip", MOST_LLR).orElse(null);
        Float step = reader.positive("step", MOST_LLR).orElse(null);
        if (clip != null) {
            return UniformQuantiser.ofClip(word, clip, rise);
        }
        return new UniformQuantiser(word, step != null ? step : UniformQuantiser.standardStep(word), rise);
    }

    /** Help on the settings. */
    public static List<SettingHelp> settings() {
        return List.of(
                new SettingHelp("word", "1..8", "none", "bits of the quantised LLR; 1 needs rise=mid-rise"),
                new SettingHelp("step", "number", "16/2^word", "distance of neighbouring levels [LLR units]"),
                new SettingHelp("clip", "number", "from step", "value of the outermost level [LLR units]"),
                new SettingHelp("rise", "mid-tread|mid-rise", "mid-tread", "whether 0 is a level or a threshold"));
    }
}
