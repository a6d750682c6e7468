package dev.nearlimit.testvectors.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;

class PublishedValueTest {
    @Test
    void absoluteToleranceIncludesItsEnds() {
        PublishedValue row = row("-1.207", ToleranceKind.ABSOLUTE, "0.002");
        assertTrue(row.compare(new BigDecimal("-1.205")).holds());
        assertTrue(row.compare(new BigDecimal("-1.209")).holds());
        assertFalse(row.compare(new BigDecimal("-1.2049999")).holds());
        assertFalse(row.compare(new BigDecimal("-1.2090001")).holds());
    }

    @Test
    void relativeToleranceScalesWithTheValue() {
        PublishedValue row = row("-200", ToleranceKind.RELATIVE, "0.01");
        assertTrue(row.compare(-202.0).holds());
        assertFalse(row.compare(-202.1).holds());
        assertFalse(row.compare(200).holds());
    }

    @Test
    void exactMeansEveryDigit() {
        PublishedValue row = row("15858705600596992", ToleranceKind.EXACT, "0");
        assertTrue(row.compare(new BigDecimal("15858705600596992")).holds());
        assertTrue(row.compare(new BigDecimal("15858705600596992.0")).holds());
        assertFalse(row.compare(new BigDecimal("15858705600596993")).holds());
    }

    @Test
    void whatIsNoNumberNeverAgrees() {
        PublishedValue row = row("1", ToleranceKind.ABSOLUTE, "1e9");
        assertFalse(row.compare(Double.NaN).holds());
        assertFalse(row.compare(Double.POSITIVE_INFINITY).holds());
    }

    @Test
    void saysBothValuesAndTheSource() {
        assertEquals(
                "X-1 (x.csv line 7), limit of AWGN, R=1/2: computed 0.6, published 0.5 dB (book; read), difference 0.1,"
                        + " allowed absolute 0.01",
                row("0.5", ToleranceKind.ABSOLUTE, "0.01")
                        .compare(new BigDecimal("0.6"))
                        .message());
    }

    private static PublishedValue row(String value, ToleranceKind kind, String tolerance) {
        return new PublishedValue(
                "x.csv",
                7,
                "X-1",
                "limit",
                "AWGN",
                "R=1/2",
                "",
                List.of(),
                "",
                new BigDecimal(value),
                "dB",
                kind,
                new BigDecimal(tolerance),
                "book",
                Basis.READ,
                "",
                Reach.API);
    }
}
