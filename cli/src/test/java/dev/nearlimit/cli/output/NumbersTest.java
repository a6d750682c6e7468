package dev.nearlimit.cli.output;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class NumbersTest {
    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "1, 1",
        "0.00123, 1.2e-3",
        "0.0999, 1.0e-1",
        "0.000995, 1.0e-3",
        "0.5, 5.0e-1",
        "3e-300, 3.0e-300",
        "NaN, -",
        "Infinity, -"
    })
    void errorRatesHaveTwoDigits(double value, String text) {
        assertEquals(text, Numbers.errorRate(value));
    }

    @ParameterizedTest
    @CsvSource({"-0.001, 0.00", "-1.995, -2.00", "0.187, 0.19", "NaN, -"})
    void levelsHaveHundredthsAndNoNegativeZero(double value, String text) {
        assertEquals(text, Numbers.db(value));
    }

    @ParameterizedTest
    @CsvSource({"1, 1.00", "1.5, 1.50", "1.125, 1.125", "-0.5, -0.50", "2.000001, 2.000001", "NaN, -"})
    void trimmedKeepsTwoDecimals(double value, String text) {
        assertEquals(text, Numbers.trimmed(value));
    }

    @ParameterizedTest
    @CsvSource({"7, 7", "123456789012345678, 123456789012345678", "1234567890123456789, 1.2346e18"})
    void countsAreWholeUpToEighteenDigits(BigInteger value, String text) {
        assertEquals(text, Numbers.count(value));
    }

    @ParameterizedTest
    @CsvSource({
        "0.5, 0.50",
        "12.34, 12.3",
        "999.4, 999",
        "999.6, 1.00 k",
        "1550, 1.55 k",
        "343210, 343 k",
        "2.5e10, 25.0 G"
    })
    void engineeringHasThreeDigits(double value, String text) {
        assertEquals(text, Numbers.engineering(value));
    }

    @ParameterizedTest
    @CsvSource({"0.84, 0.8 s", "42.4, 42 s", "59.7, 1 min 0 s", "185, 3 min 5 s", "7800, 2 h 10 min", "-1, -"})
    void durationsAreForPeople(double seconds, String text) {
        assertEquals(text, Numbers.duration(seconds));
    }

    /** Before JDK 19 Double.toString gives 2.0E-3 as 0.0020 and 2^-44 with a digit too many; this does not. */
    @Test
    void exactIsShortest() {
        assertEquals("2.0E-3".length(), Numbers.exact(2.0E-3).length() + 1);
        assertEquals("2.2E-322", Numbers.exact(2.2E-322));
        assertEquals("2.0E23", Numbers.exact(2.0E23));
    }
}
