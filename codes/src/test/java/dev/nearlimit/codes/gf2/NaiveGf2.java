package dev.nearlimit.codes.gf2;

import java.util.Random;

/** Linear algebra over GF(2) with one boolean an entry: slow, and meant to be obviously right. */
final class NaiveGf2 {
    private NaiveGf2() {}

    static boolean[][] random(int rows, int columns, double density, Random random) {
        boolean[][] matrix = new boolean[rows][columns];
        for (boolean[] row : matrix) {
            for (int c = 0; c < columns; c++) {
                row[c] = random.nextDouble() < density;
            }
        }
        return matrix;
    }

    static BitMatrix packed(boolean[][] matrix, int columns) {
        BitMatrix packed = new BitMatrix(matrix.length, columns);
        for (int r = 0; r < matrix.length; r++) {
            for (int c = 0; c < columns; c++) {
                packed.set(r, c, matrix[r][c]);
            }
        }
        return packed;
    }

    static boolean[][] unpacked(BitMatrix matrix) {
        boolean[][] entries = new boolean[matrix.rows()][matrix.columns()];
        for (int r = 0; r < matrix.rows(); r++) {
            for (int c = 0; c < matrix.columns(); c++) {
                entries[r][c] = matrix.get(r, c);
            }
        }
        return entries;
    }

    static boolean[][] product(boolean[][] a, boolean[][] b, int columnsOfB) {
        boolean[][] product = new boolean[a.length][columnsOfB];
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < columnsOfB; j++) {
                for (int k = 0; k < b.length; k++) {
                    product[i][j] ^= a[i][k] && b[k][j];
                }
            }
        }
        return product;
    }

    static boolean[][] transpose(boolean[][] a, int columns) {
        boolean[][] turned = new boolean[columns][a.length];
        for (int r = 0; r < a.length; r++) {
            for (int c = 0; c < columns; c++) {
                turned[c][r] = a[r][c];
            }
        }
        return turned;
    }

    static int rank(boolean[][] a, int columns) {
        boolean[][] work = new boolean[a.length][];
        for (int r = 0; r < a.length; r++) {
            work[r] = a[r].clone();
        }
        int rank = 0;
        for (int c = 0; c < columns; c++) {
            int pivot = rank;
            while (pivot < work.length && !work[pivot][c]) {
                pivot++;
            }
            if (pivot == work.length) {
                continue;
            }
            boolean[] kept = work[pivot];
            work[pivot] = work[rank];
            work[rank] = kept;
            for (int r = rank + 1; r < work.length; r++) {
                if (work[r][c]) {
                    for (int i = 0; i < columns; i++) {
                        work[r][i] ^= kept[i];
                    }
                }
            }
            rank++;
        }
        return rank;
    }
}
