package dev.nearlimit.codes.structure;

import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.Arrays;

/**
 * A parity-check matrix made of Z x Z blocks, each zero or a cyclic shift of the identity. Shift s puts the 1 of block
 * row i into block column {@code (i + s) mod Z}; -1 is the zero block.
 *
 * @param liftingSize Z, at least 1
 * @param shifts block rows x block columns of shifts, -1 .. Z-1
 */
public record QuasiCyclicStructure(int liftingSize, int[][] shifts) implements Structure {
    public QuasiCyclicStructure {
        if (liftingSize < 1) {
            throw new IllegalArgumentException("lifting size is " + liftingSize + ", must be at least 1");
        }
        shifts = Arrays.stream(shifts).map(int[]::clone).toArray(int[][]::new);
        for (int[] row : shifts) {
            if (row.length != shifts[0].length) {
                throw new IllegalArgumentException(
                        "a block row has " + row.length + " shifts, the first has " + shifts[0].length);
            }
            for (int shift : row) {
                if (shift < -1 || shift >= liftingSize) {
                    throw new IllegalArgumentException("shift is " + shift + ", must be -1 .. " + (liftingSize - 1));
                }
            }
        }
    }

    /** The (Z * block rows) x (Z * block columns) matrix that the shifts stand for. */
    public SparseBitMatrix parityCheck() {
        int blockColumns = shifts.length == 0 ? 0 : shifts[0].length;
        int[][] ones = new int[shifts.length * liftingSize][];
        for (int r = 0; r < ones.length; r++) {
            int[] row = shifts[r / liftingSize];
            int[] found = new int[blockColumns];
            int count = 0;
            for (int c = 0; c < blockColumns; c++) {
                if (row[c] >= 0) {
                    found[count++] = c * liftingSize + (r % liftingSize + row[c]) % liftingSize;
                }
            }
            ones[r] = Arrays.copyOf(found, count);
        }
        return SparseBitMatrix.ofRows(blockColumns * liftingSize, ones);
    }
}
