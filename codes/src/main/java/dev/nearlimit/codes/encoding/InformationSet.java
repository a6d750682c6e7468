package dev.nearlimit.codes.encoding;

/** The positions of a codeword that carry information, as a mask. */
final class InformationSet {
    private InformationSet() {}

    /** n flags, true at the information positions. */
    static boolean[] mask(int n, int[] informationPositions) {
        boolean[] mask = new boolean[n];
        for (int position : informationPositions) {
            mask[position] = true;
        }
        return mask;
    }
}
