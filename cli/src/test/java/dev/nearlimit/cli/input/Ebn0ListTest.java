package dev.nearlimit.cli.input;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

final class Ebn0ListTest {
    @Test
    void listIsSortedAndEachValueComesOnce() {
        assertEquals(
                List.of(-500_000L, 1_000_000L, 1_500_000L),
                Ebn0List.parse("1.5,1,-0.5,1.0").microDb());
    }

    @Test
    void rangeIncludesItsEndExactly() {
        // In floating point 0.1 added ten times is not 1.
        List<Long> values = Ebn0List.parse("0:0.1:1").microDb();
        assertEquals(11, values.size());
        assertEquals(1_000_000L, values.get(10));
        assertEquals(300_000L, values.get(3));
    }

    @Test
    void rangeStopsBelowAnEndThatTheStepDoesNotMeet() {
        assertEquals(List.of(1_000_000L, 1_700_000L), Ebn0List.parse("1:0.7:2").microDb());
    }

    @Test
    void listsAndRangesMix() {
        assertEquals(
                List.of(0L, 1_000_000L, 2_000_000L, 5_000_000L),
                Ebn0List.parse("5,0:1:2").microDb());
    }
}
