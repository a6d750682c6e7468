package dev.nearlimit.testvectors.published;

/** Where a value can be checked. */
public enum Reach {
    /** Through the API and through the public command of its row. */
    COMMAND("command"),
    /** Through the API alone: no public command prints this quantity. */
    API("api");

    private final String label;

    Reach(String label) {
        this.label = label;
    }

    /** As the files spell it. */
    public String label() {
        return label;
    }
}
