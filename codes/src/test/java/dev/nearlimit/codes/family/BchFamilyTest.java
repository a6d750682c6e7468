package dev.nearlimit.codes.family;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.CodeChecks;
import dev.nearlimit.codes.KnownDistance;
import dev.nearlimit.codes.field.BinaryField;
import dev.nearlimit.codes.field.BinaryPolynomial;
import dev.nearlimit.codes.structure.BchStructure;
import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class BchFamilyTest {
    static IntStream degrees() {
        return IntStream.rangeClosed(3, 8);
    }

    @ParameterizedTest
    @MethodSource("degrees")
    void everyCodeIsSoundPlainAndExtended(int m) {
        for (BchGenerator generator : BchGenerator.allOfDegree(m)) {
            int n = generator.n();
            int k = generator.k();
            Code code = new BchFamily().build(n + "," + k);
            CodeChecks.assertSound(code, n, k);
            assertArrayEquals(IntStream.range(0, k).toArray(), code.informationPositions(), code.designator());
            assertEquals(
                    new BchStructure(m, BinaryField.ofDegree(m).polynomial(), generator.t(), false, 0),
                    code.structure(BchStructure.class).orElseThrow());
            Code extended = new ExtendedBchFamily().build(n + 1 + "," + k);
            CodeChecks.assertSound(extended, n + 1, k);
            assertArrayEquals(IntStream.range(0, k).toArray(), extended.informationPositions(), code.designator());
            assertTrue(extended.structure(BchStructure.class).orElseThrow().extended());
        }
    }

    @ParameterizedTest
    // k and t for n up to 255: Lin and Costello, Error Control Coding, 2nd ed. 2004, Appendix C (common practice), with
    // the repetition code, which the table leaves out, as last entry.
    @CsvSource({
        "3,4 1",
        "4,11 7 5 1",
        "5,26 21 16 11 6 1",
        "6,57 51 45 39 36 30 24 18 16 10 7 1",
        "7,120 113 106 99 92 85 78 71 64 57 50 43 36 29 22 15 8 1",
        "8,247 239 231 223 215 207 199 191 187 179 171 163 155 147 139 131 123 115 107 99 91 87 79 71 63 55 47 45 37 29"
                + " 21 13 9 1",
    })
    void dimensionsAreThePublished(int m, String dimensions) {
        assertArrayEquals(
                Arrays.stream(dimensions.split(" ")).mapToInt(Integer::parseInt).toArray(),
                BchGenerator.allOfDegree(m).stream().mapToInt(BchGenerator::k).toArray());
    }

    @ParameterizedTest
    // Errors corrected: the same table.
    @CsvSource({
        "4,1 2 3 7",
        "5,1 2 3 5 7 15",
        "6,1 2 3 4 5 6 7 10 11 13 15 31",
        "7,1 2 3 4 5 6 7 9 10 11 13 14 15 21 23 27 31 63",
        "8,1 2 3 4 5 6 7 8 9 10 11 12 13 14 15 18 19 21 22 23 25 26 27 29 30 31 42 43 45 47 55 59 63 127",
    })
    void errorsCorrectedAreThePublished(int m, String errors) {
        assertArrayEquals(
                Arrays.stream(errors.split(" ")).mapToInt(Integer::parseInt).toArray(),
                BchGenerator.allOfDegree(m).stream().mapToInt(BchGenerator::t).toArray());
    }

    @ParameterizedTest
    // Octal generator polynomials: the same table, from memory.
    @CsvSource({
        "3,4,13",
        "4,11,23",
        "4,7,721",
        "4,5,2467",
        "5,26,45",
        "5,21,3551",
        "5,16,107657",
        "5,11,5423325",
        "5,6,313365047",
        "6,57,103",
        "6,51,12471",
        "6,45,1701317",
        "6,39,166623567",
        "6,36,1033500423",
        "7,120,211",
        "7,113,41567",
        "7,106,11554743",
        "8,247,435",
        "8,239,267543",
        "8,231,156720665",
    })
    void generatorPolynomialsAreThePublished(int m, int k, String octal) {
        BchGenerator code = BchGenerator.allOfDegree(m).stream()
                .filter(candidate -> candidate.k() == k)
                .findFirst()
                .orElseThrow();
        assertEquals(Long.parseLong(octal, 8), code.generator().toLong());
    }

    @ParameterizedTest
    @MethodSource("degrees")
    void zerosAreAsStatedAndNoMore(int m) {
        BinaryField field = BinaryField.ofDegree(m);
        for (BchGenerator code : BchGenerator.allOfDegree(m)) {
            assertTrue(
                    BinaryPolynomial.ofExponents(code.n(), 0)
                            .remainder(code.generator())
                            .isZero(),
                    "g divides x^n + 1: " + code);
            for (int exponent = 1; exponent <= 2 * code.t(); exponent++) {
                assertEquals(0, field.evaluate(code.generator(), field.alpha(exponent)), code + " at " + exponent);
            }
            assertNotEquals(0, field.evaluate(code.generator(), field.alpha(2 * code.t() + 1)), code.toString());
        }
    }

    @ParameterizedTest
    @MethodSource("degrees")
    void wordsVanishAtTheZerosWithPositionsAsTheStructureSays(int m) {
        BinaryField field = BinaryField.ofDegree(m);
        for (BchGenerator code : BchGenerator.allOfDegree(m)) {
            Code built = new BchFamily().build(code.n() + "," + code.k());
            for (int row = 0; row < code.k(); row++) {
                for (int exponent = 1; exponent <= 2 * code.t(); exponent += 2) {
                    int value = 0;
                    for (int position : built.generator().onesOfRow(row)) {
                        value ^= field.alpha(exponent * (code.n() - 1 - position));
                    }
                    assertEquals(0, value, built + " row " + row + " at alpha^" + exponent);
                }
            }
        }
    }

    @ParameterizedTest
    // Complete enumerators, computed by exhaustive enumeration independent of this code.
    @CsvSource({
        "'15,5',0:1 7:15 8:15 15:1",
        "'31,11',0:1 11:186 12:310 15:527 16:527 19:310 20:186 31:1",
        "'31,16',0:1 7:155 8:465 11:5208 12:8680 15:18259 16:18259 19:8680 20:5208 23:465 24:155 31:1",
    })
    void enumeratorsAreTheComputed(String parameters, String enumerator) {
        assertEquals(enumerator, CodeChecks.enumerator(new BchFamily().build(parameters)));
    }

    @ParameterizedTest
    @MethodSource("degrees")
    void knownDistancesAreTheMinimaOfSmallCodes(int m) {
        int checked = 0;
        for (BchGenerator generator : BchGenerator.allOfDegree(m)) {
            if (generator.k() > 18) {
                continue;
            }
            Code code = new BchFamily().build(generator.n() + "," + generator.k());
            Code extended = new ExtendedBchFamily().build(generator.n() + 1 + "," + generator.k());
            if (code.knownDistance().isPresent()) {
                assertEquals(
                        CodeChecks.minimumDistance(code),
                        code.knownDistance().orElseThrow().value(),
                        code.toString());
                assertEquals(
                        CodeChecks.minimumDistance(extended),
                        extended.knownDistance().orElseThrow().value(),
                        extended.toString());
                checked++;
            }
        }
        assertTrue(checked > 0, "no code of degree " + m + " was checked");
    }

    @ParameterizedTest
    // True minimum distances: MacWilliams and Sloane 1977, ch. 9, Fig. 9.1 and Lin and Costello 2004, Appendix C, each
    // confirmed by a word of that weight found outside this code. bch:127,43 has 31 although its designed distance is
    // 29.
    @CsvSource({
        "63,57,3",
        "63,51,5",
        "63,39,9",
        "63,24,15",
        "127,120,3",
        "127,113,5",
        "127,99,9",
        "127,78,15",
        "127,43,31",
        "127,8,63",
        "255,239,5",
        "255,223,9",
        "255,199,15",
        "255,139,31",
        "255,47,85",
    })
    void knownDistancesAgreeWithThePublished(int n, int k, int distance) {
        new BchFamily()
                .build(n + "," + k)
                .knownDistance()
                .map(KnownDistance::value)
                .ifPresent(known -> assertEquals(distance, known));
    }

    @ParameterizedTest
    @CsvSource({"63,51,5", "127,113,5", "255,239,5", "255,223,9", "255,191,17", "127,106,7", "255,47,85", "63,45,7"})
    void distancesThatATheoremGivesAreAttached(int n, int k, int distance) {
        assertEquals(
                distance,
                new BchFamily().build(n + "," + k).knownDistance().orElseThrow().value());
    }
}
