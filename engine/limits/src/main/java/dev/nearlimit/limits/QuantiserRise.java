package dev.nearlimit.limits;

import java.util.Arrays;
import java.util.Locale;
import java.util.stream.Collectors;

/** Where a uniform quantiser has its levels. */
public enum QuantiserRise {
    /** A level at 0: 2^b - 1 levels, from -(2^(b-1)-1) to 2^(b-1)-1 steps. */
    MID_TREAD("mid-tread", 2, 8),
    /** A threshold at 0: 2^b levels at odd multiples of half a step; with b = 1 the sign. */
    MID_RISE("mid-rise", 1, 7);

    private final String designator;
    private final int leastBits;
    private final int mostBits;

    QuantiserRise(String designator, int leastBits, int mostBits) {
        this.designator = designator;
        this.leastBits = leastBits;
        this.mostBits = mostBits;
    }

    /**
     * Finds a rise by its designator.
     *
     * @throws InvalidLimitException if there is none
     */
    public static QuantiserRise of(String designator) {
        String wanted = designator.trim().toLowerCase(Locale.ROOT);
        return Arrays.stream(values())
                .filter(rise -> rise.designator.equals(wanted))
                .findFirst()
                .orElseThrow(() -> new InvalidLimitException("unknown rise '" + designator + "'; known are "
                        + Arrays.stream(values()).map(QuantiserRise::designator).collect(Collectors.joining(", "))));
    }

    /** As in designators: {@code mid-tread} or {@code mid-rise}. */
    public String designator() {
        return designator;
    }

    /** The fewest bits of a word of this kind. */
    int leastBits() {
        return leastBits;
    }

    /** The most bits of a word: what a scheme's quantiser can have, so that each limit is one of a scheme that can be. */
    int mostBits() {
        return mostBits;
    }
}
