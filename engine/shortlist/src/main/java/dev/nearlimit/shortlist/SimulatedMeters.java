package dev.nearlimit.shortlist;

import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.search.ErrorRateMeter;
import java.util.OptionalLong;
import java.util.concurrent.atomic.AtomicLong;

/**
 * Counts errors by simulation on the AWGN channel. One simulation serves every modulation that puts one bit on a real
 * dimension, since these see the same noise.
 */
public final class SimulatedMeters implements MeterFactory {
    private final Simulator simulator;
    private final long seed;
    private final RunControl control;
    private final AtomicLong framesSimulated = new AtomicLong();

    /**
     * @param simulator runs the frames; its journal lets a search come back to a point
     * @param seed seed of every random number
     * @param control cancellation and progress of single points
     */
    public SimulatedMeters(Simulator simulator, long seed, RunControl control) {
        this.simulator = simulator;
        this.seed = seed;
        this.control = control;
    }

    long seed() {
        return seed;
    }

    /** Codewords counted so far. */
    long framesSimulated() {
        return framesSimulated.get();
    }

    @Override
    public ErrorRateMeter meter(Contender contender) {
        Scheme scheme = new Scheme(
                contender.fit().code(),
                contender.choice().decoder(),
                Modulation.BPSK,
                contender.choice().quantiser(),
                new Channel.Awgn());
        return (microDb, rule) -> {
            PointCounts counts = simulator.run(scheme, new Point(OptionalLong.of(microDb)), seed, rule, control);
            framesSimulated.addAndGet(counts.frames());
            return counts;
        };
    }
}
