package dev.nearlimit.decoders.quantiser;

import dev.nearlimit.decoders.Quantiser;

/** Values pass in single precision; levels are left alone. */
public record NoQuantiser() implements Quantiser {
    @Override
    public String designator() {
        return "none";
    }

    @Override
    public int wordBits() {
        return 0;
    }

    @Override
    public void apply(float[] values, int at, int count, byte[] levels, int levelsAt) {
        // Nothing to do: the decoder sees the LLRs as they are.
    }
}
