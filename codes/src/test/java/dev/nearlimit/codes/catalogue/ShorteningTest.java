package dev.nearlimit.codes.catalogue;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.CodeChecks;
import dev.nearlimit.codes.field.BinaryField;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.codes.structure.QuasiCyclicStructure;
import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ShorteningTest {
    private static Code build(String designator) {
        return Catalogue.standard().build(designator);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "parity-check:8+shorten=3",
                "hamming:15,11+shorten=1",
                "hamming:15,11+shorten=10",
                "golay:24,12+shorten=5",
                "reed-muller:2,5+shorten=7",
                "ldpc-802.11n:648,5/6+shorten=100",
            })
    void wordsAreTheMothersWithTheLastInformationBitsZero(String designator) {
        Code code = build(designator);
        Code mother = build(designator.substring(0, designator.indexOf('+')));
        int s = Integer.parseInt(designator.substring(designator.indexOf('=') + 1));
        CodeChecks.assertSound(code, mother.n() - s, mother.k() - s);
        assertEquals(designator, code.designator());
        assertTrue(code.knownDistance().isEmpty());
        assertEquals(mother.redundantChecks(), code.redundantChecks());
        int[] positions = mother.informationPositions();
        int[] left = Arrays.copyOfRange(positions, mother.k() - s, mother.k());
        Arrays.sort(left);
        int[] kept = IntStream.range(0, mother.n())
                .filter(position -> Arrays.binarySearch(left, position) < 0)
                .toArray();
        long[] information = new java.util.Random(s).longs(mother.k()).toArray();
        Arrays.fill(information, mother.k() - s, mother.k(), 0);
        long[] whole = new long[mother.n()];
        mother.encoder().encode(information, whole);
        long[] sent = new long[code.n()];
        code.encoder().encode(Arrays.copyOf(information, code.k()), sent);
        assertArrayEquals(
                Arrays.stream(kept).mapToLong(position -> whole[position]).toArray(), sent);
    }

    @ParameterizedTest
    @CsvSource({
        "'bch:31,16+shorten=5',31,5",
        "'bch:127,64+shorten=63',127,63",
        "'bch-extended:64,45+shorten=20',63,20",
    })
    void shortenedBchWordsVanishAtTheZerosOfTheStructure(String designator, int cyclicLength, int shortened) {
        Code code = build(designator);
        BchStructure structure = code.structure(BchStructure.class).orElseThrow();
        assertEquals(shortened, structure.shortened());
        BinaryField field = BinaryField.ofPolynomial(structure.fieldPolynomial());
        int sent = cyclicLength - shortened;
        CodeChecks.assertSound(code, structure.extended() ? sent + 1 : sent, code.k());
        assertArrayEquals(IntStream.range(0, code.k()).toArray(), code.informationPositions());
        for (int row = 0; row < code.k(); row++) {
            for (int exponent = 1; exponent <= 2 * structure.t(); exponent++) {
                int value = 0;
                for (int position : code.generator().onesOfRow(row)) {
                    // Position j carries the coefficient of x^(2^m - 2 - shortened - j); the parity bit none.
                    value ^= position < sent ? field.alpha(exponent * (sent - 1 - position)) : 0;
                }
                assertEquals(0, value, designator + " row " + row + " at alpha^" + exponent);
            }
        }
    }

    @ParameterizedTest
    @CsvSource({"27,true", "81,true", "1,false", "26,false", "28,false"})
    void quasiCyclicStructureStaysWhereWholeBlocksAreLeftOut(int s, boolean stays) {
        Code code = build("ldpc-802.11n:648,1/2+shorten=" + s);
        assertEquals(stays, code.structure(QuasiCyclicStructure.class).isPresent());
        code.structure(QuasiCyclicStructure.class)
                .ifPresent(structure -> assertEquals(code.parityCheck(), structure.parityCheck()));
    }
}
