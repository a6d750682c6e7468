package dev.nearlimit.algebra.distance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.algebra.weight.InfeasibleEnumerationException;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.algebra.weight.WeightEnumerator;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LightWordsTest {
    /** A_d of Golay, Hamming and Reed-Muller codes: common practice. */
    @ParameterizedTest
    @CsvSource({
        "'golay:24,12', 8, 759",
        "'golay:23,12', 7, 253",
        "'hamming:7,4', 3, 7",
        "'hamming:15,11', 3, 35",
        "'reed-muller:1,5', 16, 62",
        "'reed-muller:2,5', 8, 620",
        "'repetition:9', 9, 1",
        "'parity-check:8', 2, 28",
    })
    void listsTheWordsOfMinimumWeight(String designator, int weight, int count) {
        Code code = Catalogue.standard().build(designator);
        BitMatrix words = LightWords.lightest(code);
        assertEquals(count, words.rows());
        Set<String> seen = new HashSet<>();
        for (int r = 0; r < words.rows(); r++) {
            assertEquals(weight, words.rowWeight(r));
            assertTrue(seen.add(Arrays.toString(words.row(r))), "word " + r + " comes twice");
        }
        assertTrue(code.parityCheck().toDense().multiply(words.transpose()).isZero());
        assertTrue(words.paddingIsClear());
    }

    @ParameterizedTest
    @CsvSource({"'bch:31,16', 11", "'bch:63,18', 24", "'hamming:15,11', 5", "'reed-muller:2,4', 16"})
    void listsAsManyAsTheEnumeratorCounts(String designator, int heaviest) {
        Code code = Catalogue.standard().build(designator);
        WeightEnumerator enumerator = WeightEnumeration.exact(code);
        BitMatrix words = LightWords.upToWeight(code, heaviest);
        int row = 0;
        for (int w = 1; w <= heaviest && w <= code.n(); w++) {
            BigInteger count = BigInteger.ZERO;
            while (row < words.rows() && words.rowWeight(row) == w) {
                row++;
                count = count.add(BigInteger.ONE);
            }
            assertEquals(enumerator.count(w), count, designator + ", weight " + w);
        }
        assertEquals(words.rows(), row, "ordered by weight");
    }

    @Test
    void refusesWhatWouldNotEnd() {
        Code large = Catalogue.standard().build("bch:127,64");
        assertEquals(
                "bch:127,64 has 2^64 codewords; those of low weight are listed for up to 2^26",
                assertThrows(InfeasibleEnumerationException.class, () -> LightWords.lightest(large))
                        .getMessage());
        Code many = Catalogue.standard().build("parity-check:20");
        assertThrows(InfeasibleEnumerationException.class, () -> LightWords.upToWeight(many, 10));
        assertEquals(0, LightWords.upToWeight(many, 1).rows());
    }
}
