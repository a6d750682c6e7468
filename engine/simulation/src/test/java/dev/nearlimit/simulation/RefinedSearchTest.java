package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.simulation.search.NeededEbn0;
import dev.nearlimit.simulation.search.NeededEbn0Search;
import java.util.OptionalLong;
import org.apache.commons.math3.special.Erf;
import org.junit.jupiter.api.Test;

/** The search for the needed Eb/N0 on simulated frames of a scheme whose FER is known exactly. */
final class RefinedSearchTest {
    private static final double TARGET = 1e-2;
    private static final int BITS = 16;

    /** 1 - (1 - Q(sqrt(2 Eb/N0)))^16 = 1e-2, solved by halving. */
    private static double truthDb() {
        double low = 0;
        double high = 15;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            double wrong = Erf.erfc(Math.sqrt(Math.pow(10, middle / 10))) / 2;
            if (-Math.expm1(BITS * Math.log1p(-wrong)) > TARGET) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    /**
     * The 95 % interval may miss with 5 %; more than 10 misses in 30 seeded searches would then come with a probability
     * below 1e-6 (binomial tail).
     */
    @Test
    void intervalCoversTheTruthAsOftenAsItSays() {
        double truth = truthDb();
        Scheme scheme = Uncoded.scheme(BITS, "awgn", false);
        int missed = 0;
        for (int seed = 0; seed < 30; seed++) {
            long own = seed;
            Simulator simulator = new Simulator(1, new MemoryJournal(), 256);
            NeededEbn0Search search = new NeededEbn0Search(
                    (microDb, rule) ->
                            simulator.run(scheme, new Point(OptionalLong.of(microDb)), own, rule, RunControl.none()),
                    TARGET,
                    1_000_000);
            search.bracket(3, 12, 32);
            NeededEbn0 found = search.refine(0.1, 100);
            missed += found.lowDb() > truth || found.highDb() < truth ? 1 : 0;
        }
        assertTrue(missed <= 10, missed + " of 30 missed");
    }
}
