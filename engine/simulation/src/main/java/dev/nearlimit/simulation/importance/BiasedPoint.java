package dev.nearlimit.simulation.importance;

import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.Scheme;

/**
 * What a point fixes.
 *
 * @param sigma standard deviation of the noise where the signal is +-1
 * @param llrOfUnit LLR of a received value of 1
 */
record BiasedPoint(long seed, long ebn0MicroDb, float sigma, float llrOfUnit) {
    /** Weights go down to about exp(-w / (2 sigma^2)), and their squares must not underflow. */
    private static final double LARGEST_EXPONENT = 300;

    /**
     * The point of a scheme.
     *
     * @throws InvalidSimulationException if the channel is not AWGN, the point has no Eb/N0, or so much that the error
     *     rate is beyond a double's range
     */
    static BiasedPoint of(Scheme scheme, NoiseBias bias, Point point, long seed) {
        Channel.Awgn channel = requireAwgn(scheme);
        if (point.ebn0MicroDb().isEmpty()) {
            throw new InvalidSimulationException("importance sampling needs an Eb/N0, the point has none");
        }
        double energy = scheme.energyPerDimensionOverN0(point.ebn0Db());
        if (bias.leastWeight() * energy > LARGEST_EXPONENT) {
            throw new InvalidSimulationException("at Eb/N0 " + point + " sets of weight " + bias.leastWeight()
                    + " cause errors at rates below 1e-130; importance sampling ends there");
        }
        return new BiasedPoint(seed, point.ebn0MicroDb().getAsLong(), (float) Math.sqrt(1 / (2 * energy)), (float)
                (4 * energy * channel.mismatch().llrFactor()));
    }

    /** The scheme's channel, which must be AWGN with soft values. */
    static Channel.Awgn requireAwgn(Scheme scheme) {
        if (scheme.channel() instanceof Channel.Awgn awgn) {
            return awgn;
        }
        throw new InvalidSimulationException("channel is " + scheme.channel().designator()
                + ", importance sampling is for awgn (on which hard-decision decoders see signs alone)");
    }
}
