package dev.nearlimit.cli.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class RareErrorsCommandTest {
    private static final String[] HAMMING = {
        "rare-errors",
        "hamming:7,4",
        "--decoder",
        "maximum-likelihood",
        "--sets",
        "lightest",
        "--ebn0",
        "6,10.6",
        "--frames",
        "5000"
    };

    @TempDir
    Path folder;

    @Test
    void tableSaysWhatTheEstimateIsAPartOf() {
        Execution execution = Execution.of(HAMMING);
        assertEquals(0, execution.exitCode(), execution.err());
        String out = execution.out();
        assertTrue(out.contains("7 of weight 3, all codewords (lightest)"), out);
        assertTrue(out.contains("part of the frame error rate due to these sets, for this decoder and"), out);
        assertTrue(out.contains("errors with other causes are not in it"), out);
        assertTrue(out.contains("effective"), out);
        assertTrue(out.lines().allMatch(line -> line.length() <= 80), out);
    }

    @Test
    void jsonHasTheContractFields() {
        JsonNode json = Execution.of(with(HAMMING, "--format", "json")).json();
        assertEquals("hamming:7,4", json.at("/scheme/code").asText());
        assertEquals(7, json.at("/sets/count").asInt());
        assertEquals(7, json.at("/sets/codewords").asInt());
        assertEquals(3, json.at("/sets/leastWeight").asInt());
        assertEquals(0.75, json.at("/shifts/1").asDouble());
        assertEquals(2, json.get("points").size());
        JsonNode point = json.at("/points/1");
        double part = point.get("ferPart").asDouble();
        double bound = point.get("unionBound").asDouble();
        // Union bound over 7 words of weight 3: 7 Q(sqrt(24/7 Eb/N0)) = 7 Q(6.274) = 1.230e-9 at 10.6 dB. Relative
        // error about 3 %.
        assertEquals(1.230e-9, bound, 0.001e-9);
        assertEquals(bound, part, 0.25 * bound);
        assertTrue(point.get("ferPartLow").asDouble() < part
                && part < point.get("ferPartHigh").asDouble());
        assertEquals(
                Math.sqrt(point.get("variance").asDouble()) / part,
                point.get("relativeError").asDouble(),
                1e-12);
        assertEquals(5000, point.get("frames").asInt());
        assertTrue(point.get("effectiveSampleSize").asDouble() > 100);
        assertTrue(point.get("largestShare").asDouble() < 0.1);
        assertTrue(point.get("complete").asBoolean());
        assertTrue(json.get("definition").asText().startsWith("part of the frame error rate due to these sets"));
    }

    @Test
    void doesNotDependOnThreads() {
        ObjectNode one = (ObjectNode) Execution.of(with(HAMMING, "--format", "json", "--threads", "1"))
                .json();
        ObjectNode two = (ObjectNode) Execution.of(with(HAMMING, "--format", "json", "--threads", "2"))
                .json();
        assertEquals(one.get("points"), two.get("points"));
    }

    /** Sets of a file are positions of the code; those that are no codewords get no bound. */
    @Test
    void setsComeFromAFile() throws IOException {
        Path file = Files.writeString(
                folder.resolve("sets.txt"), "# two bits, too light for a codeword\n0, 1\n\n3\t4 5 6 # and a word\n");
        String[] args = {
            "rare-errors",
            "hamming:7,4",
            "--decoder",
            "min-sum:word=4",
            "--sets",
            file.toString(),
            "--ebn0",
            "4",
            "--frames",
            "5000",
            "--shifts",
            "0.4,0.8"
        };
        JsonNode json = Execution.of(with(args, "--format", "json")).json();
        assertEquals(2, json.at("/sets/count").asInt());
        assertTrue(json.at("/sets/codewords").asInt() < 2);
        assertEquals(4, json.at("/sets/greatestWeight").asInt());
        assertTrue(json.at("/points/0/unionBound").isNull());
        assertFalse(Execution.of(args).out().contains("ML bound"));
        String csv = Execution.of(with(args, "--format", "csv")).out();
        assertEquals(
                "ebn0Db,frames,errors,ferPart,ferPartLow,ferPartHigh,variance,effectiveSampleSize,largestShare,"
                        + "unionBound,complete",
                csv.lines().findFirst().orElseThrow());
        assertEquals(2, csv.lines().count());
    }

    @Test
    void wordsUpToAWeight() {
        JsonNode json = Execution.of(
                        "rare-errors",
                        "hamming:7,4",
                        "--decoder",
                        "syndrome",
                        "--sets",
                        "weight:4",
                        "--ebn0",
                        "8",
                        "--frames",
                        "1000",
                        "--format",
                        "json")
                .json();
        assertEquals(14, json.at("/sets/count").asInt());
        assertEquals(14, json.at("/sets/codewords").asInt());
    }

    @Test
    void interruptedRunPrintsWhatItHas() {
        Interruption interruption = new Interruption();
        interruption.request();
        Execution execution = Execution.of(interruption, HAMMING);
        assertEquals(ExitCode.INTERRUPTED, execution.exitCode());
        assertTrue(execution.out().contains("Incomplete: 0 of 2 points were finished."), execution.out());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '"',
            value = {
                "0 1 7 | :1:5: found '7', expected a position from 0 to 6",
                "0 1;2,x1 | :2:3: found 'x1', expected a position from 0 to 6",
                "0 -1 | :1:3: found '-1', expected a position from 0 to 6",
                "0 3 0 | :1:5: found position 0 twice in a set, expected each once",
                "0 3;1 2;3 0 | :3: found the set of line 1 again, expected each once",
                "# nothing; | : found no set, expected one a line: positions counted from 0",
            })
    void badFileIsLocated(String content, String message) throws IOException {
        Path file = Files.writeString(folder.resolve("sets.txt"), content.replace(";", "\n"));
        Execution execution = Execution.of(
                "rare-errors", "hamming:7,4", "--decoder", "syndrome", "--sets", file.toString(), "--ebn0", "4");
        assertEquals("nearlimit: " + file + message + "\n", execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("", execution.out());
    }

    private static String[] with(String[] args, String... more) {
        String[] all = java.util.Arrays.copyOf(args, args.length + more.length);
        System.arraycopy(more, 0, all, args.length, more.length);
        return all;
    }
}
