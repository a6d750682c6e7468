package dev.nearlimit.simulation;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.Quantiser;
import dev.nearlimit.limits.Modulation;

/** What a product would ship, and the channel that it is tried on. */
public record Scheme(Code code, DecoderSettings decoder, Modulation modulation, Quantiser quantiser, Channel channel) {
    /**
     * Energy of a real dimension over N0, linear: R * Eb/N0. StrictMath, because it enters every received value and must
     * be the same on every machine.
     */
    public double energyPerDimensionOverN0(double ebn0Db) {
        return code.rate().value() * StrictMath.pow(10, ebn0Db / 10);
    }
}
