package dev.nearlimit.shortlist;

import static dev.nearlimit.shortlist.Requirements.candidate;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.BinaryInputAwgn;
import dev.nearlimit.limits.HardDecisionAwgn;
import dev.nearlimit.limits.ShannonLimit;
import dev.nearlimit.shortlist.requirement.Payload;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.SchemeResult;
import dev.nearlimit.shortlist.result.ShortlistResult;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Simulator;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** The whole job on small codes, with real simulation. */
class ShortlisterTest {
    private static final Requirement REQUIREMENT = Requirements.of(
            8.0,
            new Payload(64, 1e-2),
            candidate("golay:24,12", "bounded-distance", "maximum-likelihood"),
            candidate("golay:23,12", "syndrome"),
            candidate("bch:127,64", "bounded-distance"),
            candidate("hamming:15,11", "syndrome"),
            candidate("reed-muller:1,5", "maximum-likelihood"),
            candidate("ldpc-802.11n:648,1/2", "min-sum:word=5,offset=1"));

    /** What most tests look at; computed once. */
    private static final ShortlistResult ON_TWO_THREADS = run(2, RunControl.none());

    private static ShortlistResult run(int threads, RunControl control) {
        SimulatedMeters meters = new SimulatedMeters(new Simulator(threads, new MemoryJournal()), 11, control);
        return new Shortlister(meters).run(REQUIREMENT, (stage, fraction) -> {}, control.cancelled());
    }

    /** Curves hold arrays, which records compare by identity; everything else must be equal. */
    private static List<SchemeResult> schemes(ShortlistResult result) {
        return result.operatingPoints().get(0).schemes();
    }

    @Test
    void threadsChangeNothing() {
        assertEquals(schemes(run(1, RunControl.none())), schemes(ON_TWO_THREADS));
    }

    @Test
    void exactNeedsAreTheClosedForms() {
        List<SchemeResult> schemes = schemes(ON_TWO_THREADS);
        SchemeResult golay = schemes.stream()
                .filter(scheme -> scheme.code().equals("golay:23,12"))
                .findFirst()
                .orElseThrow();
        assertEquals("exact", golay.neededMethod());
        assertEquals(6, golay.codewordsPerPayload());
        assertEquals("64/138", golay.payloadRate());
        // 72 information bits are sent for 64.
        double filler = 10 * Math.log10(72.0 / 64);
        double p = org.apache.commons.math3.special.Erf.erfc(
                        Math.sqrt(12.0 / 23 * Math.pow(10, (golay.neededEbn0Db() - filler) / 10)))
                / 2;
        double right = new org.apache.commons.math3.distribution.BinomialDistribution(23, p).cumulativeProbability(3);
        assertEquals(1e-2, 1 - Math.pow(right, 6), 1e-8, "perfect code, six codewords, payload FER 1e-2");
        assertEquals(golay.neededEbn0Db(), golay.neededEbn0DbLow());
    }

    @Test
    void everySchemeStandsBesideItsLimits() {
        ShortlistResult result = ON_TWO_THREADS;
        assertTrue(result.complete());
        assertTrue(result.framesSimulated() > 0);
        for (SchemeResult scheme : schemes(result)) {
            double rate = scheme.efficiencyBitsPerRealDimension();
            assertEquals(ShannonLimit.leastEbn0Db(rate), scheme.limits().shannonDb(), 1e-9);
            assertEquals(BinaryInputAwgn.leastEbn0Db(rate), scheme.limits().modulationDb(), 1e-9);
            assertEquals(HardDecisionAwgn.leastEbn0Db(rate), scheme.limits().hardDecisionDb(), 1e-9);
            if (scheme.neededEbn0Db() != null) {
                assertTrue(scheme.gapToModulationLimitDb() > 0, scheme.code());
                assertEquals(
                        scheme.gapToHardDecisionLimitDb() != null,
                        scheme.decoder().equals("syndrome") || scheme.decoder().equals("bounded-distance"));
            }
            if (scheme.meets()) {
                assertTrue(scheme.codingGainDb() > 0, scheme.code() + " gains " + scheme.codingGainDb());
                assertTrue(
                        scheme.uerUpper() > 0 && scheme.uerUpper() < 1.5e-2, scheme.code() + " " + scheme.uerUpper());
            }
        }
    }

    @Test
    void maximumLikelihoodBeatsHardDecisionsOnTheSameCode() {
        List<SchemeResult> schemes = schemes(ON_TWO_THREADS).stream()
                .filter(scheme -> scheme.code().equals("golay:24,12")
                        && scheme.modulation().equals("qpsk"))
                .toList();
        assertEquals(2, schemes.size());
        double soft = schemes.stream()
                .filter(scheme -> scheme.decoder().equals("maximum-likelihood"))
                .mapToDouble(SchemeResult::neededEbn0Db)
                .findFirst()
                .orElseThrow();
        double hard = schemes.stream()
                .filter(scheme -> scheme.decoder().equals("bounded-distance"))
                .mapToDouble(SchemeResult::neededEbn0Db)
                .findFirst()
                .orElseThrow();
        assertTrue(hard - soft > 1.2 && hard - soft < 3, "about 2 dB (common practice): " + (hard - soft));
    }

    @Test
    void anInterruptedRunKeepsWhatItHas() {
        AtomicInteger asked = new AtomicInteger();
        ShortlistResult result = run(1, RunControl.none().withCancellation(() -> asked.incrementAndGet() > 40));
        assertFalse(result.complete());
        assertEquals(14, schemes(result).size(), "every scheme is listed, whether it was looked at or not");
    }

    @Test
    void tiesAndFrontAreMarked() {
        List<SchemeResult> meeting = new ArrayList<>(schemes(ON_TWO_THREADS));
        meeting.removeIf(scheme -> !scheme.meets());
        assertTrue(meeting.get(0).tiedWithBest());
        assertTrue(meeting.get(0).pareto(), "nothing needs less Eb/N0 in less bandwidth");
        for (int i = 1; i < meeting.size(); i++) {
            assertTrue(meeting.get(i - 1).neededEbn0Db() <= meeting.get(i).neededEbn0Db());
            assertEquals(i + 1, meeting.get(i).rank());
        }
    }

    /** The extended Golay code, shortened to 10 bits, still corrects its mother's three errors by bounded distance. */
    @Test
    void aShortenedCodeKeepsItsDecoder() {
        Requirement short10 =
                Requirements.of(9.0, new Payload(10, 1e-3), candidate("golay:24,12", "bounded-distance", "syndrome"));
        SimulatedMeters meters = new SimulatedMeters(new Simulator(2, new MemoryJournal()), 3, RunControl.none());
        List<SchemeResult> schemes =
                schemes(new Shortlister(meters).run(short10, (stage, fraction) -> {}, () -> false));
        assertEquals("golay:24,12+shorten=2", schemes.get(0).code());
        SchemeResult bounded = schemes.stream()
                .filter(scheme -> scheme.decoder().equals("bounded-distance"))
                .findFirst()
                .orElseThrow();
        assertTrue(bounded.neededHow().contains("more than 3 errors in 22 bits"), bounded.neededHow());
    }
}
