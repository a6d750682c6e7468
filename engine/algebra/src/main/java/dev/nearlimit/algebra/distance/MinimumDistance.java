package dev.nearlimit.algebra.distance;

import java.util.OptionalInt;

/**
 * What is known of a minimum distance.
 *
 * @param value the minimum distance, where it is known
 * @param low it is at least this
 * @param high it is at most this; equal to {@code low} and {@code value} where that is known
 * @param status how {@code value} came about, or, where there is none, how {@code high} did
 * @param how the enumeration, theorem or search behind it, in words for the user
 */
public record MinimumDistance(OptionalInt value, int low, int high, Status status, String how) {

    /** How a distance came about. */
    public enum Status {
        /** It follows from an enumeration or a theorem that this program carried out or evaluated. */
        PROVEN,
        /** A word of this weight is at hand; lighter ones are not excluded. */
        FOUND,
        /** A theorem or table elsewhere says so. */
        PUBLISHED
    }

    public MinimumDistance {
        if (low < 1 || high < low) {
            throw new IllegalArgumentException("interval is " + low + " .. " + high + ", needs 1 <= low <= high");
        }
        if (value.isPresent() && (value.getAsInt() != low || low != high)) {
            throw new IllegalArgumentException(
                    "value is " + value.getAsInt() + " but the interval is " + low + " .. " + high);
        }
    }

    static MinimumDistance exactly(int value, Status status, String how) {
        return new MinimumDistance(OptionalInt.of(value), value, value, status, how);
    }
}
