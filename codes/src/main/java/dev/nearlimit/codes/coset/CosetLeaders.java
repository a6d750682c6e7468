package dev.nearlimit.codes.coset;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;
import java.util.Optional;

/**
 * A leader of least weight for each of the 2^(n-k) cosets of a code (Slepian 1956, "A class of binary signaling
 * alphabets"). Where several patterns of a coset have the least weight, the leader is the one whose ascending list of
 * positions is lexicographically least. Immutable; may be shared by threads.
 *
 * <p>Syndromes are those of the first rows of the parity-check matrix that are independent of the rows before them: bit
 * r of a syndrome is the sum of row r of {@link #syndromeMatrix()}.
 *
 * <p>A leader without its last position is the leader of its own coset (otherwise a lighter or lesser pattern plus that
 * position would beat it), so the table keeps the last position alone: 2 bytes a coset, and a further 4 while it is
 * built. Patterns are visited by weight and, within a weight, in lexicographic order, so that the first to reach a coset
 * is its leader. Work: at most n steps a coset.
 */
public final class CosetLeaders {
    /** Most parity bits n-k for which a table is made: 4 million cosets. */
    public static final int MOST_SYNDROME_BITS = 22;

    private static final int MOST_POSITIONS = Character.MAX_VALUE;
    /** Steps that take about a second. */
    private static final long MOST_STEPS = 1L << 28;

    private final SparseBitMatrix syndromeMatrix;
    private final int[] syndromeOfPosition;
    /** Last position of each leader plus 1; 0 for the zero leader. */
    private final char[] lastPosition;

    private final long[] countsByWeight;

    private CosetLeaders(SparseBitMatrix syndromeMatrix) {
        this.syndromeMatrix = syndromeMatrix;
        this.syndromeOfPosition = syndromesOfPositions(syndromeMatrix);
        int cosets = 1 << syndromeMatrix.rows();
        this.lastPosition = new char[cosets];
        this.countsByWeight = fill(cosets);
    }

    /** Why a code has no table, as a clause for users; empty if it has one. */
    public static Optional<String> objection(Code code) {
        int parity = code.n() - code.k();
        if (parity > MOST_SYNDROME_BITS) {
            return Optional.of("a table of its 2^" + parity + " coset leaders is too large; n-k may be at most "
                    + MOST_SYNDROME_BITS);
        }
        if (code.n() > MOST_POSITIONS || ((long) code.n() << parity) > MOST_STEPS) {
            return Optional.of("finding its 2^" + parity + " coset leaders among " + code.n()
                    + " positions takes too long; n * 2^(n-k) may be at most 2^28 and n " + MOST_POSITIONS);
        }
        return Optional.empty();
    }

    /**
     * Makes the table of a code.
     *
     * @throws InvalidCodeException if it would be too large; says how large
     */
    public static CosetLeaders of(Code code) {
        objection(code).ifPresent(reason -> {
            throw new InvalidCodeException("code " + code.designator() + ": " + reason);
        });
        return new CosetLeaders(independentRows(code.parityCheck()));
    }

    private static SparseBitMatrix independentRows(SparseBitMatrix matrix) {
        // Columns of the transpose that become pivots from the first on are the rows independent of those before them.
        int[] rows = Elimination.fromFirstColumn(matrix.transpose().toDense()).pivots();
        Arrays.sort(rows);
        return SparseBitMatrix.ofRows(
                matrix.columns(), Arrays.stream(rows).mapToObj(matrix::row).toArray(int[][]::new));
    }

    private static int[] syndromesOfPositions(SparseBitMatrix matrix) {
        int[] syndromes = new int[matrix.columns()];
        for (int r = 0; r < matrix.rows(); r++) {
            for (int i = 0; i < matrix.rowWeight(r); i++) {
                syndromes[matrix.column(r, i)] |= 1 << r;
            }
        }
        return syndromes;
    }

    private long[] fill(int cosets) {
        int n = syndromeOfPosition.length;
        int[] found = new int[cosets];
        int count = 1;
        int levelStart = 0;
        long[] counts = new long[n + 1];
        counts[0] = 1;
        int weight = 0;
        while (count < cosets) {
            int levelEnd = count;
            weight++;
            for (int i = levelStart; i < levelEnd && count < cosets; i++) {
                for (int position = lastPosition[found[i]]; position < n; position++) {
                    int syndrome = found[i] ^ syndromeOfPosition[position];
                    if (syndrome != 0 && lastPosition[syndrome] == 0) {
                        lastPosition[syndrome] = (char) (position + 1);
                        found[count++] = syndrome;
                    }
                }
            }
            counts[weight] = (long) count - levelEnd;
            levelStart = levelEnd;
        }
        return Arrays.copyOf(counts, weight + 1);
    }

    /** Bits of a syndrome, n-k. */
    public int syndromeBits() {
        return syndromeMatrix.rows();
    }

    /** The (n-k) x n matrix of independent parity checks that syndromes refer to. */
    public SparseBitMatrix syndromeMatrix() {
        return syndromeMatrix;
    }

    /** Weight of the heaviest leader: no word is further from the code. */
    public int coveringRadius() {
        return countsByWeight.length - 1;
    }

    /** Number of cosets whose leader has weight w, at index w = 0 .. {@link #coveringRadius()}; a copy. */
    public long[] countsByWeight() {
        return countsByWeight.clone();
    }

    /** Weight of the leader of a syndrome. */
    public int weight(int syndrome) {
        int weight = 0;
        for (int rest = syndrome; rest != 0; rest = withoutLast(rest)) {
            weight++;
        }
        return weight;
    }

    /** Ascending positions of the leader of a syndrome. */
    public int[] positions(int syndrome) {
        int[] positions = new int[weight(syndrome)];
        int rest = syndrome;
        for (int i = positions.length - 1; i >= 0; i--) {
            positions[i] = lastPosition[rest] - 1;
            rest = withoutLast(rest);
        }
        return positions;
    }

    /**
     * Adds the leader of a syndrome to some frames of a batch; allocates nothing.
     *
     * @param lanes the frames, one bit each
     * @param bits n words, changed
     */
    public void addLeader(int syndrome, long lanes, long[] bits) {
        for (int rest = syndrome; rest != 0; rest = withoutLast(rest)) {
            bits[lastPosition[rest] - 1] ^= lanes;
        }
    }

    /** The syndrome of a leader without its last position. */
    private int withoutLast(int syndrome) {
        return syndrome ^ syndromeOfPosition[lastPosition[syndrome] - 1];
    }
}
