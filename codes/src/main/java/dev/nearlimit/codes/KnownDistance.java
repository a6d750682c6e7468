package dev.nearlimit.codes;

/**
 * A minimum distance that is known without a search, and from where.
 *
 * @param value the minimum distance, at least 1
 * @param source the theorem or table that says so
 */
public record KnownDistance(int value, String source) {
    public KnownDistance {
        if (value < 1) {
            throw new IllegalArgumentException("minimum distance is " + value + ", must be at least 1");
        }
    }
}
