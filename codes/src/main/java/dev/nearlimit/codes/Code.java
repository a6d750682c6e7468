package dev.nearlimit.codes;

import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.Elimination;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.structure.GuaranteedDistance;
import dev.nearlimit.codes.structure.Structure;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * A binary linear block code: a set of 2^k codewords of n bits with a systematic encoder. Immutable.
 *
 * <p>Information bit i stands unchanged at {@code informationPositions()[i]} of every codeword, and the generator matrix
 * is in that form: its column at information position i is the i-th unit vector. The parity-check matrix is kept as it
 * was built or loaded, dependent rows included, because decoders work on its rows; k always comes from its true rank.
 */
public final class Code {
    private final String designator;
    private final String source;
    private final BitMatrix generator;
    private final SparseBitMatrix parityCheck;
    private final int[] informationPositions;
    private final KnownDistance knownDistance;
    private final List<Structure> structures;
    /** Null until somebody encodes: choosing it takes longer than building some codes. */
    private volatile Encoder encoder;

    private Code(
            String designator,
            String source,
            BitMatrix generator,
            SparseBitMatrix parityCheck,
            int[] informationPositions,
            Encoder encoder,
            KnownDistance knownDistance,
            List<Structure> structures) {
        this.designator = designator;
        this.source = source;
        this.generator = generator;
        this.parityCheck = parityCheck;
        this.informationPositions = informationPositions;
        this.encoder = encoder;
        this.knownDistance = knownDistance;
        this.structures = structures;
    }

    /**
     * The code whose words satisfy all rows of a parity-check matrix. Dependent rows are accepted. Information positions
     * are chosen as early as the matrix allows: parity is sought from the last column backwards.
     *
     * @param designator how users name the code
     * @param source where its definition comes from
     * @param parityCheck m x n
     * @throws InvalidCodeException if only the zero word satisfies the matrix, or it has no rows or columns
     */
    public static Code ofParityCheck(String designator, String source, SparseBitMatrix parityCheck) {
        if (parityCheck.rows() == 0 || parityCheck.columns() == 0) {
            throw new InvalidCodeException("the parity-check matrix of " + designator + " is empty");
        }
        Elimination reduced = Elimination.fromLastColumn(parityCheck.toDense());
        if (reduced.rank() == parityCheck.columns()) {
            throw new InvalidCodeException("the parity-check matrix of " + designator + " has rank " + reduced.rank()
                    + " = n, so that it admits only the zero word");
        }
        BitMatrix generator = reduced.nullSpace();
        int[] positions = reduced.freeColumns();
        return new Code(designator, source, generator, parityCheck, positions, null, null, List.of());
    }

    /**
     * The code spanned by the rows of a generator matrix. A matrix that already carries every information bit unchanged
     * at some position is used as it stands; any other is brought to that form, information positions as early as
     * possible (the code stays the same, the assignment of messages to words changes).
     *
     * @param generator k x n with independent rows
     * @throws InvalidCodeException if rows are dependent, or the matrix has no rows or columns
     */
    public static Code ofGenerator(String designator, String source, BitMatrix generator) {
        if (generator.rows() == 0 || generator.columns() == 0) {
            throw new InvalidCodeException("the generator matrix of " + designator + " is empty");
        }
        Elimination reduced = Elimination.fromFirstColumn(generator);
        if (reduced.rank() < generator.rows()) {
            throw new InvalidCodeException("the generator matrix of " + designator + " has " + generator.rows()
                    + " rows but rank " + reduced.rank() + ": its rows are dependent");
        }
        BitMatrix systematic = generator;
        int[] positions = unitColumns(generator);
        if (positions == null) {
            systematic = reduced.reduced();
            positions = reduced.pivots();
        }
        BitMatrix check = reduced.nullSpace();
        return new Code(
                designator,
                source,
                systematic.copy(),
                SparseBitMatrix.of(check),
                positions.clone(),
                null,
                null,
                List.of());
    }

    /** For each row the first column that is this row's unit vector; null if a row has none. */
    private static int[] unitColumns(BitMatrix generator) {
        int[] positions = new int[generator.rows()];
        Arrays.fill(positions, -1);
        BitMatrix columns = generator.transpose();
        for (int c = 0; c < columns.rows(); c++) {
            if (columns.rowWeight(c) == 1) {
                int row = columns.onesOfRow(c)[0];
                if (positions[row] < 0) {
                    positions[row] = c;
                }
            }
        }
        return Arrays.stream(positions).anyMatch(p -> p < 0) ? null : positions;
    }

    /** This code with a parity-check matrix better suited to decoding; it must define the same words. */
    public Code withParityCheck(SparseBitMatrix better) {
        if (better.columns() != n() || Elimination.rank(better.toDense()) != n() - k()) {
            throw new IllegalArgumentException("the matrix does not define " + designator);
        }
        if (!better.toDense().multiply(generator.transpose()).isZero()) {
            throw new IllegalArgumentException("the matrix rejects words of " + designator);
        }
        return new Code(
                designator, source, generator, better, informationPositions, encoder, knownDistance, structures);
    }

    /** This code with a faster encoder for the same mapping. */
    public Code withEncoder(Encoder faster) {
        return new Code(
                designator, source, generator, parityCheck, informationPositions, faster, knownDistance, structures);
    }

    /** This code with a minimum distance that is known without a search. */
    public Code withKnownDistance(int distance, String distanceSource) {
        return new Code(
                designator,
                source,
                generator,
                parityCheck,
                informationPositions,
                encoder,
                new KnownDistance(distance, distanceSource),
                structures);
    }

    /** This code with one more structure that decoders may ask for. */
    public Code withStructure(Structure structure) {
        List<Structure> more = new ArrayList<>(structures);
        more.add(structure);
        return new Code(
                designator,
                source,
                generator,
                parityCheck,
                informationPositions,
                encoder,
                knownDistance,
                List.copyOf(more));
    }

    /** How users name this code; reading it again gives this code again. */
    public String designator() {
        return designator;
    }

    /** Where the definition comes from: a standard with its table, a paper, or the user's file. */
    public String source() {
        return source;
    }

    /** Length: bits sent a codeword. */
    public int n() {
        return generator.columns();
    }

    /** Dimension: information bits a codeword. */
    public int k() {
        return generator.rows();
    }

    public Rate rate() {
        return new Rate(k(), n());
    }

    /** A copy of the k x n generator matrix, systematic at {@link #informationPositions()}. */
    public BitMatrix generator() {
        return generator.copy();
    }

    /** The m x n parity-check matrix as built or loaded. */
    public SparseBitMatrix parityCheck() {
        return parityCheck;
    }

    /** Rows of the parity-check matrix that depend on others: m minus its rank. */
    public int redundantChecks() {
        return parityCheck.rows() - (n() - k());
    }

    /** Position in the codeword of each information bit, a copy. */
    public int[] informationPositions() {
        return informationPositions.clone();
    }

    /** The encoder, made when it is first asked for: by whichever matrix takes fewer operations on words. */
    public Encoder encoder() {
        Encoder made = encoder;
        if (made == null) {
            // Two threads may both make one; they are equal.
            made = SystematicEncoder.of(generator, informationPositions, parityCheck);
            encoder = made;
        }
        return made;
    }

    /** The minimum distance where the family knows it; search belongs to the algebra room. */
    public Optional<KnownDistance> knownDistance() {
        return Optional.ofNullable(knownDistance);
    }

    /** A lower bound on the minimum distance that needs no search: the distance itself where it is known; else 1. */
    public int guaranteedDistance() {
        return knownDistance != null
                ? knownDistance.value()
                : structure(GuaranteedDistance.class)
                        .map(GuaranteedDistance::value)
                        .orElse(1);
    }

    /** The structure of the given kind, if this code has it. */
    public <S extends Structure> Optional<S> structure(Class<S> kind) {
        return structures.stream().filter(kind::isInstance).map(kind::cast).findFirst();
    }

    @Override
    public String toString() {
        return designator + " (" + n() + "," + k() + ")";
    }
}
