package dev.nearlimit.simulation.importance;

/**
 * What was counted of a stretch of frames: the weights of those that count as errors of the sets.
 *
 * @param frames frames seen
 * @param errors frames that count
 * @param sum of their weights
 * @param squares sum of the squares of their weights
 * @param largest of their weights; 0 where there is none
 */
record WeightTally(long frames, long errors, double sum, double squares, double largest) {
    static final WeightTally NONE = new WeightTally(0, 0, 0, 0, 0);

    WeightTally withError(double weight) {
        return new WeightTally(frames, errors + 1, sum + weight, squares + weight * weight, Math.max(largest, weight));
    }

    WeightTally withFrames(long more) {
        return new WeightTally(frames + more, errors, sum, squares, largest);
    }

    /** Both stretches, this one first: sums depend on the order of their terms. */
    WeightTally then(WeightTally next) {
        return new WeightTally(
                frames + next.frames,
                errors + next.errors,
                sum + next.sum,
                squares + next.squares,
                Math.max(largest, next.largest));
    }
}
