package dev.nearlimit.shortlist;

import static dev.nearlimit.shortlist.Requirements.candidate;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.shortlist.requirement.Payload;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.SchemeResult;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.StoppingRule;
import dev.nearlimit.simulation.search.ErrorRateMeter;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** The contest against error rates that are known, so that every decision can be told right from wrong. */
class ContestTest {
    private static final Payload PAYLOAD = new Payload(324, 1e-3);

    /** FER 1e-3 at a given Eb/N0, three decades a decibel; remembers how many frames were spent on whom. */
    private static final class KnownRates implements MeterFactory {
        private final Map<String, Double> neededDb;
        private final Map<String, Long> framesSpent = new HashMap<>();

        KnownRates(Map<String, Double> neededDb) {
            this.neededDb = neededDb;
        }

        @Override
        public ErrorRateMeter meter(Contender contender) {
            String code = contender.fit().code().designator();
            return (microDb, rule) -> count(code, microDb, rule);
        }

        private PointCounts count(String code, long microDb, StoppingRule rule) {
            double fer = Math.min(1, Math.pow(10, -3 - 3 * (microDb / 1e6 - neededDb.get(code))));
            SplittableRandom random = new SplittableRandom(code.hashCode() * 31L + microDb);
            long frames = 0;
            long errors = 0;
            while (frames < rule.maxFrames() && errors < rule.frameErrors()) {
                frames++;
                errors += random.nextDouble() < fer ? 1 : 0;
            }
            framesSpent.merge(code, frames, Long::sum);
            return new PointCounts(frames, errors, 10 * errors, 100 * errors, 0, 4 * frames, true);
        }
    }

    private static List<SchemeResult> contest(Requirement requirement, KnownRates rates) {
        Demands demands = new Demands(requirement);
        List<Standing> standings = Shortlister.standings(requirement, rates);
        List<Double> fractions = new ArrayList<>();
        new Contest(standings, demands, (stage, fraction) -> fractions.add(fraction), () -> false).run();
        assertEquals(fractions.stream().sorted().toList(), fractions, "progress never falls");
        assertEquals(1.0, fractions.get(fractions.size() - 1));
        return Shortlister.rank(standings, demands);
    }

    private static SchemeResult find(List<SchemeResult> schemes, String code, String modulation) {
        return schemes.stream()
                .filter(scheme ->
                        scheme.code().equals(code) && scheme.modulation().equals(modulation))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void ranksByNeededEbn0AndRefinesOnlyWhatCanWin() {
        KnownRates rates = new KnownRates(Map.of(
                "ldpc-802.11n:648,1/2", 1.80,
                "ldpc-802.11n:648,2/3+shorten=108", 2.40,
                "ldpc-802.11n:648,3/4+shorten=162", 2.90));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        4.0,
                        PAYLOAD,
                        candidate("ldpc-802.11n:648,3/4", "sum-product"),
                        candidate("ldpc-802.11n:648,2/3", "sum-product"),
                        candidate("ldpc-802.11n:648,1/2", "sum-product")),
                rates);
        SchemeResult best = schemes.get(0);
        assertEquals("ldpc-802.11n:648,1/2", best.code());
        assertEquals("qpsk", best.modulation(), "of equals the one that takes less bandwidth comes first");
        assertEquals(1, best.rank());
        assertEquals("refined", best.stage());
        assertEquals(1.80, best.neededEbn0Db(), 0.05);
        assertTrue(best.neededEbn0DbLow() <= 1.80 && 1.80 <= best.neededEbn0DbHigh());
        assertEquals(4.0 - best.neededEbn0Db(), best.marginDb(), 1e-12);
        SchemeResult second = find(schemes, "ldpc-802.11n:648,2/3+shorten=108", "qpsk");
        assertEquals("coarse", second.stage());
        assertEquals(2.40, second.neededEbn0Db(), 0.15);
        assertEquals("not refined: its interval lies above the best scheme's", second.note());
        assertFalse(second.tiedWithBest());
        assertTrue(
                rates.framesSpent.get("ldpc-802.11n:648,2/3+shorten=108") < 80_000,
                "two points near the target and a few cheap ones: " + rates.framesSpent);
    }

    @Test
    void dropsWithoutSimulationWhatAnotherDemandOrTheLimitRulesOut() {
        KnownRates rates = new KnownRates(Map.of("ldpc-802.11n:648,1/2", 1.3));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        1.5,
                        1400,
                        OptionalDouble.empty(),
                        PAYLOAD,
                        candidate("ldpc-802.11n:648,1/2", "sum-product"),
                        candidate("ldpc-802.11n:1944,1/2", "sum-product"),
                        candidate("ldpc-802.11n:648,5/6", "sum-product")),
                rates);
        assertEquals(java.util.Set.of("ldpc-802.11n:648,1/2"), rates.framesSpent.keySet());
        // (1296 + 1 - 1) / 2 symbols for 324 bits at 1000 bit/s, 1.25 times: 2500 Hz of 1400.
        SchemeResult wide = find(schemes, "ldpc-802.11n:1944,1/2+shorten=648", "qpsk");
        assertEquals("dropped", wide.stage());
        assertNull(wide.neededEbn0Db());
        assertEquals("bandwidth 1.40 kHz", wide.fails().get(0).demand());
        assertEquals("needs 1.10 kHz more", wide.fails().get(0).by());
        SchemeResult narrow = find(schemes, "ldpc-802.11n:648,5/6+shorten=216", "qpsk");
        assertTrue(
                narrow.fails().get(0).by().startsWith("no code of its rate and length works below "),
                narrow.fails().toString());
    }

    @Test
    void dropsAfterAFewDozenErrorsWhatMissesTheAvailableEbn0() {
        KnownRates rates = new KnownRates(Map.of("ldpc-802.11n:648,1/2", 1.8, "ldpc-802.11n:648,2/3+shorten=108", 4.2));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        3.0,
                        PAYLOAD,
                        candidate("ldpc-802.11n:648,1/2", "sum-product"),
                        candidate("ldpc-802.11n:648,2/3", "sum-product")),
                rates);
        SchemeResult dropped = find(schemes, "ldpc-802.11n:648,2/3+shorten=108", "bpsk");
        assertFalse(dropped.meets());
        assertEquals("dropped after 32 frame errors at the available Eb/N0", dropped.note());
        assertEquals("Eb/N0 3.00 dB", dropped.fails().get(0).demand());
        assertTrue(
                dropped.fails()
                        .get(0)
                        .by()
                        .matches("codeword FER 1 at 3\\.00 dB \\(32 errors in 3\\d\\), 1\\.0e-3 allowed"),
                dropped.fails().toString());
        assertTrue(rates.framesSpent.get("ldpc-802.11n:648,2/3+shorten=108") < 2_000, rates.framesSpent.toString());
    }

    @Test
    void saysWhatComesClosestWhereNothingMeetsTheRequirement() {
        KnownRates rates = new KnownRates(Map.of("ldpc-802.11n:648,1/2", 1.8, "ldpc-802.11n:648,2/3+shorten=108", 2.4));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        1.3,
                        PAYLOAD,
                        candidate("ldpc-802.11n:648,2/3", "sum-product"),
                        candidate("ldpc-802.11n:648,1/2", "sum-product")),
                rates);
        assertTrue(schemes.stream().noneMatch(SchemeResult::meets));
        assertEquals("ldpc-802.11n:648,1/2", schemes.get(0).code());
        assertEquals(1.8, schemes.get(0).neededEbn0Db(), 0.15);
        String verdict = Verdict.of(schemes, true);
        assertTrue(
                verdict.matches(
                        "No scheme meets every demand\\. ldpc-802\\.11n:648,1/2 with sum-product on [BQ]PSK comes"
                                + " closest; it misses Eb/N0 1\\.30 dB: needs 0\\.[3-6][0-9] dB more\\."),
                verdict);
    }

    @Test
    void holdsTheDecoderBudgetAgainstTheWorstCase() {
        KnownRates rates = new KnownRates(Map.of("ldpc-802.11n:648,1/2", 1.8));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        3.0,
                        1e6,
                        OptionalDouble.of(1000),
                        PAYLOAD,
                        candidate("ldpc-802.11n:648,1/2", "sum-product:iterations=50", "sum-product:iterations=2")),
                rates);
        SchemeResult rejected = schemes.get(schemes.size() - 1);
        assertEquals(
                "decoder budget 1000 operations a bit", rejected.fails().get(0).demand());
        assertTrue(rejected.operationsPerBit().worstCase() > 1000);
        assertTrue(schemes.get(0).meets());
        assertTrue(schemes.get(0).operationsPerBit().worstCase() <= 1000);
    }

    @Test
    void doesNotClaimWhatSimulationCannotShow() {
        KnownRates rates = new KnownRates(Map.of("bch:255,163", 0.0));
        List<SchemeResult> schemes = contest(
                Requirements.of(
                        9.0,
                        new Payload(324, 1e-9),
                        candidate("ldpc-802.11n:648,1/2", "sum-product"),
                        candidate("bch:255,163", "bounded-distance")),
                rates);
        assertFalse(rates.framesSpent.containsKey("ldpc-802.11n:648,1/2"));
        assertEquals("bch:255,163", schemes.get(0).code(), "an exact rate needs no simulation");
        assertTrue(schemes.get(0).meets());
        SchemeResult refused = find(schemes, "ldpc-802.11n:648,1/2", "qpsk");
        assertFalse(refused.meets());
        assertEquals("evidence for codeword FER 1.0e-9", refused.fails().get(0).demand());
        assertEquals(
                "simulation shows no rate below 1.6e-6", refused.fails().get(0).by());
    }
}
