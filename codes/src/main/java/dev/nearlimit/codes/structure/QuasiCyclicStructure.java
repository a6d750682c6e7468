package dev.nearlimit.codes.structure;

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
    }
}
