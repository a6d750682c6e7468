package dev.nearlimit.codes.matrix;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Locale;

/**
 * Reads the user's own matrices and makes codes of them. A file that starts with {@code %%} or whose name ends in
 * {@code .mtx} is Matrix Market, any other is CSV of 0 and 1.
 */
public final class MatrixFile {
    private MatrixFile() {}

    /**
     * Reads a matrix.
     *
     * @throws MatrixFormatException if the file cannot be read, is no matrix of 0 and 1, or is beyond the limits
     */
    public static SparseBitMatrix read(Path path, MatrixLimits limits) {
        String file = path.toString();
        if (Files.isDirectory(path)) {
            throw new MatrixFormatException(file, 0, 0, "a directory", "a matrix file");
        }
        try (TextLines lines = new TextLines(file, Files.newInputStream(path), limits)) {
            String first = lines.peek();
            if (first == null) {
                throw new MatrixFormatException(file, 0, 0, "an empty file", "a matrix of 0 and 1");
            }
            boolean isMatrixMarket =
                    first.startsWith("%%") || file.toLowerCase(Locale.ROOT).endsWith(".mtx");
            return isMatrixMarket ? new MatrixMarketReader(lines, limits).read() : new CsvReader(lines, limits).read();
        } catch (NoSuchFileException e) {
            throw new MatrixFormatException(file, 0, 0, "no such file", "a matrix file");
        } catch (AccessDeniedException e) {
            throw new MatrixFormatException(file, 0, 0, "a file without permission to read it", "a matrix file");
        } catch (IOException e) {
            throw new InvalidCodeException(file + ": cannot be read: " + e.getMessage(), e);
        }
    }

    /**
     * Reads a matrix and makes a code of it. The code's designator is the path as given.
     *
     * @throws InvalidCodeException as {@link #read}, or if the rows of a generator matrix are dependent, or a
     *     parity-check matrix admits only the zero word
     */
    public static Code readCode(Path path, MatrixRole role, MatrixLimits limits) {
        SparseBitMatrix matrix = read(path, limits);
        String designator = path.toString();
        long n = matrix.columns();
        if (n * n > limits.maxEntries()) {
            throw new MatrixFormatException(
                    designator,
                    0,
                    0,
                    n + " columns",
                    "a code length n with n x n at most " + limits.maxEntries() + ", or a raised limit");
        }
        return switch (role) {
            case GENERATOR -> Code.ofGenerator(designator, "generator matrix in " + designator, matrix.toDense());
            case PARITY_CHECK -> Code.ofParityCheck(designator, "parity-check matrix in " + designator, matrix);
        };
    }
}
