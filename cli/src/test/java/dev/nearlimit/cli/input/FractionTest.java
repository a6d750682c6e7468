package dev.nearlimit.cli.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.cli.failure.InputException;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class FractionTest {
    @ParameterizedTest
    @CsvSource({"1/2, 0.5", "324/648, 0.5", "0.5, 0.5", "1, 1", "1e-3, 0.001", "2.5e2, 250", ".25, 0.25", "0, 0"})
    void isRead(String text, double value) {
        assertEquals(value, Fraction.parse(text).value());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", ".", "1/0", "-1", "1/2/3", "NaN", "Infinity", "0x1", "1e", "e3", "1e999", "1.", "1 2", "half"
            })
    void isRefused(String text) {
        InputException e = assertThrows(InputException.class, () -> Fraction.parse(text));
        assertEquals(
                "'" + text + "' is no ratio; expected a fraction such as 1/2 or a number such as 0.5", e.getMessage());
    }
}
