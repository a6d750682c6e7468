package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.setting.SettingReader;

/**
 * What min-sum does about its messages being too large (Chen, Dholakia, Eleftheriou, Fossorier and Hu 2005,
 * "Reduced-complexity decoding of LDPC codes").
 */
public sealed interface MagnitudeCorrection {
    /** The setting with which designators carry it. */
    String designator();

    /**
     * Normalised min-sum: magnitudes times j/8; in fixed point floor(j*m/8).
     *
     * @param eighths j, 1 .. 8; 8 leaves them alone
     */
    record Scale(int eighths) implements MagnitudeCorrection {
        public Scale {
            if (eighths < 1 || eighths > 8) {
                throw new InvalidDecoderException("scale is " + eighths + "/8, must be 1/8 .. 8/8");
            }
        }

        @Override
        public String designator() {
            return "scale=" + eighths + "/8";
        }
    }

    /**
     * Offset min-sum: magnitudes less an offset, not below 0.
     *
     * @param amount the offset, 0 .. 100: LLR units in floating point; in fixed point whole units of the quantiser's
     *     levels
     */
    record Offset(float amount) implements MagnitudeCorrection {
        static final float LARGEST = 100;

        public Offset {
            if (!(amount >= 0 && amount <= LARGEST)) {
                throw new InvalidDecoderException("offset is " + amount + ", must be 0 .. " + (int) LARGEST);
            }
        }

        @Override
        public String designator() {
            return "offset=" + SettingReader.plain(amount);
        }
    }
}
