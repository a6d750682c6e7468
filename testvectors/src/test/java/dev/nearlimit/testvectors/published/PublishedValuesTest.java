package dev.nearlimit.testvectors.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestReporter;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every published value through the API. A row that no claim covers fails. */
class PublishedValuesTest {
    private static List<Claim> claims;

    @BeforeAll
    static void prepareClaims() {
        claims = new Claims().all();
    }

    static List<PublishedValue> rows() {
        return PublishedValues.all();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void isReproduced(PublishedValue row, TestReporter reporter) {
        List<Claim> claiming =
                claims.stream().filter(claim -> claim.rows().test(row)).toList();
        assertEquals(1, claiming.size(), "claims on " + row.file() + " line " + row.line() + ": " + row);
        Agreement agreement = row.compare(claiming.get(0).compute().apply(row));
        if (row.basis().isGate()) {
            assertTrue(agreement.holds(), agreement.message());
        } else if (!agreement.holds()) {
            reporter.publishEntry("disagrees, from memory", agreement.message());
        }
    }

    @Test
    void everyFileIsRead() throws IOException {
        try (Stream<Path> listed = Files.list(Path.of("published"))) {
            assertEquals(
                    PublishedValues.files().stream().sorted().toList(),
                    listed.map(path -> path.getFileName().toString())
                            .filter(name -> name.endsWith(".csv"))
                            .sorted()
                            .toList());
        }
    }

    @Test
    void theJarCarriesTheReadme() throws IOException {
        try (InputStream readme = PublishedValues.class.getResourceAsStream("/published/README.md")) {
            String text = new String(readme.readAllBytes(), StandardCharsets.UTF_8);
            for (String column : PublishedRow.COLUMNS) {
                assertTrue(text.contains(column), "README.md does not explain " + column);
            }
            for (String file : PublishedValues.files()) {
                assertTrue(text.contains(file), "README.md does not explain " + file);
            }
        }
    }

    @Test
    void thirtyValuesAndMoreGoThroughCommands() {
        for (String file : PublishedValues.files()) {
            long commands = PublishedValues.of(file).stream()
                    .filter(row -> row.reach() == Reach.COMMAND)
                    .count();
            assertTrue(commands >= 20, file + " has " + commands + " rows with a command");
        }
    }
}
