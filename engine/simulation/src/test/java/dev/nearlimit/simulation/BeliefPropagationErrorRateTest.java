package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import org.junit.jupiter.api.Test;

/** Belief propagation end to end against a simulation that shares no code, no noise and no arithmetic with this one. */
class BeliefPropagationErrorRateTest {
    /**
     * IEEE 802.11n (648,324), sum-product with 50 flooding iterations, stop on zero syndrome, Eb/N0 = 1.00 dB: FER
     * 3.5651e-1 from 200 frame errors and 28.51 iterations a frame on average. Source: an independent Monte-Carlo
     * simulation in double precision (basis: computed, reference row E-o0172).
     *
     * <p>That figure has a relative standard deviation of 5.7 % (sqrt(0.64/200)); with 400 frame errors here, 4.0 %, the
     * two differ by 7.0 %. Six of these, 42 %, are exceeded by chance with a probability of 2e-9. Iterations spread by
     * about 19 a frame, so that six standard deviations of the difference of both averages are 5.8.
     */
    @Test
    void sumProductOnTheWirelessCodeOfHalfRate() {
        DecoderChoice choice = DecoderDesignator.parse("sum-product:iterations=50,schedule=flooding");
        Scheme scheme = new Scheme(
                Catalogue.standard().build("ldpc-802.11n:648,1/2"),
                choice.decoder(),
                Modulation.QPSK,
                choice.quantiser(),
                new Channel.Awgn());
        PointCounts counts = new Simulator(2, new MemoryJournal())
                .run(scheme, Point.ofEbn0Db(1.0), 5, new StoppingRule(100_000, 400), RunControl.none());
        double fer = (double) counts.frameErrors() / counts.frames();
        assertEquals(3.5651e-1, fer, 0.42 * 3.5651e-1, counts.toString());
        double iterations = (double) counts.iterations() / counts.frames();
        assertEquals(28.51, iterations, 5.8, counts.toString());
        assertTrue(counts.undetectedErrors() <= 10, "nearly every failure is noticed: " + counts);
    }
}
