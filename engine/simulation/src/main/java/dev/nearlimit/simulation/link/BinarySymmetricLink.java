package dev.nearlimit.simulation.link;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.numerics.noise.UniformDraws;
import java.math.BigDecimal;
import java.math.BigInteger;

/**
 * A binary symmetric channel of fixed crossover probability p: code bit i of a frame is flipped where draw i of its
 * noise stream, as an unsigned 64-bit number, is below floor(p 2^64). Every LLR is +-ln((1 - p)/p).
 */
public final class BinarySymmetricLink implements Link {
    private static final BigDecimal TWO_TO_64 = new BigDecimal(BigInteger.ONE.shiftLeft(64));

    private final UniformDraws draws;
    private final long threshold;
    private final float llr;
    private final long[] rows = new long[MOST_POSITIONS * FrameBatch.FRAMES];

    /**
     * A link of one crossover probability.
     *
     * @param draws the point's noise streams
     * @param p crossover probability, 0 &lt; p &lt; 0.5
     */
    public BinarySymmetricLink(UniformDraws draws, double p) {
        this.draws = draws;
        this.threshold = threshold(p);
        this.llr = HardDecisionLink.llrOfCrossover(p);
    }

    /** floor(p 2^64), exact because a double is a binary fraction. */
    static long threshold(double p) {
        return new BigDecimal(p).multiply(TWO_TO_64).toBigInteger().longValue();
    }

    @Override
    public void start(long firstFrame) {
        draws.start(firstFrame);
    }

    @Override
    public void carry(long[] codeword, int first, int count, float[] values, int at) {
        draws.next(rows, count);
        for (int p = 0; p < count; p++) {
            decide(codeword[first + p], p * FrameBatch.FRAMES, values, at + p * FrameBatch.FRAMES);
        }
    }

    private void decide(long bits, int row, float[] values, int at) {
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            boolean flipped = Long.compareUnsigned(rows[row + f], threshold) < 0;
            boolean one = ((bits >>> f) & 1L) != 0;
            values[at + f] = one == flipped ? llr : -llr;
        }
    }
}
