package dev.nearlimit.codes.catalogue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.codes.structure.GuaranteedDistance;
import dev.nearlimit.codes.structure.QuasiCyclicStructure;
import java.util.Arrays;
import java.util.Optional;

/**
 * Shortening: some information bits are fixed to 0 and not sent, so that n and k drop and the checks stay. They are the
 * last information positions, except in a BCH code, where they are the first, which carry the highest powers of x: what
 * is left is then again a polynomial of lower degree with the same zeros, as {@link BchStructure} says.
 *
 * <p>A minimum distance known of the mother code is only a lower bound of the shortened one, and attached as such.
 *
 * @param bits information bits left out, at least 0
 */
public record Shortening(int bits) {
    static final String KEY = "+shorten=";

    /** Reads what follows the parameters of a designator: nothing, or {@code +shorten=s}. */
    static Shortening parse(String suffixes) {
        if (suffixes.isEmpty()) {
            return new Shortening(0);
        }
        if (!suffixes.startsWith(KEY)) {
            throw new InvalidCodeException("unknown modification '" + suffixes + "', expected +shorten=s");
        }
        String count = suffixes.substring(KEY.length());
        if (!count.matches("[0-9]{1,9}")) {
            throw new InvalidCodeException(
                    "modification '" + suffixes + "', expected +shorten=s with s a whole number");
        }
        return new Shortening(Integer.parseInt(count));
    }

    /** The shortened code; the code itself where nothing is left out. */
    public Code applyTo(Code mother) {
        if (bits == 0) {
            return mother;
        }
        if (mother.k() == 1) {
            throw new InvalidCodeException(mother.designator() + KEY + bits
                    + ": the code has 1 information bit, which leaves none to leave out");
        }
        if (bits >= mother.k()) {
            throw new InvalidCodeException(mother.designator() + KEY + bits + ": the code has " + mother.k()
                    + " information bits, expected to leave out 1 .. " + (mother.k() - 1));
        }
        Code shortened = shorten(mother);
        return mother.guaranteedDistance() > 1
                ? shortened.withStructure(new GuaranteedDistance(mother.guaranteedDistance()))
                : shortened;
    }

    private Code shorten(Code mother) {
        Optional<BchStructure> bch = mother.structure(BchStructure.class);
        int firstKept = bch.isPresent() ? bits : 0;
        int[] columns = keptColumns(mother, firstKept);
        BitMatrix generator = mother.generator()
                .selectRows(firstKept, firstKept + mother.k() - bits)
                .selectColumns(columns);
        Code shortened = Code.ofGenerator(designator(mother), mother.source() + "; shortened", generator)
                .withParityCheck(selectColumns(mother.parityCheck(), columns));
        if (bch.isPresent()) {
            BchStructure whole = bch.get();
            return shortened.withStructure(new BchStructure(
                    whole.m(), whole.fieldPolynomial(), whole.t(), whole.extended(), whole.shortened() + bits));
        }
        return mother.structure(QuasiCyclicStructure.class)
                .flatMap(whole -> keptBlocks(whole, columns))
                .map(shortened::withStructure)
                .orElse(shortened);
    }

    /** A code that is shortened already is shortened by both counts together, which leaves out the same positions. */
    private String designator(Code mother) {
        String name = mother.designator();
        int suffix = name.indexOf(KEY);
        if (suffix < 0) {
            return name + KEY + bits;
        }
        return name.substring(0, suffix) + KEY + (parse(name.substring(suffix)).bits() + bits);
    }

    /** Every position but those of the information bits left out, ascending. */
    private int[] keptColumns(Code mother, int firstKept) {
        boolean[] dropped = new boolean[mother.n()];
        int[] positions = mother.informationPositions();
        for (int i = 0; i < positions.length; i++) {
            dropped[positions[i]] = i < firstKept || i >= firstKept + positions.length - bits;
        }
        int[] kept = new int[mother.n() - bits];
        int next = 0;
        for (int position = 0; position < dropped.length; position++) {
            if (!dropped[position]) {
                kept[next++] = position;
            }
        }
        return kept;
    }

    private static SparseBitMatrix selectColumns(SparseBitMatrix matrix, int[] columns) {
        SparseBitMatrix turned = matrix.transpose();
        int[][] kept = Arrays.stream(columns).mapToObj(turned::row).toArray(int[][]::new);
        return SparseBitMatrix.ofRows(matrix.rows(), kept).transpose();
    }

    /** The block columns that stay, if only whole ones were dropped. */
    private static Optional<QuasiCyclicStructure> keptBlocks(QuasiCyclicStructure whole, int[] columns) {
        int z = whole.liftingSize();
        if (columns.length % z != 0) {
            return Optional.empty();
        }
        int[] blocks = new int[columns.length / z];
        for (int i = 0; i < columns.length; i++) {
            int inBlock = i % z;
            if (columns[i] % z != inBlock || columns[i] - inBlock != columns[i - inBlock]) {
                return Optional.empty();
            }
            blocks[i / z] = columns[i] / z;
        }
        int[][] shifts = Arrays.stream(whole.shifts())
                .map(row -> Arrays.stream(blocks).map(block -> row[block]).toArray())
                .toArray(int[][]::new);
        return Optional.of(new QuasiCyclicStructure(z, shifts));
    }
}
