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
    private final int[] gain;

    FixedPointCheckRule(int largestMessage, MagnitudeCorrection correction, int lanes) {
        this.largestMessage = largestMessage;
        this.eighths = correction instanceof MagnitudeCorrection.Scale scale ? scale.eighths() : 8;
        this.offset = correction instanceof MagnitudeCorrection.Offset by ? (int) by.amount() : 0;
        this.least = new int[lanes];
        this.second = new int[lanes];
        this.sign = new int[lanes];
        this.gain = new int[lanes];
    }

    /**
     * Computes the messages of {@code lanes} rows of the same degree.
     *
     * @param incoming what the checks read: lane f of edge i at {@code [i][f]}
     * @param message receives the outgoing messages: lane f of edge i at {@code [first + i][f]}
     */
    void apply(int[][] incoming, int degree, int lanes, int[][] message, int first) {
        // Starting both minima at the largest message limits every magnitude to it at no cost.
        Arrays.fill(least, 0, lanes, largestMessage);
        Arrays.fill(second, 0, lanes, largestMessage);
        Arrays.fill(sign, 0, lanes, 0);
        for (int i = 0; i < degree; i++) {
            takeMinima(incoming[i], least, second, sign, lanes);
        }
        correct(least, second, gain, eighths, offset, lanes);
        for (int i = 0; i < degree; i++) {
            send(incoming[i], least, second, gain, sign, message[first + i], lanes);
        }
    }

    private static void takeMinima(int[] incoming, int[] least, int[] second, int[] sign, int lanes) {
        for (int f = 0; f < lanes; f++) {
            int t = incoming[f];
            int magnitude = Math.abs(t);
            int best = least[f];
            int below = magnitude - best;
            int lowered = below & (below >> 31);
            least[f] = best + lowered;
            int larger = magnitude - lowered;
            int next = second[f];
            int fall = larger - next;
            second[f] = next + (fall & (fall >> 31));
            sign[f] ^= t;
        }
    }

    /**
     * Corrects what is sent, and keeps it as the message made of the second magnitude and what to add to it for that made
     * of the least; the least stays as it was, since edges are told apart by it.
     */
    private static void correct(int[] least, int[] second, int[] gain, int eighths, int offset, int lanes) {
        for (int f = 0; f < lanes; f++) {
            int scaled = ((eighths * second[f]) >> 3) - offset;
            int others = scaled & ~(scaled >> 31);
            scaled = ((eighths * least[f]) >> 3) - offset;
            second[f] = others;
            gain[f] = (scaled & ~(scaled >> 31)) - others;
        }
    }

    private static void send(
            int[] incoming, int[] least, int[] second, int[] gain, int[] sign, int[] message, int lanes) {
        for (int f = 0; f < lanes; f++) {
            int t = incoming[f];
            // All ones where another edge had the least magnitude; where two share it, both choices are equal.
            int another = (least[f] - Math.abs(t)) >> 31;
            int m = second[f] + (gain[f] & another);
            int negative = (sign[f] ^ t) >> 31;
            message[f] = (m ^ negative) - negative;
        }
    }
}
