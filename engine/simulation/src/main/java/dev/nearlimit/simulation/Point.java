package dev.nearlimit.simulation;

import java.util.OptionalLong;

/**
 * Where error rates are measured: one Eb/N0, kept as an integer number of micro-dB so that equal points are equal, or
 * the one point of a channel whose parameter is fixed.
 *
 * @param ebn0MicroDb Eb/N0 in millionths of a dB, -100 .. 100 dB; empty where the channel's own parameter is all
 */
public record Point(OptionalLong ebn0MicroDb) {
    private static final long MICRO = 1_000_000;
    private static final long LARGEST_DB = 100;

    public Point {
        if (ebn0MicroDb.isPresent() && Math.abs(ebn0MicroDb.getAsLong()) > LARGEST_DB * MICRO) {
            throw outOfRange(ebn0MicroDb.getAsLong() / (double) MICRO);
        }
    }

    /**
     * The point at an Eb/N0, rounded to the nearest micro-dB.
     *
     * @throws InvalidSimulationException if it is no number or outside -100 .. 100 dB
     */
    public static Point ofEbn0Db(double ebn0Db) {
        if (!(Math.abs(ebn0Db) <= LARGEST_DB)) {
            throw outOfRange(ebn0Db);
        }
        return new Point(OptionalLong.of(Math.round(ebn0Db * MICRO)));
    }

    /** The point of a channel without Eb/N0. */
    public static Point ofFixedParameter() {
        return new Point(OptionalLong.empty());
    }

    /**
     * Eb/N0 in dB.
     *
     * @throws IllegalStateException if this point has none
     */
    public double ebn0Db() {
        return ebn0MicroDb.orElseThrow(() -> new IllegalStateException("point has no Eb/N0")) / (double) MICRO;
    }

    private static InvalidSimulationException outOfRange(double ebn0Db) {
        return new InvalidSimulationException(
                "Eb/N0 is " + ebn0Db + " dB, must be a number from -" + LARGEST_DB + " to " + LARGEST_DB);
    }

    /** As {@code 2.5 dB}, or {@code fixed}. */
    @Override
    public String toString() {
        return ebn0MicroDb.isPresent() ? ebn0Db() + " dB" : "fixed";
    }
}
