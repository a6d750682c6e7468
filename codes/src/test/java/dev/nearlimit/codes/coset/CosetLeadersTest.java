package dev.nearlimit.codes.coset;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CosetLeadersTest {
    /** Every pattern of n bits is compared with the leader of its syndrome: none is lighter, none as light and lesser. */
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void leadersAreTheLeastOfAllPatterns(long seed) {
        Random random = new Random(seed);
        int n = 6 + random.nextInt(6);
        BitMatrix H = new BitMatrix(2 + random.nextInt(5), n);
        for (int r = 0; r < H.rows(); r++) {
            for (int c = 0; c < n; c++) {
                H.set(r, c, random.nextBoolean());
            }
        }
        CosetLeaders leaders = CosetLeaders.of(Code.ofParityCheck("test", "test", SparseBitMatrix.of(H)));
        int[][] least = new int[1 << leaders.syndromeBits()][];
        for (int pattern = 0; pattern < 1 << n; pattern++) {
            int[] positions = positions(pattern);
            int syndrome = syndrome(leaders, pattern);
            if (least[syndrome] == null || before(positions, least[syndrome])) {
                least[syndrome] = positions;
            }
        }
        long[] counts = new long[n + 1];
        for (int syndrome = 0; syndrome < least.length; syndrome++) {
            String where = "seed " + seed + " syndrome " + syndrome;
            assertArrayEquals(least[syndrome], leaders.positions(syndrome), where);
            assertEquals(least[syndrome].length, leaders.weight(syndrome), where);
            counts[least[syndrome].length]++;
            long[] bits = new long[n];
            leaders.addLeader(syndrome, 1L << 5, bits);
            for (int c = 0; c < n; c++) {
                int column = c;
                boolean isIn = Arrays.stream(least[syndrome]).anyMatch(x -> x == column);
                assertEquals(isIn ? 1L << 5 : 0, bits[c], where);
            }
        }
        assertArrayEquals(Arrays.copyOf(counts, leaders.coveringRadius() + 1), leaders.countsByWeight());
    }

    private static int[] positions(int pattern) {
        return java.util.stream.IntStream.range(0, 31)
                .filter(i -> (pattern >> i & 1) != 0)
                .toArray();
    }

    private static int syndrome(CosetLeaders leaders, int pattern) {
        long[] bits = new long[leaders.syndromeMatrix().columns()];
        for (int i = 0; i < bits.length; i++) {
            bits[i] = pattern >> i & 1;
        }
        long[] words = new long[leaders.syndromeBits()];
        leaders.syndromeMatrix().multiplyBatch(bits, words);
        int syndrome = 0;
        for (int r = 0; r < words.length; r++) {
            syndrome |= (int) words[r] << r;
        }
        return syndrome;
    }

    private static boolean before(int[] a, int[] b) {
        return a.length != b.length ? a.length < b.length : Arrays.compare(a, b) < 0;
    }

    /**
     * Perfect codes have one leader for each pattern of up to t errors (Golay 1949, Hamming 1950); (24,12) has 1771
     * cosets with leaders of weight 4 besides (MacWilliams and Sloane 1977, ch. 2 sec. 6); the (15,7) BCH code has
     * covering radius 3 (quasi-perfect, Gorenstein, Peterson and Zierler 1960), so 256 - 1 - 15 - 105 of weight 3.
     */
    @ParameterizedTest
    @CsvSource({
        "'hamming:7,4', '1,7'",
        "'hamming:15,11', '1,15'",
        "'golay:23,12', '1,23,253,1771'",
        "'golay:24,12', '1,24,276,2024,1771'",
        "'bch:15,7', '1,15,105,135'",
        "'repetition:5', '1,5,10'"
    })
    void countsOfWellKnownCodes(String designator, String counts) {
        long[] expected =
                Arrays.stream(counts.split(",")).mapToLong(Long::parseLong).toArray();
        CosetLeaders leaders = CosetLeaders.of(Catalogue.standard().build(designator));
        assertArrayEquals(expected, leaders.countsByWeight());
        assertEquals(expected.length - 1, leaders.coveringRadius());
    }

    @Test
    void refusesTablesThatWouldNotFit() {
        Code code = Catalogue.standard().build("bch:63,36");
        assertEquals(
                "code bch:63,36: a table of its 2^27 coset leaders is too large; n-k may be at most 22",
                assertThrows(InvalidCodeException.class, () -> CosetLeaders.of(code))
                        .getMessage());
    }
}
