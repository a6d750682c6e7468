package dev.nearlimit.cli.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class QuantitiesTest {
    @ParameterizedTest
    @CsvSource({"1.934, 1.93", "-0.814, \u22120.81", "-0.001, 0.00", "0, 0.00", "12.345678, 12.35"})
    void decibelsToAHundredth(double db, String expected) {
        assertEquals(expected, Quantities.decibels(db));
    }

    @ParameterizedTest
    @CsvSource({
        "0, 0",
        "1, 1",
        "0.5, 0.5",
        "0.01, 0.01",
        "0.0586, 0.059",
        "0.001, 10\u207b\u00b3",
        "0.00055, 5.5\u00d710\u207b\u2074",
        "0.0000996, 10\u207b\u2074",
        "3e-12, 3\u00d710\u207b\u00b9\u00b2"
    })
    void errorRatesToTwoDigits(double rate, String expected) {
        assertEquals(expected, Quantities.errorRate(rate));
    }

    @ParameterizedTest
    @CsvSource({"6520, 6.52 kHz", "3000, 3.00 kHz", "12345, 12.3 kHz", "622, 622 Hz", "2.5e6, 2.50 MHz", "1e9, 1.00 GHz"
    })
    void frequencies(double hz, String expected) {
        assertEquals(expected, Quantities.hertz(hz));
    }

    @ParameterizedTest
    @CsvSource({"12500, 12.5 kHz", "12512.5, 12.5125 kHz", "5000, 5 kHz", "300, 300 Hz", "100, 100 Hz"})
    void statedQuantitiesKeepTheirDigits(double hz, String expected) {
        assertEquals(expected, Quantities.stated(hz, "Hz"));
    }

    @ParameterizedTest
    @CsvSource({"0.0671, 67.1 ms", "2, 2 s", "0.00015, 150 \u00b5s", "3e-8, 30 ns", "0, 0 s"})
    void times(double s, String expected) {
        assertEquals(expected, Quantities.seconds(s));
    }

    @ParameterizedTest
    @CsvSource({"7.4, 7.4", "480.3, 480", "9999, 9999", "25395, 25\u202f395", "1234567, 1\u202f234\u202f567", "0, 0"})
    void threeDigitsAndThousandsApart(double value, String expected) {
        assertEquals(expected, Quantities.significant(value));
    }
}
