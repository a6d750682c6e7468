package dev.nearlimit.codes.family;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.CodeChecks;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class SimpleFamiliesTest {
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 7, 16, 63, 64, 65, 129, 1000})
    void repetitionAndParityCheckAreEachOthersDuals(int n) {
        Code repetition = new RepetitionFamily().build(Integer.toString(n));
        CodeChecks.assertSound(repetition, n, 1);
        assertEquals(n, repetition.knownDistance().orElseThrow().value());
        Code parity = new ParityCheckFamily().build(Integer.toString(n));
        CodeChecks.assertSound(parity, n, n - 1);
        assertEquals(2, parity.knownDistance().orElseThrow().value());
        assertEquals(repetition.generator(), parity.parityCheck().toDense());
        assertInformationFirst(repetition);
        assertInformationFirst(parity);
    }

    static IntStream checks() {
        return IntStream.rangeClosed(2, 7);
    }

    @ParameterizedTest
    @MethodSource("checks")
    void everyHammingCodeOfFewChecksIsSound(int m) {
        int longest = (1 << m) - 1;
        for (int n = m + 1; n <= longest; n++) {
            Code code = new HammingFamily().build(n + "," + (n - m));
            CodeChecks.assertSound(code, n, n - m);
            assertInformationFirst(code);
            assertEquals(3, code.knownDistance().orElseThrow().value());
            Code extended = new ExtendedHammingFamily().build(n + 1 + "," + (n - m));
            CodeChecks.assertSound(extended, n + 1, n - m);
            assertInformationFirst(extended);
            assertEquals(4, extended.knownDistance().orElseThrow().value());
            if (n - m <= 11) {
                assertEquals(3, CodeChecks.minimumDistance(code), code.designator());
                assertEquals(4, CodeChecks.minimumDistance(extended), extended.designator());
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"8,255,247", "10,1023,1013", "12,2100,2088"})
    void longHammingCodesAreSound(int m, int n, int k) {
        CodeChecks.assertSound(new HammingFamily().build(n + "," + k), n, n - m);
    }

    @Test
    void hammingEnumeratorsAreThePublished() {
        // (7,4): MacWilliams and Sloane 1977, ch. 1; (15,11): by the recurrence of ch. 5 (common practice).
        assertEquals("0:1 3:7 4:7 7:1", CodeChecks.enumerator(new HammingFamily().build("7,4")));
        assertEquals("0:1 4:14 8:1", CodeChecks.enumerator(new ExtendedHammingFamily().build("8,4")));
        assertEquals(
                "0:1 3:35 4:105 5:168 6:280 7:435 8:435 9:280 10:168 11:105 12:35 15:1",
                CodeChecks.enumerator(new HammingFamily().build("15,11")));
    }

    @Test
    void golayCodesHaveThePublishedEnumerators() {
        // MacWilliams and Sloane 1977, ch. 2 sec. 6.
        Code perfect = new GolayFamily().build("23,12");
        CodeChecks.assertSound(perfect, 23, 12);
        assertInformationFirst(perfect);
        assertEquals("0:1 7:253 8:506 11:1288 12:1288 15:506 16:253 23:1", CodeChecks.enumerator(perfect));
        assertEquals(7, perfect.knownDistance().orElseThrow().value());
        Code extended = new GolayFamily().build("24,12");
        CodeChecks.assertSound(extended, 24, 12);
        assertInformationFirst(extended);
        assertEquals("0:1 8:759 12:2576 16:759 24:1", CodeChecks.enumerator(extended));
        assertEquals(8, extended.knownDistance().orElseThrow().value());
    }

    static IntStream variables() {
        return IntStream.rangeClosed(1, 8);
    }

    @ParameterizedTest
    @MethodSource("variables")
    void everyReedMullerCodeIsSound(int m) {
        int k = 0;
        int binomial = 1;
        for (int r = 0; r < m; r++) {
            k += binomial;
            binomial = binomial * (m - r) / (r + 1);
            Code code = new ReedMullerFamily().build(r + "," + m);
            CodeChecks.assertSound(code, 1 << m, k);
            assertEquals(1 << (m - r), code.knownDistance().orElseThrow().value());
            if (k <= 16) {
                assertEquals(1 << (m - r), CodeChecks.minimumDistance(code), code.designator());
            }
            for (int row = 0; row < code.parityCheck().rows(); row++) {
                // A monomial of degree d is 1 at 2^(m-d) points, and checks have d <= m-r-1.
                assertEquals(0, code.parityCheck().rowWeight(row) % (1 << (r + 1)), code.designator());
            }
        }
    }

    @ParameterizedTest
    // MacWilliams and Sloane 1977: first order ch. 13 sec. 3, second order ch. 15 sec. 2; (2,6) and (3,6) dimensions
    // there.
    @CsvSource({
        "'1,3',0:1 4:14 8:1",
        "'1,5',0:1 16:62 32:1",
        "'1,7',0:1 64:254 128:1",
        "'2,4',0:1 4:140 6:448 8:870 10:448 12:140 16:1",
        "'2,5',0:1 8:620 12:13888 16:36518 20:13888 24:620 32:1",
    })
    void reedMullerEnumeratorsAreThePublished(String parameters, String enumerator) {
        assertEquals(enumerator, CodeChecks.enumerator(new ReedMullerFamily().build(parameters)));
    }

    @Test
    void secondOrderReedMullerOfLength64HasThePublishedEnumerator() {
        // MacWilliams and Sloane 1977, ch. 15 sec. 2.
        assertEquals(
                "0:1 16:2604 24:291648 28:888832 32:1828134 36:888832 40:291648 48:2604 64:1",
                CodeChecks.enumerator(new ReedMullerFamily().build("2,6")));
    }

    private static void assertInformationFirst(Code code) {
        assertArrayEquals(IntStream.range(0, code.k()).toArray(), code.informationPositions(), code.designator());
    }
}
