package dev.nearlimit.cli.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class LimitCommandTest {
    /** 0.187 dB for binary input and 1.772 dB for hard decisions at rate 1/2: printed in many places (common practice). */
    @Test
    void tableShowsTheLimitsAtRateOneHalf() {
        Execution execution = Execution.of("limit", "--rate", "1/2");
        assertEquals(0, execution.exitCode(), execution.err());
        assertTrue(execution.out().contains("shannon       0.0000"), execution.out());
        assertTrue(execution.out().contains("modulation    0.1871"), execution.out());
        assertTrue(execution.out().contains("hardDecision  1.7725"), execution.out());
        assertTrue(execution.out().lines().allMatch(line -> line.length() <= 80), execution.out());
    }

    @Test
    void jsonHasTheRowsInTheirOrder() {
        JsonNode limits = Execution.of(
                        "limit",
                        "--length",
                        "648",
                        "--information",
                        "324",
                        "--fer",
                        "1e-3",
                        "--ber",
                        "1e-5",
                        "--modulation",
                        "qpsk",
                        "--format",
                        "json")
                .json()
                .get("limits");
        String[] names = {"shannon", "modulation", "hardDecision", "uncoded", "normalApproximation"};
        assertEquals(names.length, limits.size());
        for (int i = 0; i < names.length; i++) {
            assertEquals(names[i], limits.get(i).get("name").asText());
        }
        // QPSK carries rate 1/2 on each of two dimensions, so that Es/N0 is Eb/N0.
        assertEquals(1.0, limits.get(0).get("efficiencyBitsPerSymbol").asDouble());
        assertEquals(limits.get(1).get("ebn0Db"), limits.get(1).get("esn0Db"));
    }

    @Test
    void csvHasOneRecordALimit() {
        Execution execution = Execution.of("limit", "--rate", "0.5", "--format", "csv");
        assertEquals(
                "name,ebn0Db,esn0Db,snrDb,efficiencyBitsPerRealDimension,efficiencyBitsPerSymbol,definition,method",
                execution.out().lines().findFirst().orElseThrow());
        assertEquals(4, execution.out().lines().count());
    }

    @Test
    void outWritesTheFileAndPrintsNothing(@TempDir Path folder) throws IOException {
        Path target = folder.resolve("limits.json");
        Execution execution = Execution.of("limit", "--rate", "1/3", "--format", "json", "--out", target.toString());
        assertEquals(0, execution.exitCode(), execution.err());
        assertEquals("", execution.out());
        assertEquals(Execution.of("limit", "--rate", "1/3", "--format", "json").out(), Files.readString(target));
        try (var files = Files.list(folder)) {
            assertEquals(1, files.count());
        }
    }

    @Test
    void stepStandsBesideTheBest() {
        Execution execution = Execution.of("limit", "--rate", "1/2", "--word", "4", "--step", "2");
        assertEquals(0, execution.exitCode(), execution.err());
        assertTrue(execution.out().contains("4-bit mid-tread  "), execution.out());
        assertTrue(execution.out().contains("4-bit mid-tread, best step"), execution.out());
        assertTrue(execution.out().lines().allMatch(line -> line.length() <= 80), execution.out());
        JsonNode json = Execution.of("limit", "--rate", "1/2", "--word", "4", "--step", "2", "--format", "json")
                .json();
        assertEquals("quantised", json.at("/limits/3/name").asText());
        assertEquals("quantisedBestStep", json.at("/limits/4/name").asText());
        JsonNode quantiser = json.get("quantiser");
        assertEquals(2.0, quantiser.get("step").asDouble());
        double unquantised = json.at("/limits/1/ebn0Db").asDouble();
        assertEquals(
                json.at("/limits/3/ebn0Db").asDouble() - unquantised,
                quantiser.get("lossDb").asDouble(),
                1e-9);
        assertEquals(
                json.at("/limits/4/ebn0Db").asDouble() - unquantised,
                quantiser.get("bestLossDb").asDouble(),
                1e-9);
        assertTrue(
                quantiser.get("bestLossDb").asDouble() < quantiser.get("lossDb").asDouble());
        JsonNode best = Execution.of("limit", "--rate", "1/2", "--word", "4", "--format", "json")
                .json()
                .get("quantiser");
        assertEquals(quantiser.get("bestStep"), best.get("bestStep"));
        assertTrue(best.path("step").isMissingNode());
    }

    @Test
    void clipSetsTheStep() {
        JsonNode quantiser = Execution.of(
                        "limit",
                        "--rate",
                        "1/2",
                        "--word",
                        "3",
                        "--clip",
                        "7",
                        "--rise",
                        "mid-rise",
                        "--format",
                        "json")
                .json()
                .get("quantiser");
        assertEquals(2.0, quantiser.get("step").asDouble());
        assertEquals("mid-rise", quantiser.get("rise").asText());
    }

    /** One bit is the hard decision, which has its row already and no step. */
    @Test
    void oneBitIsTheHardDecision() {
        JsonNode json = Execution.of("limit", "--rate", "1/2", "--word", "1", "--rise", "mid-rise", "--format", "json")
                .json();
        assertEquals(4, json.get("limits").size());
        assertEquals(
                json.at("/limits/2/ebn0Db").asDouble(),
                json.at("/limits/3/ebn0Db").asDouble(),
                1e-8);
        assertTrue(json.at("/quantiser/bestStep").isMissingNode());
        assertTrue(Execution.of("limit", "--rate", "1/2", "--word", "1", "--rise", "mid-rise")
                .out()
                .contains("1-bit mid-rise"));
    }
}
