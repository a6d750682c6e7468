package dev.nearlimit.codes.family;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.CodeChecks;
import dev.nearlimit.codes.structure.QuasiCyclicStructure;
import java.io.IOException;
import java.io.InputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class Ieee80211nLdpcFamilyTest {
    private static Code build(int n, String rate) {
        return new Ieee80211nLdpcFamily().build(n + "," + rate);
    }

    private static int[][] shifts(Code code) {
        return code.structure(QuasiCyclicStructure.class).orElseThrow().shifts();
    }

    @ParameterizedTest
    // SHA-256 of the tables as they were cross-checked against independent generator matrices; see the README beside
    // them. Structural checks alone would not notice every altered shift.
    @CsvSource({
        "648,12,d72b77f7f77476707404bcc9d89ad99473c9b52fdf07d30de6671721a1c3b704",
        "648,23,b62b92a456a18dde9f4559d7c3a7cda3bc9b2edcda455b938a85058289df40f9",
        "648,34,d11223f287f279360f2c71c10881d4f883d4276b939fd5674225fc2243035714",
        "648,56,5c3a3c565dd5a897409e9fd29ca7c7430a770d69cd2dc5a4de2f47a5a0516dea",
        "1296,12,30aeefade5b0f2284422196ac5116e2f71057e8cb57dd2a8d9e339c5a4d10b39",
        "1296,23,cadaf6df0b45143aaa7062bfb5b697e2b7d1e044ddf67c01d0c45a887e022468",
        "1296,34,af6c8031b85165a4aa0f21d5d2483050b61a4bf3bf9446708f864be0f79eb938",
        "1296,56,39ed9f6c2d2ca4923b4b81d704cf79d33fadecbca452a8b54878d162a30ded29",
        "1944,12,fa62b91d018bf0fceff4515b1f98928847de5766c37ff08adbf5aced779cef62",
        "1944,23,2be418aff5ee29388b386615b97f0fafc65cb1e377d64fd3be159b9bfa123f00",
        "1944,34,b9d7f8540d08ae620a1163e1c9f64fef07b3b9b3530ffb9678f2cea77480a34f",
        "1944,56,3e25bf1b0e1fdf1250214b55f43125606d5c3adbc5c6b33c7c22bea36a9485eb",
    })
    void tablesAreUnaltered(int n, String rate, String digest) throws IOException, NoSuchAlgorithmException {
        String resource = "ieee80211n/n" + n + "-r" + rate + ".csv";
        try (InputStream stream = Ieee80211nLdpcFamily.class.getResourceAsStream(resource)) {
            byte[] bytes = stream.readAllBytes();
            assertEquals(
                    digest,
                    HexFormat.of()
                            .formatHex(MessageDigest.getInstance("SHA-256").digest(bytes)),
                    resource);
        }
    }

    @ParameterizedTest
    // Girth: 4 for three codes, a property of the standard's tables; block columns by degree. Both computed outside
    // this
    // code from independently checked copies of the tables.
    @CsvSource({
        "648,1/2,6,2:11 3:10 12:3",
        "648,2/3,6,2:7 3:8 4:5 6:1 8:3",
        "648,3/4,4,2:5 3:8 4:6 6:5",
        "648,5/6,6,2:3 3:2 4:19",
        "1296,1/2,6,2:11 3:9 4:1 11:3",
        "1296,2/3,4,2:7 3:12 7:2 8:3",
        "1296,3/4,6,2:5 3:12 6:7",
        "1296,5/6,6,2:3 3:5 4:16",
        "1944,1/2,6,2:11 3:9 4:1 11:3",
        "1944,2/3,4,2:7 3:12 6:1 8:4",
        "1944,3/4,6,2:5 3:13 6:6",
        "1944,5/6,6,2:3 3:11 4:10",
    })
    void codesAreSoundWithTheStatedGraph(int n, String rate, int girth, String degrees) {
        Code code = build(n, rate);
        int k = n * (rate.charAt(0) - '0') / (rate.charAt(2) - '0');
        CodeChecks.assertSound(code, n, k);
        assertEquals(0, code.redundantChecks());
        assertArrayEquals(IntStream.range(0, k).toArray(), code.informationPositions());
        int[][] shifts = shifts(code);
        assertEquals(girth == 4, hasFourCycles(shifts, n / 24), "4-cycles");
        Map<Integer, Integer> histogram = new TreeMap<>();
        for (int column = 0; column < 24; column++) {
            int degree = 0;
            for (int[] row : shifts) {
                degree += row[column] >= 0 ? 1 : 0;
            }
            histogram.merge(degree, 1, Integer::sum);
        }
        assertEquals(
                degrees,
                histogram.entrySet().stream()
                        .map(entry -> entry.getKey() + ":" + entry.getValue())
                        .collect(Collectors.joining(" ")));
    }

    @ParameterizedTest
    @CsvSource({
        "648,1/2",
        "648,2/3",
        "648,3/4",
        "648,5/6",
        "1296,1/2",
        "1296,2/3",
        "1296,3/4",
        "1296,5/6",
        "1944,1/2",
        "1944,2/3",
        "1944,3/4",
        "1944,5/6",
    })
    void parityPartIsDualDiagonal(int n, String rate) {
        int[][] shifts = shifts(build(n, rate));
        int m = shifts.length;
        int first = 24 - m;
        // First parity block column: shifts 1, 0, 1 at top, middle and bottom; then a staircase of zero shifts.
        int ones = 0;
        for (int row = 0; row < m; row++) {
            int expected = row == 0 || row == m - 1 ? 1 : 0;
            if (shifts[row][first] >= 0) {
                ones++;
                assertEquals(expected, shifts[row][first], "row " + row);
            }
            for (int column = first + 1; column < 24; column++) {
                boolean onStair = row == column - first - 1 || row == column - first;
                assertEquals(onStair ? 0 : -1, shifts[row][column], "row " + row + " column " + column);
            }
        }
        assertEquals(3, ones);
        assertTrue(shifts[0][first] == 1 && shifts[m - 1][first] == 1);
    }

    /** Two rows of blocks that meet twice at the same difference of shifts close cycles of length 4. */
    private static boolean hasFourCycles(int[][] shifts, int z) {
        for (int a = 0; a < shifts.length; a++) {
            for (int b = a + 1; b < shifts.length; b++) {
                boolean[] seen = new boolean[z];
                for (int column = 0; column < 24; column++) {
                    if (shifts[a][column] >= 0 && shifts[b][column] >= 0) {
                        int difference = Math.floorMod(shifts[a][column] - shifts[b][column], z);
                        if (seen[difference]) {
                            return true;
                        }
                        seen[difference] = true;
                    }
                }
            }
        }
        return false;
    }
}
