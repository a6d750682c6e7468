package dev.nearlimit.limits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class GaussianTailTest {
    /** erfc(x/sqrt 2)/2 and its logarithm, evaluated apart from this project in 40-digit arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "-5, 0.99999971334842812081, -2.8665161296376359338e-7",
        "0.5, 0.30853753872598689636, -1.1759117615936186089",
        "1, 0.15865525393145705141, -1.8410216450092635058",
        "3, 0.0013498980316300945267, -6.6077262215103495433",
        "5, 2.8665157187919391167e-7, -15.064998393988725736",
        "10, 7.619853024160526066e-24, -53.231285150512470578",
        "20, 2.7536241186062336951e-89, -203.91715537109726394",
    })
    void agreesWithFortyDigits(double x, double q, double logQ) {
        assertEquals(1, GaussianTail.q(x) / q, 1e-12);
        assertEquals(1, GaussianTail.logQ(x) / logQ, 1e-13);
    }

    @ParameterizedTest
    @CsvSource({"38, -726.5572160188201301", "100, -5005.5242086942050886", "1000, -500007.82669481218431"})
    void keepsTheLogarithmWhereTheProbabilityUnderflows(double x, double logQ) {
        assertEquals(1, GaussianTail.logQ(x) / logQ, 1e-14);
        assertEquals(1, GaussianTail.inverseOfLog(logQ) / x, 1e-14);
    }

    @Test
    void meetsTheLibrarysDistributionWhereThatIsAccurate() {
        NormalDistribution normal = new NormalDistribution(0, 1);
        for (double x = -4; x <= 4; x += 0.01) {
            assertEquals(normal.cumulativeProbability(-x), GaussianTail.q(x), 1e-14, "x = " + x);
        }
    }

    @Test
    void fallsThroughTheSeamsOfItsBranches() {
        double last = Double.POSITIVE_INFINITY;
        for (double x = -40; x <= 60; x += 1e-2) {
            double logQ = GaussianTail.logQ(x);
            assertTrue(logQ <= last, "rises at x = " + x);
            last = logQ;
        }
        for (double seam : new double[] {-3, 3}) {
            double step = 1e-9;
            double jump = GaussianTail.logQ(seam + step) - GaussianTail.logQ(seam - step);
            assertTrue(Math.abs(jump) < 4 * 2 * step, "jump of " + jump + " at " + seam);
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void inverseUndoesTheTail(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < 500; i++) {
            double p = Math.exp(-random.nextDouble() * 700);
            double x = GaussianTail.inverse(p);
            assertEquals(Math.log(p), GaussianTail.logQ(x), 2e-13 * (1 - Math.log(p)), "seed " + seed + ", p = " + p);
            double y = random.nextDouble() * 8 - 4;
            assertEquals(y, GaussianTail.inverse(GaussianTail.q(y)), 1e-11, "seed " + seed + ", x = " + y);
        }
    }

    @Test
    void inverseReachesTheEnds() {
        assertEquals(0, GaussianTail.inverse(0.5), 1e-15);
        assertTrue(GaussianTail.inverse(Double.MIN_VALUE) > 38.4);
        assertTrue(GaussianTail.inverse(Math.nextDown(1.0)) < -8.2);
        assertEquals(0, GaussianTail.q(Double.POSITIVE_INFINITY));
        assertEquals(1, GaussianTail.q(Double.NEGATIVE_INFINITY));
        assertEquals(1, GaussianTail.q(-50));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 1, -0.1, 1.5, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNoProbability(double p) {
        InvalidLimitException refused = assertThrows(InvalidLimitException.class, () -> GaussianTail.inverse(p));
        assertEquals("probability is " + p + ", must lie between 0 and 1, both excluded", refused.getMessage());
    }

    @Test
    void refusesWhatIsNoNumber() {
        assertThrows(InvalidLimitException.class, () -> GaussianTail.q(Double.NaN));
        assertThrows(InvalidLimitException.class, () -> GaussianTail.logQ(Double.NaN));
        assertThrows(InvalidLimitException.class, () -> GaussianTail.inverseOfLog(0));
    }
}
