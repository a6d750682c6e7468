package dev.nearlimit.algebra.errorrate;

import java.util.Locale;

/** What an error rate that comes from a formula is worth. */
public enum Basis {
    /** The error rate itself. */
    EXACT,
    /** The error rate is at most this. */
    BOUND,
    /** Near the error rate, on neither side for certain. */
    ESTIMATED;

    /** As reports write it: {@code exact}, {@code bound}, {@code estimated}. */
    public String label() {
        return name().toLowerCase(Locale.ROOT);
    }
}
