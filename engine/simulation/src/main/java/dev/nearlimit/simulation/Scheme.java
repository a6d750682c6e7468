package dev.nearlimit.simulation;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.limits.Modulation;

/** What a product would ship, and the channel that it is tried on. */
public record Scheme(Code code, DecoderSettings decoder, Modulation modulation, Quantiser quantiser, Channel channel) {
    /** Signal-to-noise ratio per real dimension, E_s/N_0 in one dimension over 1: R * Eb/N0, linear. */
    public double energyPerDimensionOverN0(double ebn0Db) {
        return code.rate().value() * Math.pow(10, ebn0Db / 10);
    }
}
