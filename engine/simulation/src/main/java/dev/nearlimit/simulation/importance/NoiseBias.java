package dev.nearlimit.simulation.importance;

import dev.nearlimit.simulation.InvalidSimulationException;
import java.util.HashSet;
import java.util.List;

/**
 * What noise is biased towards: every set at every shift is one distribution, and all are drawn equally often. The noise
 * of a distribution has its mean moved on the set's positions by {@code shift} times the signal's amplitude, against the
 * signs that were sent, and is otherwise what it always is.
 *
 * <p>For a codeword's ones and maximum-likelihood decoding the shift is 1: it puts the mean midway between the sent word
 * and the wrong one, where errors are most likely (D. Lu, K. Yao, "Improved importance sampling technique for efficient
 * simulation of digital communication systems", IEEE JSAC 6, 1988). Where another decoder begins to fail is not known
 * beforehand, so that a few shifts side by side serve: each finds what the others rarely see, and the weights of the
 * mixture see to it that nothing is counted twice.
 *
 * @param sets at least one, at most {@value #MOST_SETS}, each once
 * @param shifts at least one, each above 0 and at most 2, the least of them at most 1
 */
public record NoiseBias(List<ErrorSet> sets, List<Double> shifts) {
    /** Most sets: every one is weighed for every frame. */
    public static final int MOST_SETS = 1 << 16;

    /** From half way to the boundary of the wrong codeword to the boundary itself. */
    public static final List<Double> DEFAULT_SHIFTS = List.of(0.5, 0.75, 1.0);

    private static final double MOST_SHIFT = 2;
    private static final int MOST_SHIFTS = 16;

    public NoiseBias {
        sets = List.copyOf(sets);
        shifts = List.copyOf(shifts);
        if (sets.isEmpty() || sets.size() > MOST_SETS) {
            throw new InvalidSimulationException("number of sets is " + sets.size() + ", must be 1 to " + MOST_SETS);
        }
        HashSet<ErrorSet> seen = new HashSet<>();
        for (ErrorSet set : sets) {
            if (!seen.add(set)) {
                throw new InvalidSimulationException("set " + set + " is given twice");
            }
        }
        if (shifts.isEmpty() || shifts.size() > MOST_SHIFTS) {
            throw new InvalidSimulationException(
                    "number of shifts is " + shifts.size() + ", must be 1 to " + MOST_SHIFTS);
        }
        for (double shift : shifts) {
            if (!(shift > 0 && shift <= MOST_SHIFT)) {
                throw new InvalidSimulationException(
                        "shift is " + shift + ", must be above 0 and at most " + (int) MOST_SHIFT);
            }
        }
        if (shifts.stream().noneMatch(shift -> shift <= 1)) {
            throw new InvalidSimulationException("shifts are " + shifts
                    + ", at least one must be 1 or less: errors half way to a set would get weights without bound");
        }
    }

    /** A bias towards sets with the usual shifts. */
    public static NoiseBias towards(List<ErrorSet> sets) {
        return new NoiseBias(sets, DEFAULT_SHIFTS);
    }

    /** The least weight of a set. */
    public int leastWeight() {
        return sets.stream().mapToInt(ErrorSet::weight).min().orElseThrow();
    }
}
