package dev.nearlimit.decoders.ldpc;

import java.util.Arrays;

/**
 * The min-sum check rule on integers, over many lanes at once: the two least magnitudes and the product of the signs
 * give every outgoing message. Selections are made with masks, never with branches; a comparison is the sign of a
 * difference, which is exact since all values stay far from the ends of an {@code int}.
 */
final class FixedPointCheckRule {
    private final int largestMessage;
    private final int eighths;
    private final int offset;
    private final int[] least;
    private final int[] second;
    private final int[] sign;

    FixedPointCheckRule(int largestMessage, MagnitudeCorrection correction, int lanes) {
        this.largestMessage = largestMessage;
        this.eighths = correction instanceof MagnitudeCorrection.Scale scale ? scale.eighths() : 8;
        this.offset = correction instanceof MagnitudeCorrection.Offset by ? (int) by.amount() : 0;
        this.least = new int[lanes];
        this.second = new int[lanes];
        this.sign = new int[lanes];
    }

    /**
     * Computes the messages of {@code lanes} rows of the same degree.
     *
     * @param incoming what the checks read: lane f of edge i at {@code i * lanes + f}
     * @param message receives the outgoing messages in the same order from {@code from} on
     */
    void apply(int[] incoming, int degree, int lanes, int[] message, int from) {
        // Starting both minima at the largest message limits every magnitude to it at no cost.
        Arrays.fill(least, 0, lanes, largestMessage);
        Arrays.fill(second, 0, lanes, largestMessage);
        Arrays.fill(sign, 0, lanes, 0);
        for (int i = 0; i < degree; i++) {
            takeMinima(incoming, i * lanes, least, second, sign, lanes);
        }
        // Only the corrected values are sent, but edges are told apart by the least magnitude as it was.
        correct(second, lanes);
        for (int i = 0; i < degree; i++) {
            send(incoming, i * lanes, message, from + i * lanes, lanes);
        }
    }

    private static void takeMinima(int[] incoming, int from, int[] least, int[] second, int[] sign, int lanes) {
        for (int f = 0; f < lanes; f++) {
            int t = incoming[from + f];
            int magnitude = Math.abs(t);
            int best = least[f];
            int below = magnitude - best;
            int lowered = below & (below >> 31);
            least[f] = best + lowered;
            int larger = magnitude - lowered;
            int next = second[f];
            int gain = larger - next;
            second[f] = next + (gain & (gain >> 31));
            sign[f] ^= t;
        }
    }

    private void correct(int[] magnitude, int lanes) {
        for (int f = 0; f < lanes; f++) {
            magnitude[f] = corrected(magnitude[f]);
        }
    }

    private int corrected(int magnitude) {
        int m = ((eighths * magnitude) >> 3) - offset;
        return m & ~(m >> 31);
    }

    private void send(int[] incoming, int from, int[] message, int to, int lanes) {
        for (int f = 0; f < lanes; f++) {
            int t = incoming[from + f];
            int best = least[f];
            int others = second[f];
            // All ones where another edge had the least magnitude; where two share it, both choices are equal.
            int another = (best - Math.abs(t)) >> 31;
            int m = others + ((corrected(best) - others) & another);
            int negative = (sign[f] ^ t) >> 31;
            message[to + f] = (m ^ negative) - negative;
        }
    }
}
