package dev.nearlimit.algebra.graph;

import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Collections;
import java.util.OptionalInt;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The Tanner graph of a parity-check matrix: a node for every bit (column) and every check (row), an edge for every 1
 * (R. M. Tanner, "A recursive approach to low complexity codes", IEEE Trans. Inform. Theory 27 (1981)). Immutable.
 */
public final class TannerGraph {
    private final SparseBitMatrix checks;
    private final SparseBitMatrix bits;

    private TannerGraph(SparseBitMatrix checks) {
        this.checks = checks;
        this.bits = checks.transpose();
    }

    /** The graph of an m x n parity-check matrix. */
    public static TannerGraph of(SparseBitMatrix parityCheck) {
        return new TannerGraph(parityCheck);
    }

    /** Number of bit nodes, n. */
    public int bits() {
        return bits.rows();
    }

    /** Number of check nodes, m. */
    public int checks() {
        return checks.rows();
    }

    /** Number of edges: ones in the matrix. */
    public int edges() {
        return checks.ones();
    }

    /** How many bits have each degree, ascending by degree. */
    public SortedMap<Integer, Integer> bitDegrees() {
        return degrees(bits);
    }

    /** How many checks have each degree, ascending by degree. */
    public SortedMap<Integer, Integer> checkDegrees() {
        return degrees(checks);
    }

    private static SortedMap<Integer, Integer> degrees(SparseBitMatrix nodes) {
        SortedMap<Integer, Integer> found = new TreeMap<>();
        for (int node = 0; node < nodes.rows(); node++) {
            found.merge(nodes.rowWeight(node), 1, Integer::sum);
        }
        return Collections.unmodifiableSortedMap(found);
    }

    /**
     * Length of the shortest cycle, an even number from 4 upwards; empty if the graph has no cycle.
     *
     * <p>A breadth-first search from every bit, cut off where it can no longer beat the best cycle known. Exact: every
     * cycle passes through a bit, and the search from a bit on a shortest cycle finds its length.
     */
    public OptionalInt girth() {
        return new GirthSearch(bits, checks).girth();
    }

    /**
     * Number of cycles of length 4: pairs of bits that share two checks, counted for every such pair of checks.
     *
     * <p>Work: the pairs of ones a column for sparse matrices, or the pairs of rows times the words a row for dense ones,
     * whichever is less.
     */
    public long fourCycles() {
        long pairsOfOnes = 0;
        for (int bit = 0; bit < bits.rows(); bit++) {
            for (int i = 0; i < bits.rowWeight(bit); i++) {
                pairsOfOnes += checks.rowWeight(bits.column(bit, i));
            }
        }
        long wordsOfRowPairs = (long) checks.rows() * checks.rows() / 2 * BitMatrix.wordsFor(checks.columns());
        return pairsOfOnes <= wordsOfRowPairs ? fourCyclesBySharing() : fourCyclesByOverlap(checks.toDense());
    }

    /** For every bit, how many checks each later bit shares with it: c shared checks make c (c - 1) / 2 cycles. */
    private long fourCyclesBySharing() {
        long cycles = 0;
        int[] shared = new int[bits.rows()];
        for (int bit = 0; bit < bits.rows(); bit++) {
            for (int i = 0; i < bits.rowWeight(bit); i++) {
                int check = bits.column(bit, i);
                for (int j = 0; j < checks.rowWeight(check); j++) {
                    int other = checks.column(check, j);
                    if (other > bit) {
                        cycles += shared[other]++;
                    }
                }
            }
            for (int i = 0; i < bits.rowWeight(bit); i++) {
                int check = bits.column(bit, i);
                for (int j = 0; j < checks.rowWeight(check); j++) {
                    shared[checks.column(check, j)] = 0;
                }
            }
        }
        return cycles;
    }

    private static long fourCyclesByOverlap(BitMatrix rows) {
        long cycles = 0;
        for (int a = 0; a < rows.rows(); a++) {
            long[] first = rows.row(a);
            for (int b = a + 1; b < rows.rows(); b++) {
                long overlap = 0;
                for (int w = 0; w < first.length; w++) {
                    overlap += Long.bitCount(first[w] & rows.word(b, w));
                }
                cycles += overlap * (overlap - 1) / 2;
            }
        }
        return cycles;
    }
}
