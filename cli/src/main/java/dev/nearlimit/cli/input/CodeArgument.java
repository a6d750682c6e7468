package dev.nearlimit.cli.input;

import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.matrix.MatrixFile;
import dev.nearlimit.codes.matrix.MatrixFormatException;
import dev.nearlimit.codes.matrix.MatrixLimits;
import dev.nearlimit.codes.matrix.MatrixRole;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The argument CODE with the options that say what a matrix file means, mixed into every command that takes one code. */
public final class CodeArgument {
    /** What a user can call the role of a matrix. */
    enum Role {
        GENERATOR(MatrixRole.GENERATOR),
        PARITY(MatrixRole.PARITY_CHECK);

        private final MatrixRole matrixRole;

        Role(MatrixRole matrixRole) {
            this.matrixRole = matrixRole;
        }
    }

    @Parameters(
            index = "0",
            paramLabel = "CODE",
            description = "A designator such as bch:127,64 (see nearlimit codes), or the path of a matrix file:"
                    + " Matrix Market, or CSV of 0 and 1.")
    private String code;

    @Option(
            names = "--matrix",
            paramLabel = "ROLE",
            description = "What the matrix in the file is: generator or parity. Needed with a path.")
    private Role role;

    @Option(
            names = "--raise-limits",
            paramLabel = "FACTOR",
            defaultValue = "1",
            description = "Accept matrix files this many times larger than usual (65536 rows or columns, 256 MiB).")
    private int factor;

    /**
     * Builds or reads the code.
     *
     * @throws InvalidCodeException if a designator names no code
     * @throws InputException if the role of a matrix is missing or out of place, or the file gives no code
     */
    public Code code() {
        Catalogue catalogue = Catalogue.standard();
        if (catalogue.isKnownFamily(code) || !looksLikePath()) {
            if (role != null) {
                throw new InputException("--matrix goes with the path of a matrix file, but '" + code + "' is none");
            }
            return catalogue.build(code);
        }
        if (role == null) {
            throw new InputException(
                    "say what the matrix is: --matrix generator or --matrix parity is needed with a path", code, 0, 0);
        }
        if (factor < 1) {
            throw new InputException("--raise-limits is " + factor + ", must be at least 1");
        }
        return read();
    }

    private Code read() {
        try {
            return MatrixFile.readCode(
                    Path.of(code), role.matrixRole, MatrixLimits.standard().times(factor));
        } catch (MatrixFormatException e) {
            throw e;
        } catch (InvalidCodeException e) {
            throw new InputException(e.getMessage(), code, 0, 0);
        }
    }

    /** A name that neither exists nor is spelled like a path is taken for a mistyped family. */
    private boolean looksLikePath() {
        try {
            return code.contains("/") || code.endsWith(".mtx") || code.endsWith(".csv") || Files.exists(Path.of(code));
        } catch (InvalidPathException e) {
            return false;
        }
    }
}
