package dev.nearlimit.codes.matrix;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.CodeChecks;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MatrixFileTest {
    private static final MatrixLimits LIMITS = MatrixLimits.standard();
    private static final MatrixLimits SMALL = new MatrixLimits(4, 8, 24, 10, 200);

    @TempDir
    private Path folder;

    /** Writes a file; {@code /} in the text stands for a line end. */
    private Path file(String name, String text) throws IOException {
        return Files.write(folder.resolve(name), text.replace('/', '\n').getBytes(StandardCharsets.ISO_8859_1));
    }

    private BitMatrix read(String name, String text) throws IOException {
        return MatrixFile.read(file(name, text), LIMITS).toDense();
    }

    /** The message without the folder. */
    private String refusal(String name, String text, MatrixLimits limits) throws IOException {
        Path path = file(name, text);
        String message = assertThrows(MatrixFormatException.class, () -> MatrixFile.read(path, limits))
                .getMessage();
        return message.replace(folder + path.getFileSystem().getSeparator(), "");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "%%MatrixMarket matrix coordinate pattern general/2 3 3/1 1/2 2/1 3/",
                "%%MatrixMarket matrix coordinate pattern general/2 3 3/1 1/2 2/1 3",
                "%%matrixmarket MATRIX Coordinate PATTERN General/%a comment/%/ //  2   3\t3 // 1 1/2 2 /%late/1 3/ //",
                "%%MatrixMarket matrix coordinate integer general/2 3 4/1 1 1/2 2 1/1 3 1/2 3 0/",
                "%%MatrixMarket matrix coordinate real general/2 3 3/1 1 1.0/2 2 1e0/1 3 0.1E+1/",
                "%%MatrixMarket matrix array integer general/2 3/1/0/0/1/1/0/",
                "%%MatrixMarket matrix array real general/2 3/1.000/0/-0.0/+1/1./0e5/",
            })
    void matrixMarketFormsAreRead(String text) throws IOException {
        assertEquals(BitMatrix.ofRows("101", "010"), read("m.mtx", text));
        assertEquals(BitMatrix.ofRows("101", "010"), read("named-otherwise", text));
        assertEquals(BitMatrix.ofRows("101", "010"), read("m.mtx", text.replace("/", "\r\n")));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "%%MatrixMarket matrix coordinate pattern symmetric/3 3 3/1 1/3 1/3 2/",
                "%%MatrixMarket matrix coordinate integer symmetric/3 3 3/3 2 1/1 1 1/3 1 1/",
                "%%MatrixMarket matrix array integer symmetric/3 3/1/0/1/0/1/0/",
            })
    void symmetricFilesAreMirrored(String text) throws IOException {
        assertEquals(BitMatrix.ofRows("101", "001", "110"), read("m.mtx", text));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "1,0,1/0,1,0/",
                "1,0,1/0,1,0",
                "1;0;1/0;1;0/",
                "# a comment// 1 , 0,1 // \t0,1,0  //",
                "\u00EF\u00BB\u00BF1,0,1/0,1,0/",
            })
    void csvFormsAreRead(String text) throws IOException {
        assertEquals(BitMatrix.ofRows("101", "010"), read("m.csv", text));
        assertEquals(BitMatrix.ofRows("101", "010"), read("m.csv", text.replace("/", "\r\n")));
        assertEquals(BitMatrix.ofRows("101", "010"), read("m.csv", text.replace("/", "\r")));
    }

    @Test
    void oneColumnIsAMatrixToo() throws IOException {
        assertEquals(BitMatrix.ofRows("1", "0"), read("m.csv", "1/0/"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "''|m.csv: found an empty file, expected a matrix of 0 and 1",
                "//  //|m.csv: found no row, expected a matrix of 0 and 1",
                "# only a comment|m.csv: found no row, expected a matrix of 0 and 1",
                "1,0,1/0,1/|m.csv:2: found 2 entries, expected 3 as in line 1",
                "//1,0,1/0,1,0,1/|m.csv:4: found 4 entries, expected 3 as in line 3",
                "1,0/0;1/|m.csv:2: found 1 entry, expected 2 as in line 1",
                "1,0,/0,1,0/|m.csv:1:5: found an empty entry, expected 0 or 1, entries separated by commas or semicolons",
                "1,0, 2/|m.csv:1:6: found '2', expected 0 or 1, entries separated by commas or semicolons",
                "h1,h2/1,0/|m.csv:1:1: found 'h1', expected 0 or 1, entries separated by commas or semicolons",
                "0110/1001/|m.csv:1:1: found '0110', expected 0 or 1, entries separated by commas or semicolons",
                "1,0/0,1.0/|m.csv:2:3: found '1.0', expected 0 or 1, entries separated by commas or semicolons",
                "\"1\",0/|m.csv:1:1: found '\"1\"', expected 0 or 1, entries separated by commas or semicolons",
                "1,\u00000/|m.csv:1:3: found '\\x000', expected 0 or 1, entries separated by commas or semicolons",
            })
    void badCsvIsLocated(String text, String message) throws IOException {
        assertEquals(message, refusal("m.csv", text, LIMITS));
    }

    @Test
    void aFileNamedMtxNeedsItsHeading() throws IOException {
        assertEquals(
                "m.mtx:1:1: found '1', expected %%MatrixMarket matrix coordinate|array pattern|integer|real"
                        + " general|symmetric",
                refusal("m.mtx", "1 0/0 1/", LIMITS));
        assertEquals(
                "m.mtx:1: found no heading, expected %%MatrixMarket matrix coordinate|array pattern|integer|real"
                        + " general|symmetric",
                refusal("m.mtx", "/1 0/", LIMITS));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "%%MatrixMarkt matrix coordinate pattern general/|m:1:1: found '%%MatrixMarkt', expected %%MatrixMarket matrix"
                        + " coordinate/array pattern/integer/real general/symmetric",
                "%%MatrixMarket matrix coordinate pattern/|m:1: found a heading of 4 words, expected %%MatrixMarket matrix format"
                        + " field symmetry",
                "%%MatrixMarket matrix coordinate pattern general x/|m:1: found more after the heading, expected %%MatrixMarket"
                        + " matrix format field symmetry",
                "%%MatrixMarket vector coordinate pattern general/|m:1:16: found 'vector', expected matrix",
                "%%MatrixMarket matrix sparse pattern general/|m:1:23: found 'sparse', expected coordinate or array",
                "%%MatrixMarket matrix coordinate complex general/|m:1:34: found 'complex', expected pattern or integer or real",
                "%%MatrixMarket matrix coordinate pattern hermitian/|m:1:42: found 'hermitian', expected general or symmetric",
                "%%MatrixMarket matrix array pattern general/|m:1:29: found 'pattern', expected integer or real with format array",
                "%%MatrixMarket matrix coordinate pattern general/%/|m: found no line with the size, expected rows, columns and"
                        + " number of entries",
                "%%MatrixMarket matrix coordinate pattern general/2 3/|m:2: found '2 3', expected rows, columns and number of"
                        + " entries",
                "%%MatrixMarket matrix coordinate pattern general/2 x 1/|m:2:3: found 'x', expected a whole number",
                "%%MatrixMarket matrix coordinate pattern general/2 -3 1/|m:2:3: found '-3', expected a whole number",
                "%%MatrixMarket matrix coordinate pattern general/0 3 0/|m:2:1: found no row, expected at least one",
                "%%MatrixMarket matrix coordinate pattern general/3 0 0/|m:2:3: found no column, expected at least one",
                "%%MatrixMarket matrix coordinate pattern general/2 3 7/|m:2:5: found 7 entries, expected at most 2 x 3",
                "%%MatrixMarket matrix coordinate pattern general/2 3 2/1 1/|m: found the end of the file after 1 entry,"
                        + " expected 2",
                "%%MatrixMarket matrix coordinate pattern general/2 3 1/1 1/2 2/|m:4: found '2 2', expected the end of the file",
                "%%MatrixMarket matrix coordinate pattern general/2 3 1/0 1/|m:3:1: found row 0, expected 1 .. 2",
                "%%MatrixMarket matrix coordinate pattern general/2 3 1/1 4/|m:3:3: found column 4, expected 1 .. 3",
                "%%MatrixMarket matrix coordinate pattern general/2 3 1/1/|m:3: found '1', expected row and column of an entry",
                "%%MatrixMarket matrix coordinate pattern general/2 3 1/1 1 1/|m:3: found '1 1 1', expected row and column of an"
                        + " entry",
                "%%MatrixMarket matrix coordinate integer general/2 3 1/1 1/|m:3: found '1 1', expected row, column and value of"
                        + " an entry",
                "%%MatrixMarket matrix coordinate integer general/2 3 1/1 1 2/|m:3:5: found '2', expected 0 or 1",
                "%%MatrixMarket matrix coordinate integer general/2 3 1/1 1 1.0/|m:3:5: found '1.0', expected 0 or 1",
                "%%MatrixMarket matrix coordinate real general/2 3 1/1 1 0.5/|m:3:5: found '0.5', expected 0 or 1",
                "%%MatrixMarket matrix coordinate real general/2 3 1/1 1 NaN/|m:3:5: found 'NaN', expected 0 or 1",
                "%%MatrixMarket matrix coordinate real general/2 3 1/1 1 -1/|m:3:5: found '-1', expected 0 or 1",
                "%%MatrixMarket matrix coordinate real general/2 3 1/1 1 1.0000000000000000000001/|m:3:5: found"
                        + " '1.0000000000000000000001', expected 0 or 1",
                "%%MatrixMarket matrix coordinate pattern general/2 3 3/1 1/2 2/1 1/|m:5: found entry (1,1) a second time,"
                        + " expected each entry once (first in line 3)",
                "%%MatrixMarket matrix coordinate pattern symmetric/2 3 1/1 1/|m:2:1: found 2 rows and 3 columns, expected as"
                        + " many for a symmetric matrix",
                "%%MatrixMarket matrix coordinate pattern symmetric/3 3 1/1 2/|m:3:1: found entry (1,2) above the diagonal,"
                        + " expected only the lower triangle of a symmetric matrix",
                "%%MatrixMarket matrix array integer general/2 2/1/0/1/|m: found the end of the file, expected the entry of row"
                        + " 2, column 2 and those after it",
                "%%MatrixMarket matrix array integer general/1 2/1 0/|m:3:3: found '0', expected one entry a line in format"
                        + " array",
                "%%MatrixMarket matrix array integer general/1 1/1/junk/|m:4: found 'junk', expected the end of the file",
            })
    void badMatrixMarketIsLocated(String text, String message) throws IOException {
        // The heading's alternatives are written with a bar, which separates columns here.
        assertEquals(
                message.replace(
                        "coordinate/array pattern/integer/real general/symmetric",
                        "coordinate|array" + " pattern|integer|real general|symmetric"),
                refusal("m", text, LIMITS));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0,0,0,0,0,0,0,0,0/|m:1: found 9 columns, expected at most 8, or a raised limit",
                "0/0/0/0/0/|m:5: found 5 rows, expected at most 4, or a raised limit",
                "0,0,0,0,0,0,0/0,0,0,0,0,0,0/0,0,0,0,0,0,0/0,0,0,0,0,0,0/|m:4: found 4 x 7 entries, expected at most 24 in all, or"
                        + " a raised limit",
                "1,1,1,1,1,1/1,1,1,1,1,1/|m:2: found more than 10 ones, expected fewer, or a raised limit",
                "%%MatrixMarket matrix coordinate pattern general/999999999999 3 1/|m:2:1: found 999999999999 rows, expected at"
                        + " most 4, or a raised limit",
                "%%MatrixMarket matrix coordinate pattern general/3 9 1/|m:2:3: found 9 columns, expected at most 8, or a raised"
                        + " limit",
                "%%MatrixMarket matrix coordinate pattern general/4 8 1/|m:2: found 4 x 8 entries, expected at most 24 in all, or"
                        + " a raised limit",
                "%%MatrixMarket matrix coordinate pattern general/3 8 11/|m:2:5: found 11 entries, expected at most 10, or a"
                        + " raised limit",
            })
    void limitsStopTheReader(String text, String message) throws IOException {
        assertEquals(message, refusal("m", text, SMALL));
    }

    @Test
    void longFilesAndLinesAreStopped() throws IOException {
        assertEquals(
                "m: found more than 200 bytes, expected a smaller file, or a raised limit",
                refusal("m", "#".repeat(150) + "/" + "#".repeat(150), SMALL));
        MatrixLimits manyBytes = new MatrixLimits(4, 8, 24, 10, 1 << 20);
        assertEquals(
                "m:2: found a line of more than 1152 characters, expected shorter lines",
                refusal("m", "1,0/" + "1,".repeat(1000), manyBytes));
        assertEquals(1, MatrixFile.read(file("m", "1,0/"), SMALL.times(1 << 30)).rows());
    }

    @Test
    void filesThatCannotBeReadAreNamed() {
        MatrixFormatException missing = assertThrows(
                MatrixFormatException.class, () -> MatrixFile.read(Path.of("no-such-folder", "h.mtx"), LIMITS));
        assertEquals(
                Path.of("no-such-folder", "h.mtx") + ": found no such file, expected a matrix file",
                missing.getMessage());
        MatrixFormatException directory =
                assertThrows(MatrixFormatException.class, () -> MatrixFile.read(folder, LIMITS));
        assertEquals(folder + ": found a directory, expected a matrix file", directory.getMessage());
    }

    @Test
    void placesAreReportedAsNumbersToo() throws IOException {
        Path path = file("h.csv", "1,0,1/0,x,1/");
        MatrixFormatException error = assertThrows(MatrixFormatException.class, () -> MatrixFile.read(path, LIMITS));
        assertEquals(path.toString(), error.file());
        assertEquals(2, error.line());
        assertEquals(3, error.column());
        assertEquals("'x'", error.found());
        assertTrue(error.expected().startsWith("0 or 1"));
    }

    @Test
    void dependentChecksAreAcceptedAndCounted() throws IOException {
        Path path = file("h.csv", "1,1,0,1,1,0,0/1,0,1,1,0,1,0/0,1,1,0,1,1,0/0,1,1,1,0,0,1/");
        Code code = MatrixFile.readCode(path, MatrixRole.PARITY_CHECK, LIMITS);
        CodeChecks.assertSound(code, 7, 4);
        assertEquals(1, code.redundantChecks());
        assertEquals(path.toString(), code.designator());
        assertEquals(3, CodeChecks.minimumDistance(code));
    }

    @Test
    void generatorsSpanTheirCode() throws IOException {
        Path path = file("g.csv", "1,1,0,1,0,0,0/0,1,1,0,1,0,0/0,0,1,1,0,1,0/0,0,0,1,1,0,1/");
        Code code = MatrixFile.readCode(path, MatrixRole.GENERATOR, LIMITS);
        CodeChecks.assertSound(code, 7, 4);
        assertEquals("0:1 3:7 4:7 7:1", CodeChecks.enumerator(code));
    }

    @Test
    void matricesThatMakeNoCodeAreRefusedByName() throws IOException {
        Path onlyZero = file("h.csv", "1,0/0,1/1,1/");
        assertEquals(
                "the parity-check matrix of " + onlyZero + " has rank 2 = n, so that it admits only the zero word",
                assertThrows(
                                InvalidCodeException.class,
                                () -> MatrixFile.readCode(onlyZero, MatrixRole.PARITY_CHECK, LIMITS))
                        .getMessage());
        Path dependent = file("g.csv", "1,0,1/0,1,1/1,1,0/");
        assertEquals(
                "the generator matrix of " + dependent + " has 3 rows but rank 2: its rows are dependent",
                assertThrows(
                                InvalidCodeException.class,
                                () -> MatrixFile.readCode(dependent, MatrixRole.GENERATOR, LIMITS))
                        .getMessage());
        Path wide = file("w.csv", "1,0,1,1,1/");
        assertEquals(
                wide + ": found 5 columns, expected a code length n with n x n at most 24, or a raised limit",
                assertThrows(MatrixFormatException.class, () -> MatrixFile.readCode(wide, MatrixRole.GENERATOR, SMALL))
                        .getMessage());
    }

    @Test
    void filesRoundTripThroughTheirDesignatorAndMayBeShortened() throws IOException {
        String path =
                file("a+b.csv", "1,1,0,1,1,0,0/1,0,1,1,0,1,0/0,1,1,1,0,0,1/").toString();
        Code code = Catalogue.fromFile(path, MatrixRole.PARITY_CHECK, LIMITS);
        assertEquals(path, code.designator());
        Code shortened = Catalogue.fromFile(path + "+shorten=1", MatrixRole.PARITY_CHECK, LIMITS);
        CodeChecks.assertSound(shortened, 6, 3);
        assertEquals(path + "+shorten=1", shortened.designator());
        assertEquals(
                shortened.generator(),
                Catalogue.fromFile(shortened.designator(), MatrixRole.PARITY_CHECK, LIMITS)
                        .generator());
        assertTrue(assertThrows(
                        InvalidCodeException.class, () -> Catalogue.fromFile("bad\0name", MatrixRole.GENERATOR, LIMITS))
                .getMessage()
                .contains("is no path"));
    }
}
