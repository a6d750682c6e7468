package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

class LimitTableTest {
    private static final OptionalInt NONE = OptionalInt.empty();
    private static final OptionalDouble NO_RATE = OptionalDouble.empty();

    @Test
    void listsWhatWasAskedForInAFixedOrder() {
        assertEquals(
                List.of("shannon", "modulation", "hardDecision"),
                names(LimitTable.atRate(0.5, Modulation.BPSK, NONE, NONE, NO_RATE)));
        assertEquals(List.of("shannon", "modulation", "hardDecision", "uncoded", "normalApproximation"), names(full()));
    }

    @Test
    void takesItsFiguresFromTheFunctions() {
        List<Limit> rows = full();
        assertEquals(ShannonLimit.leastEbn0Db(0.5), rows.get(0).ebn0Db());
        assertEquals(BinaryInputAwgn.leastEbn0Db(0.5), rows.get(1).ebn0Db());
        assertEquals(HardDecisionAwgn.leastEbn0Db(0.5), rows.get(2).ebn0Db());
        assertEquals(UncodedBinary.ebn0DbForBitErrorRate(1e-6), rows.get(3).ebn0Db());
        assertEquals(NormalApproximation.leastEbn0Db(128, 64, 1e-4), rows.get(4).ebn0Db());
        assertEquals("Eb/N0 of uncoded bpsk at BER 1e-6, AWGN", rows.get(3).definition());
        for (Limit row : rows) {
            boolean estimate = row.name().equals(LimitTable.NORMAL_APPROXIMATION);
            assertTrue(row.method().startsWith(estimate ? "estimated" : "exact"), row.method());
        }
    }

    @Test
    void chargesEnergyByTheSymbol() {
        double rate = 0.25;
        Limit bpsk =
                LimitTable.atRate(rate, Modulation.BPSK, NONE, NONE, NO_RATE).get(1);
        Limit qpsk =
                LimitTable.atRate(rate, Modulation.QPSK, NONE, NONE, NO_RATE).get(1);
        assertEquals(bpsk.ebn0Db(), qpsk.ebn0Db());
        assertEquals(0.25, bpsk.efficiencyBitsPerRealDimension());
        assertEquals(0.25, bpsk.efficiencyBitsPerSymbol());
        assertEquals(0.5, qpsk.efficiencyBitsPerSymbol());
        // A quarter and half a bit a symbol.
        assertEquals(bpsk.ebn0Db() + 10 * Math.log10(0.25), bpsk.esn0Db(), 1e-12);
        assertEquals(qpsk.ebn0Db() + 10 * Math.log10(0.5), qpsk.esn0Db(), 1e-12);
        // BPSK has Es against N0/2, QPSK Es against two times N0/2: the same ratio.
        assertEquals(bpsk.esn0Db() + 10 * Math.log10(2), bpsk.snrDb(), 1e-12);
        assertEquals(qpsk.esn0Db(), qpsk.snrDb(), 1e-12);
        assertEquals(bpsk.snrDb(), qpsk.snrDb(), 1e-12);
    }

    @Test
    void capacityAtTheLimitIsTheRate() {
        Limit shannon =
                LimitTable.atRate(0.7, Modulation.QPSK, NONE, NONE, NO_RATE).get(0);
        assertEquals(0.7, ShannonLimit.capacity(Decibels.toLinear(shannon.snrDb()) / 2), 1e-12);
    }

    @Test
    void refusesWhatCannotBe() {
        assertEquals(
                "rate is 1.0, must lie between 0 and 1, both excluded",
                refusal(() -> LimitTable.atRate(1, Modulation.BPSK, NONE, NONE, NO_RATE)));
        assertEquals(
                "a finite-length limit needs length, information bits and FER together; the FER is missing",
                refusal(() ->
                        LimitTable.atRate(0.5, Modulation.BPSK, OptionalInt.of(128), OptionalInt.of(64), NO_RATE)));
        assertEquals(
                "a finite-length limit needs length, information bits and FER together; the length is missing",
                refusal(() ->
                        LimitTable.atRate(0.5, Modulation.BPSK, NONE, OptionalInt.of(64), OptionalDouble.of(1e-3))));
        assertEquals(
                "rate is 0.5 but 60 information bits in 128 channel uses are 0.46875",
                refusal(() -> LimitTable.atRate(
                        0.5, Modulation.BPSK, OptionalInt.of(128), OptionalInt.of(60), OptionalDouble.of(1e-3))));
        assertEquals(
                "bit error rate is 0.0, must lie between 0 and 0.5, both excluded",
                refusal(() -> LimitTable.atRate(0.5, Modulation.BPSK, NONE, NONE, NO_RATE, OptionalDouble.of(0))));
    }

    private static List<Limit> full() {
        return LimitTable.atRate(
                0.5,
                Modulation.BPSK,
                OptionalInt.of(128),
                OptionalInt.of(64),
                OptionalDouble.of(1e-4),
                OptionalDouble.of(1e-6));
    }

    private static List<String> names(List<Limit> rows) {
        return rows.stream().map(Limit::name).toList();
    }

    private static String refusal(Executable call) {
        return assertThrows(InvalidLimitException.class, call).getMessage();
    }
}
