package dev.nearlimit.decoders.ldpc;

/** In which order messages are exchanged. */
public enum Schedule {
    /**
     * Rows of the parity-check matrix one after the other in their order, each working on the posteriors that the rows
     * before it left behind (Hocevar 2004, "A reduced complexity decoder architecture via layered decoding of LDPC
     * codes").
     */
    LAYERED("layered"),
    /** All rows work on the posteriors of the previous iteration (Gallager 1962). */
    FLOODING("flooding");

    private final String designator;

    Schedule(String designator) {
        this.designator = designator;
    }

    /** As in designators. */
    @Override
    public String toString() {
        return designator;
    }
}
