package dev.nearlimit.cli.shortlist;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** From a requirement file to table, files and exit code. */
class ShortlistCommandTest {
    private static final String REQUIREMENT = """
            name: Test link
            link:
              bandwidthHz: 3000
              rollOff: 0.25
              bitRateBps: 1200
              availableEbn0Db: 7.5
              modulations: [bpsk, qpsk]
            payload: { bits: 60, fer: 1e-2 }
            candidates:
              - code: golay:24,12
                decoders: [bounded-distance, maximum-likelihood]
              - code: hamming:15,11
                decoders: syndrome
              - code: repetition:5
                decoders: syndrome
            """;

    @TempDir
    Path folder;

    private Path file;
    private Path out;

    @BeforeEach
    void writeRequirement() throws IOException {
        file = folder.resolve("link.yaml");
        out = folder.resolve("results");
        Files.writeString(file, REQUIREMENT);
    }

    private Execution run(String... more) {
        return Execution.of(
                Stream.concat(Stream.of("shortlist", file.toString(), "--out", out.toString()), Stream.of(more))
                        .toArray(String[]::new));
    }

    @Test
    void printsTheTableAndWritesThreeFiles() throws IOException {
        Execution execution = run();
        assertEquals(ExitCode.OK, execution.exitCode(), execution.err());
        assertTrue(execution.out().contains("golay:24,12 with maximum-likelihood on QPSK needs "), execution.out());
        assertTrue(execution.out().contains("Meets every demand"));
        assertTrue(execution.out().contains("Rejected, nearest first"));
        List<String> wide = execution
                .out()
                .lines()
                .filter(line -> !line.startsWith("written: "))
                .filter(line -> line.length() > 80)
                .toList();
        assertEquals(List.of(), wide, "lines wider than a terminal of 80 columns");
        for (String name : List.of("report.html", "shortlist.csv", "shortlist.json")) {
            assertTrue(Files.size(out.resolve(name)) > 500, name);
        }
        try (Stream<Path> files = Files.list(out)) {
            assertEquals(3, files.count(), "no temporary file is left");
        }
    }

    @Test
    void theResultsFileKeepsTheContract() throws IOException {
        Execution execution = run("--format", "json");
        JsonNode results = execution.json();
        assertEquals(
                results,
                new ObjectMapper().readTree(out.resolve("shortlist.json").toFile()));
        assertEquals(60, results.at("/requirement/payloadBits").asInt());
        JsonNode point = results.at("/operatingPoints/0");
        assertEquals(7.5, point.at("/availableEbn0Db").asDouble());
        assertEquals(8, point.at("/schemes").size());
        JsonNode best = point.at("/schemes/0");
        for (String field : List.of(
                "code",
                "decoder",
                "modulation",
                "quantiser",
                "n",
                "k",
                "rate",
                "neededEbn0Db",
                "neededEbn0DbLow",
                "neededEbn0DbHigh",
                "neededMethod",
                "marginDb",
                "codingGainDb",
                "gapToShannonDb",
                "gapToModulationLimitDb",
                "gapToHardDecisionLimitDb",
                "gapToFiniteLengthDb",
                "uerUpper",
                "occupiedBandwidthHz",
                "meets",
                "fails",
                "tiedWithBest",
                "pareto")) {
            assertTrue(best.has(field), field);
        }
        assertTrue(best.at("/latencyS/total").asDouble() > 0);
        assertTrue(best.at("/operationsPerBit/worstCase").asDouble() > 0);
        assertEquals("12/24", best.at("/rate").asText());
        assertTrue(results.at("/cautions").size() >= 4);
    }

    @Test
    void csvHasARowAScheme() {
        Execution execution = run("--format", "csv");
        List<String> lines = execution.out().lines().toList();
        assertEquals(9, lines.size());
        assertTrue(lines.get(0).startsWith("rank,meets,code,decoder,modulation,quantiser,n,k,payloadRate,"));
    }

    @Test
    void theSameSeedGivesTheSameResultOnAnyNumberOfThreads() {
        JsonNode one = run("--format", "json", "--threads", "1").json().get("operatingPoints");
        assertEquals(one, run("--format", "json", "--threads", "2").json().get("operatingPoints"));
        assertFalse(one.equals(run("--format", "json", "--seed", "2").json().get("operatingPoints")));
    }

    @Test
    void aRequirementThatNothingMeetsIsAnswered() throws IOException {
        Files.writeString(file, REQUIREMENT.replace("availableEbn0Db: 7.5", "availableEbn0Db: 3.0"));
        Execution execution = run();
        assertEquals(ExitCode.OK, execution.exitCode(), execution.err());
        assertTrue(
                execution
                        .out()
                        .replace('\n', ' ')
                        .matches(
                                ".*No scheme meets every demand\\. golay:24,12 with maximum-likelihood on [BQ]PSK comes"
                                        + " closest; it misses Eb/N0 3\\.00 dB: needs [0-9.]+ dB more\\..*"),
                execution.out());
    }

    @Test
    void badInputLeavesNothingBehind() throws IOException {
        Files.writeString(file, REQUIREMENT.replace("fer: 1e-2", "fer: 2"));
        Execution execution = run();
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals(
                "nearlimit: " + file + ":8:27: target FER is 2.0, must be above 0 and below 0.5\n", execution.err());
        assertFalse(Files.exists(out));
        JsonNode error =
                new ObjectMapper().readTree(run("--format", "json").err()).get("error");
        assertEquals(8, error.get("line").asInt());
        assertEquals(file.toString(), error.get("file").asText());
    }

    @Test
    void anOutputThatIsAFileIsRefusedBeforeTheWork() throws IOException {
        Files.writeString(out, "mine");
        Execution execution = run();
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("nearlimit: " + out + ": --out is a file, a folder was expected\n", execution.err());
        assertEquals("mine", Files.readString(out));
    }

    @Test
    void anInterruptedRunSaysThatItIsIncomplete() {
        Interruption interruption = new Interruption();
        interruption.request();
        Execution execution = Execution.of(interruption, "shortlist", file.toString(), "--out", out.toString());
        assertEquals(ExitCode.INTERRUPTED, execution.exitCode());
        assertTrue(execution.out().contains("INCOMPLETE"), execution.out());
        assertTrue(Files.exists(out.resolve("report.html")));
    }
}
