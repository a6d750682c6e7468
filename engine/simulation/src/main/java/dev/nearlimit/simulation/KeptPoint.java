package dev.nearlimit.simulation;

/**
 * Counts what a journal keeps of a point. Blocks come in ascending order; those behind a gap, which a killed run may
 * leave, are not counted, since frames are counted in frame order only.
 */
public final class KeptPoint {
    private final PrefixCounter counter = new PrefixCounter(new StoppingRule(Long.MAX_VALUE, Long.MAX_VALUE));
    private long next;

    /**
     * Takes the next block.
     *
     * @param content the piece as the journal gives it
     * @param number the block's number
     * @throws InvalidSimulationException if the piece is no block
     */
    public void add(byte[] content, long number) {
        if (number == next) {
            counter.add(Block.fromBytes(content));
            next++;
        }
    }

    /** Counts of all frames up to the first gap; no stopping rule was applied, so they are never complete. */
    public PointCounts counts() {
        return counter.counts();
    }
}
