package dev.nearlimit.simulation.importance;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.simulation.InvalidSimulationException;
import java.util.Arrays;

/**
 * Positions of the codeword whose noise together may make a decoder fail: the ones of a codeword of low weight, or a
 * trapping set. Immutable.
 */
public final class ErrorSet {
    private final int[] positions;

    private ErrorSet(int[] positions) {
        this.positions = positions;
    }

    /**
     * A set of positions in any order.
     *
     * @param positions counted from 0, each once, at least one
     * @throws InvalidSimulationException if there is none, one is negative or one comes twice
     */
    public static ErrorSet of(int... positions) {
        if (positions.length == 0) {
            throw new InvalidSimulationException("a set of positions is empty, needs at least one");
        }
        int[] ascending = positions.clone();
        Arrays.sort(ascending);
        if (ascending[0] < 0) {
            throw new InvalidSimulationException("position is " + ascending[0] + ", must be at least 0");
        }
        for (int i = 1; i < ascending.length; i++) {
            if (ascending[i] == ascending[i - 1]) {
                throw new InvalidSimulationException("position " + ascending[i] + " is twice in a set");
            }
        }
        return new ErrorSet(ascending);
    }

    /** Number of positions. */
    public int weight() {
        return positions.length;
    }

    /** The position of that number, in ascending order. */
    public int position(int number) {
        return positions[number];
    }

    /** The last position. */
    public int highest() {
        return positions[positions.length - 1];
    }

    /** Whether the set is what a codeword's ones are: every check covers an even number of its positions. */
    public boolean isCodeword(SparseBitMatrix parityCheck) {
        long[] word = new long[parityCheck.columns()];
        for (int position : positions) {
            word[position] = 1;
        }
        return parityCheck.unsatisfiedLanes(word) == 0;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof ErrorSet that && Arrays.equals(positions, that.positions);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(positions);
    }

    @Override
    public String toString() {
        return Arrays.toString(positions);
    }
}
