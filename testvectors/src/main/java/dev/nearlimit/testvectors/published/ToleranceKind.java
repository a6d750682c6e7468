package dev.nearlimit.testvectors.published;

/** What a tolerance is measured against. */
public enum ToleranceKind {
    /** The greatest difference, in the unit of the value. */
    ABSOLUTE("absolute"),
    /** The greatest difference over the size of the published value. */
    RELATIVE("relative"),
    /** No difference at all; the tolerance is 0. */
    EXACT("exact");

    private final String label;

    ToleranceKind(String label) {
        this.label = label;
    }

    /** As the files spell it. */
    public String label() {
        return label;
    }
}
