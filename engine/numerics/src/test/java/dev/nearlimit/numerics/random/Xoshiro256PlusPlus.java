package dev.nearlimit.numerics.random;

/** One stream of xoshiro256++, written down as its authors do: the slow twin of the 64-lane generator. */
public final class Xoshiro256PlusPlus {
    private final long[] s;

    public Xoshiro256PlusPlus(long... state) {
        this.s = state.clone();
    }

    /** The stream of one lane of a 64-lane state. */
    public static Xoshiro256PlusPlus ofLane(long[] state, int lane) {
        return new Xoshiro256PlusPlus(state[lane], state[64 + lane], state[128 + lane], state[192 + lane]);
    }

    public long next() {
        long result = Long.rotateLeft(s[0] + s[3], 23) + s[0];
        long t = s[1] << 17;
        s[2] ^= s[0];
        s[3] ^= s[1];
        s[1] ^= s[2];
        s[0] ^= s[3];
        s[2] ^= t;
        s[3] = Long.rotateLeft(s[3], 45);
        return result;
    }
}
