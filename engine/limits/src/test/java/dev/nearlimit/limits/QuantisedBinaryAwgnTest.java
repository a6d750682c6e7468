package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class QuantisedBinaryAwgnTest {
    /** Straight from the definition: densities integrated cell by cell, then the mutual information of the table. */
    private static double integratedCapacity(double esn0, UniformLlrQuantiser quantiser) {
        int rail = (1 << (quantiser.wordBits() - 1)) - 1;
        double sum = 0;
        // Output o is the LLR over the step, rounded half away from zero or up to the next odd half, then limited.
        boolean tread = quantiser.rise() == QuantiserRise.MID_TREAD;
        int least = tread ? -rail : -rail - 1;
        for (int o = least; o <= rail; o++) {
            double low = (tread ? o - 0.5 : o) * quantiser.step();
            double high = low + quantiser.step();
            double p0 = mass(4 * esn0, esn0, o == least ? Double.NEGATIVE_INFINITY : low, o == rail ? 1e9 : high);
            double p1 = mass(-4 * esn0, esn0, o == least ? Double.NEGATIVE_INFINITY : low, o == rail ? 1e9 : high);
            sum += information(p0, p1) + information(p1, p0);
        }
        return sum;
    }

    private static double information(double p, double other) {
        return p == 0 ? 0 : 0.5 * p * Math.log(2 * p / (p + other)) / Math.log(2);
    }

    private static double mass(double mean, double esn0, double low, double high) {
        double deviation = Math.sqrt(8 * esn0);
        double from = Math.max(-12, (low - mean) / deviation);
        double to = Math.min(12, (high - mean) / deviation);
        if (from >= to) {
            return 0;
        }
        return new IterativeLegendreGaussIntegrator(20, 1e-13, 1e-15)
                .integrate(100_000, z -> Math.exp(-0.5 * z * z) / Math.sqrt(2 * Math.PI), from, to);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12})
    void agreesWithIntegratedCells(long seed) {
        Random random = new Random(seed);
        for (int i = 0; i < 10; i++) {
            QuantiserRise rise = QuantiserRise.values()[random.nextInt(2)];
            int word = (rise == QuantiserRise.MID_TREAD ? 2 : 1) + random.nextInt(5);
            double step = Math.exp(random.nextDouble() * 5 - 3);
            double esn0 = Decibels.toLinear(random.nextDouble() * 30 - 20);
            UniformLlrQuantiser quantiser = new UniformLlrQuantiser(word, step, rise);
            QuantisedBinaryAwgn channel = new QuantisedBinaryAwgn(quantiser);
            String what = "seed " + seed + ": " + quantiser + " at " + esn0;
            assertEquals(integratedCapacity(esn0, quantiser), channel.capacity(esn0), 1e-11, what);
            assertEquals(1 - channel.capacity(esn0), channel.loss(esn0), 1e-13, what);
        }
    }

    @Test
    void oneBitIsTheHardDecision() {
        QuantisedBinaryAwgn sign = new QuantisedBinaryAwgn(new UniformLlrQuantiser(1, 3, QuantiserRise.MID_RISE));
        for (double db = -40; db <= 13; db += 0.5) {
            double esn0 = Decibels.toLinear(db);
            assertEquals(1, sign.capacity(esn0) / HardDecisionAwgn.capacity(esn0), 1e-11, "Es/N0 = " + db + " dB");
        }
        for (double rate : new double[] {1e-6, 0.1, 0.4999, 0.5, 0.9, 0.999999}) {
            assertEquals(HardDecisionAwgn.leastEbn0Db(rate), sign.leastEbn0Db(rate), 1e-8, "rate " + rate);
        }
    }

    /**
     * As the rate tends to 0, the part of the capacity that a quantiser keeps tends to one minus the least mean squared
     * error with which its cells describe a normal variable (second-order expansion of the mutual information). Errors
     * from J. Max, "Quantizing for minimum distortion", IRE Trans. IT 6, 1960, tables I and II (from memory): with free
     * thresholds, which no uniform quantiser can beat, and with uniform thresholds and levels, which it must beat since a
     * decoder is free in what a level stands for.
     */
    @ParameterizedTest
    @CsvSource({
        "mid-rise, 2, 0.1175, 0.1188",
        "mid-rise, 3, 0.03454, 0.03744",
        "mid-rise, 4, 0.009497, 0.01154",
        "mid-tread, 2, 0.1902, 0.1902",
    })
    void atLowRatesLosesWhatTheErrorOfTheQuantiserSays(String rise, int word, double leastError, double error) {
        UniformLlrQuantiser best = BestQuantiserStep.at(1e-6, word, QuantiserRise.of(rise));
        double loss = new QuantisedBinaryAwgn(best).lossDb(1e-6);
        // Half a unit of the last printed digit of 0.1175, in dB of what is left.
        double digit = 2.5e-4;
        assertTrue(loss >= -10 * Math.log10(1 - leastError) - digit, best + " loses " + loss);
        assertTrue(loss <= -10 * Math.log10(1 - error) + digit, best + " loses " + loss);
    }

    /** The optimum three-level quantiser of a normal variable has its thresholds at 0.612 (Max 1960, from memory). */
    @Test
    void bestThreeLevelStepIsMaxs() {
        UniformLlrQuantiser best = BestQuantiserStep.at(1e-6, 2, QuantiserRise.MID_TREAD);
        double deviation = Math.sqrt(8 * new QuantisedBinaryAwgn(best).leastEsn0(1e-6));
        assertEquals(0.612, best.step() / 2 / deviation, 5e-4);
    }

    @Test
    void lossesOfTheTrade() {
        // common practice: hard decisions lose pi/2, 1.96 dB, at low rates, three bits about 0.2 dB or less
        QuantisedBinaryAwgn sign = new QuantisedBinaryAwgn(new UniformLlrQuantiser(1, 1, QuantiserRise.MID_RISE));
        assertEquals(10 * Math.log10(Math.PI / 2), sign.lossDb(1e-6), 1e-5);
        UniformLlrQuantiser threeBits = BestQuantiserStep.at(0.01, 3, QuantiserRise.MID_RISE);
        double loss = new QuantisedBinaryAwgn(threeBits).lossDb(0.01);
        assertTrue(loss > 0.1 && loss < 0.2, "3 bits lose " + loss + " dB");
        UniformLlrQuantiser eightBits = BestQuantiserStep.at(0.5, 8, QuantiserRise.MID_TREAD);
        double tiny = new QuantisedBinaryAwgn(eightBits).lossDb(0.5);
        assertTrue(tiny >= 0 && tiny < 0.001, "8 bits lose " + tiny + " dB");
    }

    @ParameterizedTest
    @EnumSource(QuantiserRise.class)
    void eachBitHelps(QuantiserRise rise) {
        for (double rate : new double[] {0.05, 0.5, 5 / 6.0, 0.99}) {
            double last = Double.POSITIVE_INFINITY;
            for (int word = 2; word <= (rise == QuantiserRise.MID_TREAD ? 8 : 7); word++) {
                double loss = new QuantisedBinaryAwgn(BestQuantiserStep.at(rate, word, rise)).lossDb(rate);
                assertTrue(loss > 0 && loss < 0.6 * last, rise + " " + word + " bits at " + rate + ": " + loss);
                last = loss;
            }
        }
    }

    @ParameterizedTest
    @EnumSource(QuantiserRise.class)
    void noStepBeatsTheBest(QuantiserRise rise) {
        for (double rate : new double[] {0.01, 0.5, 0.9, 0.9999}) {
            for (int word = 2; word <= 5; word++) {
                UniformLlrQuantiser best = BestQuantiserStep.at(rate, word, rise);
                double least = new QuantisedBinaryAwgn(best).lossDb(rate);
                for (double factor = 0.02; factor < 50; factor *= 1.1) {
                    UniformLlrQuantiser other = new UniformLlrQuantiser(word, best.step() * factor, rise);
                    double loss = new QuantisedBinaryAwgn(other).lossDb(rate);
                    assertTrue(loss > least - 1e-9, other + " at rate " + rate + " beats " + best);
                }
            }
        }
    }

    /** What makes the least Eb/N0 one and not several. */
    @ParameterizedTest
    @EnumSource(QuantiserRise.class)
    void capacityGrowsWithEnergyAtEveryStep(QuantiserRise rise) {
        for (int word = 2; word <= 5; word++) {
            for (double step = 0.01; step < 200; step *= 1.5) {
                QuantisedBinaryAwgn channel = new QuantisedBinaryAwgn(new UniformLlrQuantiser(word, step, rise));
                double last = 0;
                for (double db = -30; db <= 12; db += 0.25) {
                    double esn0 = Decibels.toLinear(db);
                    double capacity = channel.capacity(esn0);
                    assertTrue(capacity >= last, rise + " " + word + " bits, step " + step + " at " + db + " dB");
                    assertTrue(capacity <= BinaryInputAwgn.capacity(esn0) * (1 + 1e-12));
                    last = capacity;
                }
            }
        }
    }

    @Test
    void stepsWithoutSenseHaveTheirLimitToo() {
        // Levels so far apart that zero is all but an erasure until 4 Es/N0 comes to half a step.
        double far = new QuantisedBinaryAwgn(new UniformLlrQuantiser(2, 1e4, QuantiserRise.MID_TREAD)).leastEsn0(0.5);
        assertEquals(1250, far, 1);
        // Levels so close that only the sign is left.
        QuantisedBinaryAwgn close = new QuantisedBinaryAwgn(new UniformLlrQuantiser(8, 1e-9, QuantiserRise.MID_TREAD));
        assertEquals(HardDecisionAwgn.leastEbn0Db(0.5), close.leastEbn0Db(0.5), 1e-6);
    }

    @Test
    void clipIsTheOutermostLevel() {
        assertEquals(
                1.0, UniformLlrQuantiser.ofClip(5, 15, QuantiserRise.MID_TREAD).step());
        assertEquals(
                2.0, UniformLlrQuantiser.ofClip(4, 15, QuantiserRise.MID_RISE).step());
    }

    @Test
    void refusesWhatCannotBe() {
        assertEquals(
                "word of a mid-tread quantiser is 1 bits, must be 2..8",
                assertThrows(InvalidLimitException.class, () -> new UniformLlrQuantiser(1, 1, QuantiserRise.MID_TREAD))
                        .getMessage());
        assertEquals(
                "step of the quantiser is NaN, must be above 0 and at most 10000",
                assertThrows(
                                InvalidLimitException.class,
                                () -> new UniformLlrQuantiser(3, Double.NaN, QuantiserRise.MID_TREAD))
                        .getMessage());
        assertThrows(InvalidLimitException.class, () -> UniformLlrQuantiser.ofClip(3, 0, QuantiserRise.MID_RISE));
        assertThrows(InvalidLimitException.class, () -> BestQuantiserStep.at(1, 3, QuantiserRise.MID_RISE));
        assertThrows(InvalidLimitException.class, () -> BestQuantiserStep.at(0.5, 1, QuantiserRise.MID_RISE));
        assertThrows(InvalidLimitException.class, () -> QuantiserRise.of("mid-air"));
    }
}
