package dev.nearlimit.algebra.graph;

import static org.junit.jupiter.api.Assertions.assertEquals;

import dev.nearlimit.algebra.SmallCodes;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TannerGraphTest {

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 23, 24})
    void girthAgreesWithNaiveCycleSearch(long seed) {
        Random random = new Random(seed);
        int m = 2 + random.nextInt(7);
        int n = 2 + random.nextInt(9);
        // few edges, so that long cycles and forests occur too
        BitMatrix H = new BitMatrix(m, n);
        int edges = n + m - 3 + random.nextInt(6);
        for (int e = 0; e < edges; e++) {
            H.set(random.nextInt(m), random.nextInt(n), true);
        }
        TannerGraph graph = TannerGraph.of(SparseBitMatrix.of(H));
        assertEquals(NaiveCycles.girth(H), graph.girth(), "seed " + seed + "\n" + H);
        assertEquals(NaiveCycles.fourCycles(H), graph.fourCycles(), "seed " + seed + "\n" + H);
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void fourCyclesOfDenseMatrices(long seed) {
        Random random = new Random(seed);
        BitMatrix H = new BitMatrix(12, 90);
        for (int r = 0; r < H.rows(); r++) {
            for (int c = 0; c < H.columns(); c++) {
                H.set(r, c, random.nextBoolean());
            }
        }
        TannerGraph graph = TannerGraph.of(SparseBitMatrix.of(H));
        assertEquals(NaiveCycles.fourCycles(H), graph.fourCycles(), "seed " + seed);
        assertEquals(OptionalInt.of(4), graph.girth(), "seed " + seed);
    }

    /** One cycle through m checks and m bits has length 2 m. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 7, 30})
    void ringsHaveTheGirthOfTheirLength(int m) {
        BitMatrix H = new BitMatrix(m, m);
        for (int i = 0; i < m; i++) {
            H.set(i, i, true);
            H.set(i, (i + 1) % m, true);
        }
        assertEquals(
                OptionalInt.of(2 * m), TannerGraph.of(SparseBitMatrix.of(H)).girth());
    }

    /** Two points lie on one line: the incidence graph of a projective plane has girth 6 and q + 1 edges a node. */
    @Test
    void projectivePlaneOfOrder2() {
        int[][] lines = {{0, 1, 3}, {1, 2, 4}, {2, 3, 5}, {3, 4, 6}, {4, 5, 0}, {5, 6, 1}, {6, 0, 2}};
        TannerGraph graph = TannerGraph.of(SparseBitMatrix.ofRows(7, lines));
        assertEquals(OptionalInt.of(6), graph.girth());
        assertEquals(0, graph.fourCycles());
        assertEquals(21, graph.edges());
        assertEquals(7, graph.bits());
        assertEquals(7, graph.checks());
        assertEquals(Map.of(3, 7), graph.bitDegrees());
        assertEquals(Map.of(3, 7), graph.checkDegrees());
    }

    @Test
    void degreesOfHammingCode() {
        TannerGraph graph = TannerGraph.of(SmallCodes.hamming(3).parityCheck());
        assertEquals(Map.of(1, 3, 2, 3, 3, 1), graph.bitDegrees());
        assertEquals(Map.of(4, 3), graph.checkDegrees());
    }

    /** Circulants with shifts i j (mod p), p prime: array codes have girth 6 for column weight 3 (J. L. Fan, 2000). */
    @Test
    void quasiCyclicMatrixOfThousandsOfBits() {
        int p = 199;
        int[][] rows = new int[3 * p][10];
        for (int i = 0; i < 3; i++) {
            for (int r = 0; r < p; r++) {
                for (int j = 0; j < 10; j++) {
                    rows[i * p + r][j] = j * p + (r + i * j) % p;
                }
            }
        }
        TannerGraph graph = TannerGraph.of(SparseBitMatrix.ofRows(10 * p, rows));
        assertEquals(OptionalInt.of(6), graph.girth());
        assertEquals(0, graph.fourCycles());
    }
}
