package dev.nearlimit.simulation;

import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.noise.UniformDraws;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import dev.nearlimit.simulation.link.BinarySymmetricLink;
import dev.nearlimit.simulation.link.GaussianLink;
import dev.nearlimit.simulation.link.HardDecisionLink;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;

/**
 * Payload and link of one scheme at one point. The number by which streams tell points apart is Eb/N0 in micro-dB, or
 * the bits of a fixed crossover probability as a double; so schemes at the same Eb/N0 and seed meet the same noise.
 */
final class PointStreams {
    private final Scheme scheme;
    private final Point point;
    private final long seed;

    /**
     * Streams of a scheme at a point.
     *
     * @throws InvalidSimulationException if the channel takes an Eb/N0 and the point has none, or the other way round
     */
    PointStreams(Scheme scheme, Point point, long seed) {
        if (scheme.channel().hasEbn0() != point.ebn0MicroDb().isPresent()) {
            throw new InvalidSimulationException(
                    scheme.channel().hasEbn0()
                            ? "channel " + scheme.channel().designator() + " needs an Eb/N0, the point has none"
                            : "channel " + scheme.channel().designator() + " has a fixed parameter, Eb/N0 " + point
                                    + " means nothing to it");
        }
        this.scheme = scheme;
        this.point = point;
        this.seed = seed;
    }

    Payload newPayload() {
        return new Payload(new UniformDraws(streams(Stream.PAYLOAD)));
    }

    Link newLink() {
        Channel channel = scheme.channel();
        if (channel instanceof Channel.BinarySymmetric fixed) {
            return new BinarySymmetricLink(new UniformDraws(streams(Stream.NOISE)), fixed.p());
        }
        GaussianNoise noise = new GaussianNoise(streams(Stream.NOISE));
        double energy = scheme.energyPerDimensionOverN0(point.ebn0Db());
        return channel instanceof Channel.Awgn soft
                ? new GaussianLink(noise, energy, soft.mismatch().llrFactor())
                : new HardDecisionLink(noise, energy);
    }

    private FrameStreams streams(Stream stream) {
        long number = scheme.channel() instanceof Channel.BinarySymmetric fixed
                ? Double.doubleToLongBits(fixed.p())
                : point.ebn0MicroDb().getAsLong();
        return new FrameStreams(seed, number, stream);
    }
}
