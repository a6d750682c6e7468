package dev.nearlimit.cli.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.cli.failure.InputException;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class SweepTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "word=4..8 | word | 4 5 6 7 8",
                "step=0.25,0.5,1 | step | 0.25 0.5 1",
                "gain=-2..2:1.5 | gain | -2 -0.5 1",
                "gain=-0.2..0.2:0.1 | gain | -0.2 -0.1 0 0.1 0.2",
                "Word=8,6,8,4..5 | word | 8 6 4 5",
                "schedule=layered,FLOODING | schedule | layered flooding",
                "scale=5/8,6/8 | scale | 5/8 6/8",
                "iterations=10..100:45 | iterations | 10 55 100",
            })
    void valuesComeInOrder(String text, String setting, String values) {
        assertEquals(new Sweep(setting, List.of(values.split(" "))), Sweep.parse(text));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "word",
                "=4",
                "word=",
                "word=4,",
                "word=4..",
                "word=5..4",
                "word=4..8:0",
                "word=4..8:-1",
                "word=1..2..3",
                "gain=0..1:0.0001",
                "word=a..b"
            })
    void whatIsNoSweepIsRefused(String text) {
        assertThrows(InputException.class, () -> Sweep.parse(text));
    }
}
