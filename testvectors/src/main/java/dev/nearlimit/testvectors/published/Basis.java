package dev.nearlimit.testvectors.published;

/** How a published value was obtained. */
public enum Basis {
    /** Seen in print; the source says where. */
    READ("read", true),
    /** Calculated apart from this project's code, from the definition in the source. */
    COMPUTED("computed", true),
    /** A fact of the trade that any textbook has. */
    COMMON_PRACTICE("common practice", true),
    /** Known but not seen: a plausibility check, never a gate. */
    MEMORY("memory", false);

    private final String label;
    private final boolean gate;

    Basis(String label, boolean gate) {
        this.label = label;
        this.gate = gate;
    }

    /** As the files spell it. */
    public String label() {
        return label;
    }

    /** Whether disagreement with such a value is a failure; otherwise it is only reported. */
    public boolean isGate() {
        return gate;
    }
}
