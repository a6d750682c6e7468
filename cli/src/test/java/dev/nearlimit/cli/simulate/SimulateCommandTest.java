package dev.nearlimit.cli.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import dev.nearlimit.simulation.statistics.RelativeWidth;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class SimulateCommandTest {
    private static Execution simulate(String... more) {
        return Execution.of(Stream.concat(
                        Stream.of("simulate", "hamming:7,4", "--decoder", "syndrome", "--frames", "20000"),
                        Stream.of(more))
                .toArray(String[]::new));
    }

    @Test
    void jsonHasTheFieldsThatAreFixed() {
        JsonNode result =
                simulate("--ebn0", "3:1:4", "--seed", "7", "--format", "json").json();
        assertEquals("hamming:7,4", result.get("scheme").get("code").asText());
        assertEquals("awgn", result.get("scheme").get("channel").asText());
        assertEquals(7, result.get("seed").asInt());
        assertEquals(2, result.get("points").size());
        assertEquals(
                List.of(
                        "ebn0Db",
                        "frames",
                        "frameErrors",
                        "bitErrors",
                        "undetectedErrors",
                        "fer",
                        "ferLow",
                        "ferHigh",
                        "ber",
                        "berLow",
                        "berHigh",
                        "averageIterations",
                        "complete",
                        "stoppedBy",
                        "detectedErrors",
                        "uer",
                        "uerHigh",
                        "iterations",
                        "bitErrorsPerFailedFrame"),
                names(result.get("points").get(0)));
        assertEquals(
                List.of(
                        "scheme",
                        "seed",
                        "stoppingRule",
                        "requestedEbn0Db",
                        "complete",
                        "endedBy",
                        "points",
                        "performance"),
                names(result));
        assertEquals("[3.0,4.0]", result.get("requestedEbn0Db").toString());
        assertTrue(result.get("complete").asBoolean());
        assertEquals(
                List.of(
                        "kernel",
                        "threads",
                        "codedMbPerS",
                        "framesPerS",
                        "elapsedS",
                        "blocksComputed",
                        "blocksFromJournal"),
                names(result.get("performance")));
    }

    /**
     * The FER of a perfect code is P(more than one of 7 bits wrong), here 1 - 0.95^7 - 7 0.05 0.95^6 = 0.04438 (common
     * practice). The seed is fixed; a fresh one would give an interval of 95 % that misses in one run of twenty, so the
     * check allows six standard deviations of the count, missed by chance once in 5e8.
     */
    @Test
    void hammingCodeOverTheBinarySymmetricChannelHasItsExactRate() {
        JsonNode point = simulate("--channel", "bsc:0.05", "--frame-errors", "20000", "--format", "json")
                .json()
                .get("points")
                .get(0);
        double exact = 1 - Math.pow(0.95, 7) - 7 * 0.05 * Math.pow(0.95, 6);
        double allowed = 6 * Math.sqrt(exact * (1 - exact) / 20000);
        assertTrue(point.get("ebn0Db").isNull());
        assertEquals(20000, point.get("frames").asInt());
        assertEquals(exact, point.get("fer").asDouble(), allowed);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2", "3"})
    void countsDoNotDependOnThreads(String threads) {
        String[] same = {"--ebn0", "2,4", "--format", "csv"};
        Execution one = simulate(with(same, "--threads", "1"));
        assertEquals(0, one.exitCode(), one.err());
        assertEquals(one.out(), simulate(with(same, "--threads", threads)).out());
    }

    @Test
    void seedChoosesTheFrames() {
        assertFalse(simulate("--ebn0", "2", "--format", "csv", "--seed", "1")
                .out()
                .equals(simulate("--ebn0", "2", "--format", "csv", "--seed", "2")
                        .out()));
    }

    @Test
    void pointEndsAtTheFrameErrorAskedFor() {
        JsonNode point = simulate("--ebn0", "0", "--frame-errors", "30", "--format", "json")
                .json()
                .get("points")
                .get(0);
        assertEquals(30, point.get("frameErrors").asInt());
        assertTrue(point.get("complete").asBoolean());
        assertTrue(point.get("ferLow").asDouble() < point.get("fer").asDouble());
        assertTrue(point.get("ferHigh").asDouble() > point.get("fer").asDouble());
    }

    @Test
    void tablePutsEachRateBesideItsIntervalAndTimesLast() {
        Execution execution = simulate("--ebn0", "3", "--threads", "1");
        List<String> lines = execution.out().lines().toList();
        assertTrue(lines.stream().allMatch(line -> line.length() <= 80), execution.out());
        assertTrue(
                lines.stream()
                        .anyMatch(line -> line.matches(" *3\\.00 +FER +\\d\\.\\de-\\d +\\d\\.\\de-\\d \\.\\. .*")),
                execution.out());
        int closing = lines.indexOf(lines.stream()
                .filter(line -> line.startsWith("Took "))
                .findFirst()
                .orElseThrow());
        assertTrue(closing >= lines.size() - 2, execution.out());
        assertTrue(lines.subList(0, closing).stream().noneMatch(line -> line.contains("/s")), execution.out());
    }

    @Test
    void interruptedRunPrintsWhatItHasAndSaysSo() {
        Interruption interruption = new Interruption();
        Thread user = new Thread(() -> {
            sleepBriefly();
            interruption.request();
        });
        user.start();
        Execution execution = Execution.of(
                interruption,
                "simulate",
                "hamming:7,4",
                "--decoder",
                "syndrome",
                "--ebn0",
                "0,30",
                "--frames",
                "1000000000000");
        assertEquals(ExitCode.INTERRUPTED, execution.exitCode(), execution.err());
        assertTrue(execution.out().contains("Incomplete: 1 of 2 points were finished."), execution.out());
        assertTrue(execution.out().contains("incomplete\n"), execution.out());
    }

    /** Every way in which a point can end is told from the others, in each format. */
    @Test
    void whatEndedAPointIsSaid() {
        assertEquals("frameErrors", stoppedBy("--ebn0", "0", "--frame-errors", "30"));
        assertEquals("frames", stoppedBy("--ebn0", "30"));
        String[] outOfTime = {
            "simulate",
            "hamming:7,4",
            "--decoder",
            "syndrome",
            "--ebn0",
            "30",
            "--frames",
            "1000000000000",
            "--time-limit",
            "4s",
            "--format"
        };
        JsonNode result = Execution.of(with(outOfTime, "json")).json();
        assertEquals("timeLimit", result.get("points").get(0).get("stoppedBy").asText());
        assertFalse(result.get("complete").asBoolean());
        assertEquals("timeLimit", result.get("endedBy").asText());
        assertEquals(4.0, result.get("stoppingRule").get("timeLimitS").asDouble());
        assertTrue(Execution.of(with(outOfTime, "csv")).out().contains(",false,timeLimit,"));
        assertTrue(Execution.of(with(outOfTime, "table")).out().contains("not reproducible"));
    }

    private static String stoppedBy(String... more) {
        return simulate(with(more, "--format", "json"))
                .json()
                .get("points")
                .get(0)
                .get("stoppedBy")
                .asText();
    }

    @Test
    void relativeWidthGivesAnIntervalAsNarrow() {
        JsonNode result = simulate("--ebn0", "2", "--relative-width", "0.4", "--format", "json")
                .json();
        JsonNode point = result.get("points").get(0);
        double width = point.get("ferHigh").asDouble() - point.get("ferLow").asDouble();
        assertEquals("frameErrors", point.get("stoppedBy").asText());
        assertTrue(width <= 0.4 * point.get("fer").asDouble(), point.toString());
        assertEquals(0.4, result.get("stoppingRule").get("relativeWidth").asDouble());
        assertEquals(
                point.get("frameErrors").asInt(),
                result.get("stoppingRule").get("frameErrors").asInt());
        // The figure that the help gives.
        assertTrue(Execution.of("simulate", "--help").out().contains("384"));
        assertEquals(384, RelativeWidth.frameErrors(0.2));
    }

    /** Of several limits the first that is reached counts, and the rule says which one it was. */
    @Test
    void fewerFrameErrorsThanTheWidthTakesComeFirst() {
        JsonNode rule = simulate("--ebn0", "2", "--relative-width", "0.4", "--frame-errors", "20", "--format", "json")
                .json()
                .get("stoppingRule");
        assertEquals(20, rule.get("frameErrors").asInt());
        assertTrue(rule.get("relativeWidth").isNull());
    }

    /** The decoder of a perfect code never declares a failure; bounded distance on most codes mostly does. */
    @Test
    void detailsTellKindsOfFailuresApart() {
        JsonNode perfect =
                simulate("--ebn0", "2", "--format", "json").json().get("points").get(0);
        assertEquals(0, perfect.get("detectedErrors").asInt());
        assertEquals(100, perfect.get("undetectedErrors").asInt());
        JsonNode bounded = Execution.of(
                        "simulate", "bch:63,45", "--decoder", "bounded-distance", "--ebn0", "3", "--format", "json")
                .json()
                .get("points")
                .get(0);
        assertTrue(bounded.get("detectedErrors").asInt() > 50, bounded.toString());
        assertEquals(
                100,
                bounded.get("detectedErrors").asInt()
                        + bounded.get("undetectedErrors").asInt());
    }

    /** Histograms hold the very frames that the counts do, and means follow from them. */
    @Test
    void histogramsAddUp() {
        Execution json = Execution.of(
                "simulate",
                "ldpc-802.11n:648,1/2",
                "--decoder",
                "min-sum:iterations=10",
                "--ebn0",
                "1.25",
                "--frames",
                "300",
                "--format",
                "json");
        JsonNode point = json.json().get("points").get(0);
        long frames = 0;
        long iterations = 0;
        for (JsonNode bin : point.get("iterations").get("histogram")) {
            frames += bin.get("frames").asLong();
            iterations += bin.get("frames").asLong() * bin.get("iterations").asLong();
        }
        assertEquals(point.get("frames").asLong(), frames);
        assertEquals(point.get("averageIterations").asDouble(), (double) iterations / frames, 1e-12);
        long failed = 0;
        for (JsonNode bin : point.get("bitErrorsPerFailedFrame").get("histogram")) {
            failed += bin.get("frames").asLong();
        }
        assertEquals(point.get("frameErrors").asLong(), failed);
        assertEquals(
                point.get("bitErrors").asDouble() / failed,
                point.get("bitErrorsPerFailedFrame").get("mean").asDouble(),
                1e-9);
    }

    @Test
    void detailsAndLongDesignatorsFitATerminal() {
        Execution execution = Execution.of(
                "simulate",
                "ldpc-802.11n:648,1/2",
                "--decoder",
                "min-sum:iterations=10,word=5",
                "--ebn0",
                "1.25",
                "--frames",
                "300",
                "--details");
        assertTrue(execution.out().lines().allMatch(line -> line.length() <= 80), execution.out());
        assertTrue(execution.out().contains(" detected, "), execution.out());
        assertTrue(execution.out().contains("wrong bits "), execution.out());
        assertTrue(execution.out().contains("iterations "), execution.out());
    }

    @Test
    void timeLimitEndsARun() {
        Execution execution = Execution.of(
                "simulate",
                "hamming:7,4",
                "--decoder",
                "syndrome",
                "--ebn0",
                "30",
                "--frames",
                "1000000000000",
                "--time-limit",
                "4s",
                "--format",
                "json");
        assertEquals(0, execution.exitCode(), execution.err());
        JsonNode point = execution.json().get("points").get(0);
        assertFalse(point.get("complete").asBoolean());
        assertEquals(0, point.get("frameErrors").asInt());
        // No error seen still bounds the rate.
        assertTrue(point.get("ferHigh").asDouble() > 0);
    }

    private static String[] with(String[] arguments, String... more) {
        return Stream.concat(Stream.of(arguments), Stream.of(more)).toArray(String[]::new);
    }

    private static List<String> names(JsonNode node) {
        List<String> names = new ArrayList<>();
        node.fieldNames().forEachRemaining(names::add);
        return names.stream().collect(Collectors.toList());
    }

    private static void sleepBriefly() {
        try {
            Thread.sleep(1500);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
