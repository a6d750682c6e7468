package dev.nearlimit.codes.gf2;

import java.util.Arrays;
import java.util.Objects;

/**
 * A dense matrix over GF(2), rows packed 64 bits to a word: entry (r, c) is bit {@code c % 64} of word {@code c / 64} of
 * row r. Invariant "padding is clear": bits of a row past the last column are always zero, so whole words may be
 * compared and counted.
 */
public final class BitMatrix {
    private final int rows;
    private final int columns;
    private final int wordsPerRow;
    private final long[] words;

    /** The all-zero matrix of the given shape; either side may be 0. */
    public BitMatrix(int rows, int columns) {
        if (rows < 0 || columns < 0) {
            throw new IllegalArgumentException("shape is " + rows + "x" + columns + ", sides must not be negative");
        }
        this.rows = rows;
        this.columns = columns;
        this.wordsPerRow = wordsFor(columns);
        this.words = new long[Math.multiplyExact(rows, wordsPerRow)];
    }

    private BitMatrix(BitMatrix other) {
        this.rows = other.rows;
        this.columns = other.columns;
        this.wordsPerRow = other.wordsPerRow;
        this.words = other.words.clone();
    }

    /** Words needed for a number of bits: the only place where this is rounded. */
    public static int wordsFor(int bits) {
        return (bits + 63) >>> 6;
    }

    /** The n x n identity. */
    public static BitMatrix identity(int n) {
        BitMatrix matrix = new BitMatrix(n, n);
        for (int i = 0; i < n; i++) {
            matrix.set(i, i, true);
        }
        return matrix;
    }

    /** A matrix from strings of '0' and '1', one a row, all of the same length; for literals in constructions and tests. */
    public static BitMatrix ofRows(String... rows) {
        int columns = rows.length == 0 ? 0 : rows[0].length();
        BitMatrix matrix = new BitMatrix(rows.length, columns);
        for (int r = 0; r < rows.length; r++) {
            if (rows[r].length() != columns) {
                throw new IllegalArgumentException(
                        "row " + r + " has " + rows[r].length() + " entries, row 0 has " + columns);
            }
            for (int c = 0; c < columns; c++) {
                char entry = rows[r].charAt(c);
                if (entry != '0' && entry != '1') {
                    throw new IllegalArgumentException("row " + r + " column " + c + " is '" + entry + "', not 0 or 1");
                }
                matrix.set(r, c, entry == '1');
            }
        }
        return matrix;
    }

    public int rows() {
        return rows;
    }

    public int columns() {
        return columns;
    }

    /** Words that one row takes. */
    public int wordsPerRow() {
        return wordsPerRow;
    }

    public boolean get(int row, int column) {
        checkEntry(row, column);
        return (words[row * wordsPerRow + (column >> 6)] >>> (column & 63) & 1L) != 0;
    }

    public void set(int row, int column, boolean value) {
        checkEntry(row, column);
        long mask = 1L << (column & 63);
        int index = row * wordsPerRow + (column >> 6);
        words[index] = value ? words[index] | mask : words[index] & ~mask;
    }

    /** Adds 1 to an entry. */
    public void flip(int row, int column) {
        checkEntry(row, column);
        words[row * wordsPerRow + (column >> 6)] ^= 1L << (column & 63);
    }

    /** A copy of a row's words. */
    public long[] row(int row) {
        Objects.checkIndex(row, rows);
        return Arrays.copyOfRange(words, row * wordsPerRow, (row + 1) * wordsPerRow);
    }

    /** One word of a row: bits {@code 64*word ..} of it. */
    public long word(int row, int word) {
        Objects.checkIndex(row, rows);
        Objects.checkIndex(word, wordsPerRow);
        return words[row * wordsPerRow + word];
    }

    /** The ascending column numbers of a row's ones. */
    public int[] onesOfRow(int row) {
        int[] found = new int[rowWeight(row)];
        int next = 0;
        for (int w = 0; w < wordsPerRow; w++) {
            for (long rest = words[row * wordsPerRow + w]; rest != 0; rest &= rest - 1) {
                found[next++] = (w << 6) + Long.numberOfTrailingZeros(rest);
            }
        }
        return found;
    }

    /** XORs a row of this matrix into {@code target}, which has at least {@link #wordsPerRow()} words. */
    public void xorRowInto(int row, long[] target) {
        Objects.checkIndex(row, rows);
        int start = row * wordsPerRow;
        for (int w = 0; w < wordsPerRow; w++) {
            target[w] ^= words[start + w];
        }
    }

    /** Adds row {@code source} to row {@code target}. */
    public void addRow(int source, int target) {
        Objects.checkIndex(source, rows);
        Objects.checkIndex(target, rows);
        int from = source * wordsPerRow;
        int to = target * wordsPerRow;
        for (int w = 0; w < wordsPerRow; w++) {
            words[to + w] ^= words[from + w];
        }
    }

    /** The first row from {@code fromRow} on with a 1 in {@code column}; -1 if there is none. */
    int firstRowWithOne(int fromRow, int column) {
        long mask = 1L << (column & 63);
        for (int r = fromRow; r < rows; r++) {
            if ((words[r * wordsPerRow + (column >> 6)] & mask) != 0) {
                return r;
            }
        }
        return -1;
    }

    /** Adds row {@code pivot} to every other row that has a 1 in {@code column}. */
    void clearColumn(int pivot, int column) {
        long mask = 1L << (column & 63);
        for (int r = 0; r < rows; r++) {
            if (r != pivot && (words[r * wordsPerRow + (column >> 6)] & mask) != 0) {
                addRow(pivot, r);
            }
        }
    }

    public void swapRows(int a, int b) {
        Objects.checkIndex(a, rows);
        Objects.checkIndex(b, rows);
        for (int w = 0; w < wordsPerRow; w++) {
            long kept = words[a * wordsPerRow + w];
            words[a * wordsPerRow + w] = words[b * wordsPerRow + w];
            words[b * wordsPerRow + w] = kept;
        }
    }

    /** Number of ones in a row. */
    public int rowWeight(int row) {
        Objects.checkIndex(row, rows);
        int weight = 0;
        for (int w = 0; w < wordsPerRow; w++) {
            weight += Long.bitCount(words[row * wordsPerRow + w]);
        }
        return weight;
    }

    public boolean isZeroRow(int row) {
        return rowWeight(row) == 0;
    }

    public BitMatrix copy() {
        return new BitMatrix(this);
    }

    public BitMatrix transpose() {
        BitMatrix result = new BitMatrix(columns, rows);
        for (int r = 0; r < rows; r++) {
            for (int w = 0; w < wordsPerRow; w++) {
                for (long rest = words[r * wordsPerRow + w]; rest != 0; rest &= rest - 1) {
                    result.set((w << 6) + Long.numberOfTrailingZeros(rest), r, true);
                }
            }
        }
        return result;
    }

    /** The product {@code this * right}; {@code this} is m x p, {@code right} p x n. */
    public BitMatrix multiply(BitMatrix right) {
        if (columns != right.rows) {
            throw new IllegalArgumentException(
                    "left is " + rows + "x" + columns + ", right is " + right.rows + "x" + right.columns);
        }
        BitMatrix result = new BitMatrix(rows, right.columns);
        for (int r = 0; r < rows; r++) {
            int to = r * result.wordsPerRow;
            for (int w = 0; w < wordsPerRow; w++) {
                for (long rest = words[r * wordsPerRow + w]; rest != 0; rest &= rest - 1) {
                    int from = ((w << 6) + Long.numberOfTrailingZeros(rest)) * right.wordsPerRow;
                    for (int v = 0; v < right.wordsPerRow; v++) {
                        result.words[to + v] ^= right.words[from + v];
                    }
                }
            }
        }
        return result;
    }

    /** The chosen columns, in the order given, as a new matrix. */
    public BitMatrix selectColumns(int... chosen) {
        BitMatrix result = new BitMatrix(rows, chosen.length);
        for (int r = 0; r < rows; r++) {
            for (int c = 0; c < chosen.length; c++) {
                result.set(r, c, get(r, chosen[c]));
            }
        }
        return result;
    }

    /** The rows {@code from .. to-1} as a new matrix. */
    public BitMatrix selectRows(int from, int to) {
        Objects.checkFromToIndex(from, to, rows);
        BitMatrix result = new BitMatrix(to - from, columns);
        System.arraycopy(words, from * wordsPerRow, result.words, 0, result.words.length);
        return result;
    }

    public boolean isZero() {
        for (long word : words) {
            if (word != 0) {
                return false;
            }
        }
        return true;
    }

    /** Whether the invariant "padding is clear" holds; for tests of code that writes words. */
    public boolean paddingIsClear() {
        if ((columns & 63) == 0) {
            return true;
        }
        long padding = -1L << (columns & 63);
        for (int r = 0; r < rows; r++) {
            if ((words[(r + 1) * wordsPerRow - 1] & padding) != 0) {
                return false;
            }
        }
        return true;
    }

    private void checkEntry(int row, int column) {
        Objects.checkIndex(row, rows);
        Objects.checkIndex(column, columns);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof BitMatrix that
                && rows == that.rows
                && columns == that.columns
                && Arrays.equals(words, that.words);
    }

    @Override
    public int hashCode() {
        return 31 * (31 * rows + columns) + Arrays.hashCode(words);
    }

    /** Rows of 0 and 1, a line each; large matrices are named by their shape only. */
    @Override
    public String toString() {
        if (rows > 64 || columns > 128) {
            return rows + "x" + columns + " matrix over GF(2)";
        }
        StringBuilder text = new StringBuilder();
        for (int r = 0; r < rows; r++) {
            for (int c = 0; c < columns; c++) {
                text.append(get(r, c) ? '1' : '0');
            }
            text.append('\n');
        }
        return text.toString();
    }
}
