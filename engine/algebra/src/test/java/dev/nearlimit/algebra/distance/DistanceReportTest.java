package dev.nearlimit.algebra.distance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.algebra.distance.MinimumDistance.Status;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.structure.BchStructure;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DistanceReportTest {

    @Test
    void enumeratesWhereItCan() {
        DistanceReport report = DistanceReport.of(SmallCodes.golay().withKnownDistance(7, "theorem"));
        assertEquals(OptionalInt.of(7), report.minimumDistance().value());
        assertEquals(Status.PROVEN, report.minimumDistance().status());
        assertEquals("exact weight enumerator", report.minimumDistance().how());
        assertEquals(7, report.bounds().best());
        assertTrue(report.weights().orElseThrow().exact());
    }

    @Test
    void believesTheFamilyWhereItCannot() {
        Code code = SmallCodes.random(1, 80, 40).withKnownDistance(9, "a table");
        DistanceReport report = DistanceReport.of(code);
        assertEquals(
                new MinimumDistance(OptionalInt.of(9), 9, 9, Status.PUBLISHED, "a table"), report.minimumDistance());
        assertTrue(report.weights().isEmpty());
    }

    @Test
    void encloses() {
        Code code = SmallCodes.random(2, 80, 40);
        MinimumDistance distance = DistanceReport.of(code).minimumDistance();
        assertTrue(distance.value().isEmpty());
        assertEquals(3, distance.low());
        assertEquals(Status.FOUND, distance.status());
        BitMatrix G = code.generator();
        int lightest = 80;
        for (int r = 0; r < 40; r++) {
            lightest = Math.min(lightest, G.rowWeight(r));
        }
        assertEquals(lightest, distance.high());
        assertTrue(distance.how().endsWith("a generator row has weight " + lightest), distance.how());
    }

    @Test
    void takesTheBchBound() {
        // BCH (15,7), t = 2: d >= 5, and g(x) itself has weight 5
        Code code = SmallCodes.bch15().withStructure(new BchStructure(4, 0b10011, 2, false, 0));
        MinimumDistance distance = DistanceReport.withoutEnumeration(code);
        assertEquals(5, distance.low());
        assertEquals(OptionalInt.of(5), distance.value());
        assertEquals(Status.PROVEN, distance.status());
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16})
    void intervalHoldsTheTrueDistance(long seed) {
        Random random = new Random(seed);
        int n = 2 + random.nextInt(20);
        Code code = SmallCodes.random(seed, n, 1 + random.nextInt(Math.min(n, 12)));
        int distance = WeightEnumeration.exact(code).minimumDistance();
        MinimumDistance interval = DistanceReport.withoutEnumeration(code);
        assertTrue(
                interval.low() <= distance && distance <= interval.high(),
                code + ": " + distance + " not in " + interval + ", seed " + seed);
        assertTrue(interval.value().isEmpty() || interval.value().getAsInt() == distance);
    }

    @Test
    void emptyIntervalIsRefused() {
        assertThrows(
                IllegalArgumentException.class,
                () -> new MinimumDistance(OptionalInt.empty(), 5, 4, Status.PROVEN, "nothing"));
        assertThrows(
                IllegalArgumentException.class,
                () -> new MinimumDistance(OptionalInt.of(4), 4, 5, Status.PROVEN, "nothing"));
    }
}
