package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.limits.UncodedBinary;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Uncoded transmission against BER = Q(sqrt(2 Eb/N0)) for BPSK and QPSK. */
class UncodedTransmissionTest {
    /** Two-sided 3.8e-8 for a normal count; the counts here are large enough for that to hold within a factor of two. */
    private static final double SIGMAS = 5.5;

    @ParameterizedTest
    @CsvSource({"BPSK, -3, 100000", "BPSK, 0, 100000", "BPSK, 4, 200000", "QPSK, 0, 100000", "QPSK, 6.79, 200000"})
    void bitErrorRateIsThatOfTheClosedForm(Modulation modulation, double ebn0Db, long frames) {
        Scheme bpsk = Uncoded.scheme(33, "awgn", false);
        Scheme scheme = new Scheme(bpsk.code(), bpsk.decoder(), modulation, bpsk.quantiser(), bpsk.channel());
        check(scheme, Point.ofEbn0Db(ebn0Db), UncodedBinary.bitErrorRate(ebn0Db), frames);
    }

    /** 9.59 dB for a BER of 1e-5: common practice. */
    @ParameterizedTest
    @ValueSource(strings = {"awgn", "bsc"})
    void oneErrorIn100000BitsAt9p59Db(String channel) {
        check(Uncoded.scheme(33, channel, false), Point.ofEbn0Db(9.59), 1.0e-5, 300_000);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.4, 0.05, 0.001})
    void fixedCrossoverFlipsWithItsProbability(double p) {
        check(Uncoded.scheme(33, "bsc:" + p, false), Point.ofFixedParameter(), p, 100_000);
    }

    private static void check(Scheme scheme, Point point, double ber, long frames) {
        PointCounts counts = new Simulator(2, new MemoryJournal())
                .run(scheme, point, 1, new StoppingRule(frames, Long.MAX_VALUE), RunControl.none());
        double bits = (double) frames * scheme.code().k();
        assertEquals(ber * bits, counts.bitErrors(), SIGMAS * Math.sqrt(bits * ber * (1 - ber)), "bit errors");
        double fer = -Math.expm1(scheme.code().k() * Math.log1p(-ber));
        assertEquals(fer * frames, counts.frameErrors(), SIGMAS * Math.sqrt(frames * fer * (1 - fer)), "frame errors");
        assertEquals(counts.frameErrors(), counts.undetectedErrors());
    }
}
