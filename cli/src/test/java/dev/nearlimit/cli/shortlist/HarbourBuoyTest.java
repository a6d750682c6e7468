package dev.nearlimit.cli.shortlist;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.report.HeadlessBrowser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The example that the README begins with, run whole, and its report opened in a browser. */
class HarbourBuoyTest {
    @TempDir
    private static Path folder;

    private static Execution execution;
    private static JsonNode schemes;

    @BeforeAll
    static void runTheExample() throws IOException {
        execution = Execution.of("shortlist", "examples/harbour-buoy.yaml", "--out", folder.toString());
        schemes = new ObjectMapper()
                .readTree(folder.resolve("shortlist.json").toFile())
                .at("/operatingPoints/0/schemes");
    }

    @Test
    void considersAtLeastTwentySchemesOfFiveFamiliesAndFindsOne() {
        assertEquals(ExitCode.OK, execution.exitCode(), execution.err());
        Set<String> families = new HashSet<>();
        schemes.forEach(scheme -> families.add(scheme.get("family").asText()));
        assertTrue(schemes.size() >= 20, schemes.size() + " schemes");
        assertTrue(families.size() >= 5, families.toString());
        assertTrue(schemes.get(0).get("meets").asBoolean());
    }

    @Test
    void everyRejectedSchemeSaysWhatItFailsAndByHowMuch() {
        for (JsonNode scheme : schemes) {
            assertEquals(
                    scheme.get("meets").asBoolean(),
                    scheme.get("fails").isEmpty(),
                    scheme.get("code").asText());
            for (JsonNode failure : scheme.get("fails")) {
                assertTrue(failure.get("demand").asText().matches(".*\\d.*"), failure.toString());
                assertTrue(failure.get("by").asText().matches(".*\\d.*"), failure.toString());
            }
        }
    }

    @Test
    void theReadmeQuotesThisVeryOutput() throws IOException {
        String readme = Files.readString(Path.of("../README.md"));
        for (String line : execution.out().lines().toList()) {
            // The last two lines tell the time taken and the place of the files.
            boolean ofThisRun = line.contains(" codewords simulated, ") || line.startsWith("written: ");
            assertTrue(ofThisRun || readme.contains(line + "\n"), "not in the README: " + line);
        }
    }

    @Test
    void theReportOpensWithBothChartsDrawnAndNoConsoleError() throws IOException, InterruptedException {
        HeadlessBrowser.Page page = HeadlessBrowser.findOrSkip()
                .open(folder.resolve("report.html"), Files.createDirectory(folder.resolve("browser")));
        assertEquals(List.of(), page.console());
        assertFalse(page.dom().contains("data-script-errors=\""), "a script failed");
        for (String chart : List.of("error-rates", "efficiency")) {
            Matcher picture = Pattern.compile("<div class=\"chart " + chart + "\".*?(<svg.*?</svg>)", Pattern.DOTALL)
                    .matcher(page.dom());
            assertTrue(picture.find(), "no picture in the chart " + chart);
            assertTrue(picture.group(1).split("<path ").length > 20, "little is drawn in the chart " + chart);
        }
    }
}
