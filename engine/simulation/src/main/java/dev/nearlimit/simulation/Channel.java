package dev.nearlimit.simulation;

import java.util.List;
import java.util.Locale;

/** What is done to the symbols on their way. */
public sealed interface Channel {
    /** The designator, reading which gives the channel again. */
    String designator();

    /** Whether Eb/N0 sets the channel; where not, its parameter is fixed and a point carries no Eb/N0. */
    boolean hasEbn0();

    /**
     * White Gaussian noise of variance N0/2 per real dimension.
     *
     * @param mismatch how far the receiver is off in what it takes N0 and the signal's amplitude for
     */
    record Awgn(Mismatch mismatch) implements Channel {
        /** With a receiver that knows N0 and the amplitude. */
        public Awgn() {
            this(Mismatch.NONE);
        }

        @Override
        public String designator() {
            return mismatch.equals(Mismatch.NONE) ? "awgn" : "awgn:" + mismatch.designator();
        }

        @Override
        public boolean hasEbn0() {
            return true;
        }
    }

    /** White Gaussian noise, of which the receiver keeps only the hard decision: a BSC whose p follows from Eb/N0. */
    record HardDecisionAwgn() implements Channel {
        @Override
        public String designator() {
            return "bsc";
        }

        @Override
        public boolean hasEbn0() {
            return true;
        }
    }

    /**
     * Binary symmetric channel.
     *
     * @param p crossover probability, 0 < p < 0.5
     */
    record BinarySymmetric(double p) implements Channel {
        public BinarySymmetric {
            if (!(p > 0 && p < 0.5)) {
                throw new InvalidSimulationException("crossover probability is " + p + ", must be between 0 and 0.5");
            }
        }

        @Override
        public String designator() {
            return "bsc:" + p;
        }

        @Override
        public boolean hasEbn0() {
            return false;
        }
    }

    /**
     * Reads a designator: {@code awgn}, {@code awgn:noise-estimate=1,gain=-0.5}, {@code bsc} or {@code bsc:0.01}.
     *
     * @throws InvalidSimulationException if it names no channel
     */
    static Channel of(String designator) {
        String text = designator.trim().toLowerCase(Locale.ROOT);
        if (text.equals("awgn")) {
            return new Awgn();
        }
        if (text.startsWith("awgn:")) {
            return new Awgn(Mismatch.parse(text.substring("awgn:".length())));
        }
        if (text.equals("bsc")) {
            return new HardDecisionAwgn();
        }
        if (text.startsWith("bsc:")) {
            try {
                return new BinarySymmetric(Double.parseDouble(text.substring(4)));
            } catch (NumberFormatException e) {
                throw new InvalidSimulationException(
                        "crossover probability of channel '" + designator + "' is no number");
            }
        }
        throw new InvalidSimulationException("unknown channel '" + designator
                + "'; known are awgn, bsc, bsc:p; awgn takes " + String.join("=dB and ", Mismatch.SETTINGS) + "=dB");
    }

    /** Names of the settings that a channel's designator takes, as in {@code awgn:gain=1}; empty where it takes none. */
    static List<String> settings(String designator) {
        return of(designator) instanceof Awgn ? Mismatch.SETTINGS : List.of();
    }
}
