package dev.nearlimit.decoders.quantiser;

/** Where a uniform quantiser has its levels. */
public enum Rise {
    /** A level at 0: 2^b - 1 levels, from -(2^(b-1)-1) to 2^(b-1)-1 steps. */
    MID_TREAD("mid-tread"),
    /** A threshold at 0: 2^b levels at odd multiples of half a step; with b = 1 the sign. */
    MID_RISE("mid-rise");

    private final String designator;

    Rise(String designator) {
        this.designator = designator;
    }

    /** As in designators. */
    @Override
    public String toString() {
        return designator;
    }
}
