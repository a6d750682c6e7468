package dev.nearlimit.simulation.importance;

import dev.nearlimit.limits.GaussianTail;
import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;

/**
 * Estimates the part of a scheme's frame error rate on AWGN that is due to given sets of positions, by importance
 * sampling: noise is biased towards the sets, and every frame that counts is weighted with the ratio of the densities of
 * true and biased noise, so that the estimate's mean is the probability under true noise.
 *
 * <p><b>What counts.</b> A frame counts if all of this holds:
 *
 * <ul>
 *   <li>it is a frame error: a wrong information bit, or a failure that the decoder declares;
 *   <li>for one of the sets at least, more than half of its positions are wrong in the word that the decoder decided for.
 *       In a linear code no other word of the minimum weight d has more than d/2 positions in common with a word of
 *       weight d, so errors towards one of them are not put down to another;
 *   <li>towards the same set the noise leans at least half way: it moved the mean amplitude of the set's positions, +1 if
 *       nothing were received but the signal, to 1/2 or less. Maximum-likelihood decoding of unquantised values takes the
 *       set's word for the sent one only where that mean is 0 or less.
 * </ul>
 *
 * <p>So the estimate is a part of the frame error rate and never exceeds it, but for chance. With the words of a code as
 * sets, all of them, and maximum-likelihood decoding of unquantised values it is the frame error rate; with the words of
 * least weight it tends to it as Eb/N0 grows.
 *
 * <p><b>Where it misleads.</b> Errors that count but need noise that none of the biased distributions draws often, such
 * as those towards heavier words that contain most of a set, are met by few frames of large weight. The interval is
 * honest only as far as the frames seen represent them: look at the effective sample size and at the largest share. At
 * an Eb/N0 where plain simulation is feasible, compare the two.
 *
 * <p>Results are a pure function of scheme, sets, shifts, point, seed and number of frames.
 */
public final class ImportanceSampler {
    private final Scheme scheme;
    private final NoiseBias bias;

    /**
     * A sampler for one scheme.
     *
     * @throws InvalidSimulationException if the channel is not AWGN with soft values, or a set has a position beyond the
     *     code's length
     */
    public ImportanceSampler(Scheme scheme, NoiseBias bias) {
        BiasedPoint.requireAwgn(scheme);
        for (ErrorSet set : bias.sets()) {
            if (set.highest() >= scheme.code().n()) {
                throw new InvalidSimulationException(
                        "position " + set.highest() + " is in a set, the code's positions are 0 to "
                                + (scheme.code().n() - 1));
            }
        }
        this.scheme = scheme;
        this.bias = bias;
    }

    /**
     * Simulates biased frames at a point.
     *
     * @param seed the user's seed
     * @param frames biased frames to simulate, at least 1
     * @param threads threads to use, at least 1; the result does not depend on it
     * @param control how the run is watched and ended early; told the frames and the errors that count, unweighted
     * @return the estimate; after an early end that of the frames up to then, marked incomplete
     * @throws InvalidSimulationException if a value is out of range
     * @throws dev.nearlimit.decoders.InvalidDecoderException if the decoder does not fit the code or the quantiser
     */
    public RareErrorEstimate run(Point point, long seed, long frames, int threads, RunControl control) {
        if (frames < 1) {
            throw new InvalidSimulationException("frames is " + frames + ", must be at least 1");
        }
        if (threads < 1) {
            throw new InvalidSimulationException("threads is " + threads + ", must be at least 1");
        }
        BiasedPoint biased = BiasedPoint.of(scheme, bias, point, seed);
        BiasedRun run = new BiasedRun(
                () -> new BiasedFrameWorker(scheme, bias.sets(), new BiasMixture(bias, biased.sigma()), biased),
                frames,
                control);
        WeightTally tally = run.onThreads(threads);
        double largest = new BiasMixture(bias, biased.sigma()).largestWeightHalfWay();
        return RareErrorEstimate.of(tally, largest, tally.frames() == frames);
    }

    /**
     * The union bound over the sets for maximum-likelihood decoding of unquantised values, the sum of Q(sqrt(2 R w
     * Eb/N0)) over their weights w: what the sets would cause there at most, if they are codewords' ones.
     */
    public double unionBound(Point point) {
        double energy = scheme.energyPerDimensionOverN0(point.ebn0Db());
        return bias.sets().stream()
                .mapToDouble(set -> GaussianTail.q(Math.sqrt(2 * set.weight() * energy)))
                .sum();
    }

    /** How many of the sets are the ones of a codeword; the others are trapping sets or the like. */
    public int codewords() {
        return (int) bias.sets().stream()
                .filter(set -> set.isCodeword(scheme.code().parityCheck()))
                .count();
    }

    public Scheme scheme() {
        return scheme;
    }

    public NoiseBias bias() {
        return bias;
    }
}
