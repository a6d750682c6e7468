package dev.nearlimit.cli.simulate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class SweepCommandTest {
    @TempDir
    Path folder;

    private static String[] arguments(String decoder, String... more) {
        return Stream.concat(
                        Stream.of(
                                "simulate",
                                "ldpc-802.11n:648,1/2",
                                "--decoder",
                                decoder,
                                "--ebn0",
                                "1.5,2",
                                "--frames",
                                "256"),
                        Stream.of(more))
                .toArray(String[]::new);
    }

    /** What a sweep measures is what simulate measures with the setting fixed. */
    @Test
    void eachCombinationIsAnOrdinaryRun() {
        JsonNode sweep = Execution.of(arguments("min-sum:iterations=4", "--sweep", "word=4..6:2", "--format", "json"))
                .json()
                .get("sweep");
        assertEquals(2, sweep.size());
        for (JsonNode combination : sweep) {
            String word = combination.get("settings").get("word").asText();
            JsonNode plain = Execution.of(arguments("min-sum:iterations=4,word=" + word, "--format", "json"))
                    .json();
            assertEquals(
                    plain.get("scheme").get("quantiser").asText(),
                    combination.get("quantiser").asText());
            for (int p = 0; p < 2; p++) {
                ObjectNode point = (ObjectNode) combination.get("points").get(p);
                point.remove("comparison");
                assertEquals(plain.get("points").get(p), point);
            }
        }
    }

    @Test
    void decoderAndChannelSettingsMakeAGrid() {
        Execution table = Execution.of(arguments(
                "min-sum:iterations=4,word=5", "--sweep", "step=0.25,0.5", "--sweep", "noise-estimate=-1..1"));
        assertEquals(0, table.exitCode(), table.err());
        assertTrue(table.out().contains("FER over the best's"), table.out());
        assertTrue(table.out().lines().allMatch(line -> line.length() <= 100), table.out());
        Execution csv = Execution.of(arguments(
                "min-sum:iterations=4,word=5",
                "--sweep",
                "step=0.25,0.5",
                "--sweep",
                "noise-estimate=-1..1",
                "--format",
                "csv"));
        List<String> lines = csv.out().lines().toList();
        assertEquals(1 + 2 * 2 * 3, lines.size());
        assertTrue(lines.get(0).startsWith("step,noise-estimate,decoder,quantiser,channel,ebn0Db,"), lines.get(0));
        assertTrue(lines.get(1).startsWith("0.25,-1,"), lines.get(1));
        assertTrue(lines.get(1).contains(",awgn:noise-estimate=-1,1.5,"), lines.get(1));
        assertTrue(lines.get(2).contains(",awgn,1.5,"), lines.get(2));
    }

    @Test
    void pairedComparisonSeesCommonNoise() {
        JsonNode sweep = Execution.of(arguments(
                        "min-sum:iterations=4,word=5", "--sweep", "early-stop=true,false", "--format", "json"))
                .json()
                .get("sweep");
        // Without early stopping a frame may leave a codeword again, but nearly all end as with it: were the noise not
        // common, failures of one alone would abound.
        JsonNode comparison = sweep.get(1).get("points").get(0).get("comparison");
        assertTrue(comparison.get("failedByBoth").asInt() > 20, comparison.toString());
        assertTrue(
                comparison.get("failedByThisOnly").asInt()
                                + comparison.get("failedByBestOnly").asInt()
                        <= 2,
                comparison.toString());
        assertTrue(comparison.get("tiedWithBest").asBoolean());
    }

    @Test
    void sweepGoesOnFromItsJournal() {
        String[] arguments = arguments(
                "min-sum:iterations=4",
                "--sweep",
                "word=4,5",
                "--format",
                "json",
                "--journal",
                folder.resolve("j").toString());
        JsonNode first = Execution.of(arguments).json();
        JsonNode second = Execution.of(arguments).json();
        assertEquals(first.get("sweep"), second.get("sweep"));
        assertEquals(0, second.get("performance").get("blocksComputed").asInt());
    }

    @Test
    void interruptedSweepPrintsWhatItHas() {
        Interruption interruption = new Interruption();
        interruption.request();
        Execution execution =
                Execution.of(interruption, arguments("min-sum", "--sweep", "word=4,5", "--format", "json"));
        assertEquals(ExitCode.INTERRUPTED, execution.exitCode());
        assertFalse(execution.json().get("complete").asBoolean());
        assertEquals("interrupt", execution.json().get("endedBy").asText());
        assertEquals(2, execution.json().get("requestedEbn0Db").size());
    }
}
