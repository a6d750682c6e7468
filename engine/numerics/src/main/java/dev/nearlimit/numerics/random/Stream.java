package dev.nearlimit.numerics.random;

/** What a frame's random numbers are for; each purpose has a stream of its own. */
public enum Stream {
    /** Information bits. */
    PAYLOAD(1),
    /** What the channel adds, or which bits it flips. */
    NOISE(2),
    /** How the channel's gain varies. */
    FADING(3),
    /** Which of several distributions a frame's noise is drawn from, where it is not always the same. */
    SELECTION(4);

    private final int number;

    Stream(int number) {
        this.number = number;
    }

    /** The number that enters the key; fixed for ever, whatever order the constants stand in. */
    int number() {
        return number;
    }
}
