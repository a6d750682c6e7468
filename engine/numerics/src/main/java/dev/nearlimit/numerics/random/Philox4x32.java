package dev.nearlimit.numerics.random;

/**
 * Philox4x32-10: a bijection of 128-bit counters for every 64-bit key, whose images look random.
 *
 * <p>Source: J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw, "Parallel random numbers: as easy as 1, 2, 3", SC 2011,
 * section 3.3; ten rounds.
 */
public final class Philox4x32 {
    private static final int ROUNDS = 10;
    private static final long MULTIPLIER_0 = 0xD2511F53L;
    private static final long MULTIPLIER_1 = 0xCD9E8D57L;
    private static final int WEYL_0 = 0x9E3779B9;
    private static final int WEYL_1 = 0xBB67AE85;
    private static final long LOW_32 = 0xFFFFFFFFL;

    private Philox4x32() {}

    /**
     * The image of one counter.
     *
     * @param counter0 first of the four 32-bit words of the counter; the others follow
     * @param key0 first of the two 32-bit words of the key; the other follows
     * @param image receives the four 32-bit words of the image
     */
    public static void block(int counter0, int counter1, int counter2, int counter3, int key0, int key1, int[] image) {
        int c0 = counter0;
        int c1 = counter1;
        int c2 = counter2;
        int c3 = counter3;
        int k0 = key0;
        int k1 = key1;
        for (int round = 0; round < ROUNDS; round++) {
            long product0 = MULTIPLIER_0 * (c0 & LOW_32);
            long product1 = MULTIPLIER_1 * (c2 & LOW_32);
            c0 = (int) (product1 >>> 32) ^ c1 ^ k0;
            c1 = (int) product1;
            c2 = (int) (product0 >>> 32) ^ c3 ^ k1;
            c3 = (int) product0;
            k0 += WEYL_0;
            k1 += WEYL_1;
        }
        image[0] = c0;
        image[1] = c1;
        image[2] = c2;
        image[3] = c3;
    }
}
