package dev.nearlimit.cli.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class InspectCommandTest {
    /** MacWilliams and Sloane 1977, ch. 2: 253 words of weight 7, 506 of 8, 1288 of 11 and 12. */
    @Test
    void jsonHasTheWholeWeightEnumerator() {
        JsonNode code =
                Execution.of("inspect", "golay:23,12", "--format", "json").json();
        assertEquals(7, code.get("minimumDistance").get("value").asInt());
        assertEquals("proven", code.get("minimumDistance").get("status").asText());
        assertEquals("exact", code.get("weightEnumeratorStatus").asText());
        assertEquals(8, code.get("weightEnumerator").size());
        assertEquals(11, code.get("weightEnumerator").get(3).get("weight").asInt());
        JsonNode count = code.get("weightEnumerator").get(3).get("count");
        assertTrue(count.isTextual());
        assertEquals("1288", count.asText());
        assertEquals(11, code.get("rank").asInt());
    }

    /** Tanner 1981 graphs of IEEE 802.11n matrices: no enumeration of 2^324 words is begun. */
    @Test
    void codeTooLargeToEnumerateIsDescribedAllTheSame() {
        JsonNode code = Execution.of("inspect", "ldpc-802.11n:648,1/2", "--format", "json")
                .json();
        assertEquals(0, code.get("weightEnumerator").size());
        assertTrue(code.get("weightEnumeratorStatus").asText().contains("2^324"));
        assertTrue(code.get("minimumDistance").get("value").isNull());
        assertEquals(6, code.get("girth").asInt());
        assertEquals(0, code.get("bounds").size());
    }

    @Test
    void tableFitsEightyColumnsAndShortensLongEnumerators() {
        Execution execution = Execution.of("inspect", "bch:127,106");
        assertEquals(0, execution.exitCode(), execution.err());
        assertTrue(execution.out().lines().allMatch(line -> line.length() <= 80), execution.out());
        assertTrue(execution.out().contains("\n    ..  "), execution.out());
        assertTrue(execution.out().lines().count() < 60, execution.out());
    }

    @Test
    void boundsAreThoseOfTheEbn0AskedFor() {
        JsonNode bounds = Execution.of("inspect", "repetition:3", "--ebn0", "0,9.5", "--format", "json")
                .json()
                .get("bounds");
        assertEquals(2, bounds.size());
        assertEquals(9.5, bounds.get(1).get("ebn0Db").asDouble());
        // One other word, at distance 3 = n: FER = Q(sqrt(2 Eb/N0)), 7.8650e-2 at 0 dB (common practice).
        assertEquals(7.8650e-2, bounds.get(0).get("fer").asDouble(), 1e-6);
        assertEquals("bound", bounds.get(0).get("ferBasis").asText());
    }

    @Test
    void ownMatrixWithDependentRowsIsAccepted(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("h.csv");
        Files.writeString(file, "1,1,0,1\n0,1,1,1\n1,0,1,0\n");
        JsonNode code = Execution.of("inspect", file.toString(), "--matrix", "parity", "--format", "json")
                .json();
        assertEquals(2, code.get("k").asInt());
        assertEquals(1, code.get("redundantChecks").asInt());
        assertEquals(file.toString(), code.get("code").asText());
    }

    @Test
    void csvNamesEveryQuantity() {
        Execution execution = Execution.of("inspect", "hamming:7,4", "--format", "csv", "--ebn0", "3");
        assertTrue(execution.out().startsWith("quantity,at,value,basis\ncode,,\"hamming:7,4\","), execution.out());
        assertTrue(execution.out().contains("\nwordsOfWeight,3,7,exact\n"), execution.out());
        assertTrue(execution.out().contains("\nunionBoundFer,3.0,"), execution.out());
    }

    @Test
    void interruptionEndsAnEnumeration() {
        Interruption interruption = new Interruption();
        interruption.request();
        Execution execution = Execution.of(interruption, "inspect", "bch:127,106");
        assertEquals(ExitCode.INTERRUPTED, execution.exitCode());
        assertEquals("nearlimit: interrupted\n", execution.err());
    }
}
