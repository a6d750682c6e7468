package dev.nearlimit.codes.matrix;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Mutations of good files: a reader gives a matrix that makes a code, or one line that says why not; nothing else. */
class MatrixFuzzTest {
    private static final List<String> GOOD = List.of(
            "%%MatrixMarket matrix coordinate pattern general\n% H\n3 7 12\n1 1\n1 2\n1 4\n1 5\n2 1\n2 3\n2 4\n2 6\n"
                    + "3 2\n3 3\n3 4\n3 7\n",
            "%%MatrixMarket matrix coordinate real symmetric\n3 3 4\n1 1 1.0\n2 1 1\n3 3 1e0\n3 2 0.0\n",
            "%%MatrixMarket matrix array integer general\n2 3\n1\n0\n0\n1\n1\n1\n",
            "# H\n1,1,0,1,1,0,0\n1,0,1,1,0,1,0\n0,1,1,1,0,0,1\n",
            "1;0;1\r\n0;1;1\r\n");
    private static final String[] FRAGMENTS = {
        "",
        "0",
        "1",
        "2",
        "-1",
        "9",
        "99999999999999999999",
        "2147483648",
        "4294967297",
        "1e400000000",
        "1e-9",
        "NaN",
        "0x1",
        " ",
        "\n",
        "\r",
        "\0",
        "\u00FF",
        ",",
        ";",
        ",,",
        "%",
        "%%",
        "#",
        "\"",
        "%%MatrixMarket",
        "array",
        "coordinate",
        "pattern",
        "symmetric",
        "complex",
        "65536 65536",
        "1 1\n"
    };

    @TempDir
    private Path folder;

    static LongStream seeds() {
        return LongStream.range(1, 61);
    }

    static LongStream moreSeeds() {
        return LongStream.range(1001, 1501);
    }

    @Tag("thorough")
    @ParameterizedTest
    @MethodSource("moreSeeds")
    void manyMutatedFilesAreReadOrRefusedInOneLine(long seed) throws IOException {
        mutatedFilesAreReadOrRefusedInOneLine(seed);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void mutatedFilesAreReadOrRefusedInOneLine(long seed) throws IOException {
        Random random = new Random(seed);
        Path path = folder.resolve(random.nextBoolean() ? "m.mtx" : "m.csv");
        for (int trial = 0; trial < 30; trial++) {
            StringBuilder text = new StringBuilder(GOOD.get(random.nextInt(GOOD.size())));
            for (int mutations = 1 + random.nextInt(3); mutations > 0; mutations--) {
                mutate(text, random);
            }
            Files.write(path, text.toString().getBytes(StandardCharsets.ISO_8859_1));
            MatrixRole role = random.nextBoolean() ? MatrixRole.GENERATOR : MatrixRole.PARITY_CHECK;
            String message = "seed " + seed + " trial " + trial + ":\n" + text;
            try {
                Code code = MatrixFile.readCode(path, role, MatrixLimits.standard());
                assertTrue(code.k() >= 1 && code.k() <= code.n(), message);
            } catch (InvalidCodeException e) {
                assertTrue(e.getMessage().contains(path.toString()), message + "\n" + e.getMessage());
                assertFalse(e.getMessage().matches("(?s).*[\r\n\0].*"), message + "\n" + e.getMessage());
            } catch (RuntimeException e) {
                fail(message, e);
            }
        }
    }

    private static void mutate(StringBuilder text, Random random) {
        int at = random.nextInt(text.length() + 1);
        int end = Math.min(text.length(), at + random.nextInt(4));
        switch (random.nextInt(5)) {
            case 0 -> text.insert(at, FRAGMENTS[random.nextInt(FRAGMENTS.length)]);
            case 1 -> text.delete(at, end);
            case 2 -> text.replace(at, end, FRAGMENTS[random.nextInt(FRAGMENTS.length)]);
            case 3 -> text.setLength(at);
            default -> text.insert(at, text.substring(random.nextInt(text.length() + 1)));
        }
    }
}
