package dev.nearlimit.cli.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import dev.nearlimit.cli.Session;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class RunsCommandTest {
    @TempDir
    Path folder;

    private Path journal;

    @BeforeEach
    void chooseTheJournal() {
        journal = folder.resolve("journal.sqlite");
    }

    private static JsonNode simulate(Path journal, String... more) {
        Execution execution = Execution.of(Stream.concat(
                        Stream.of(
                                "simulate",
                                "hamming:7,4",
                                "--decoder",
                                "syndrome",
                                "--frame-errors",
                                "1000000",
                                "--journal",
                                journal.toString(),
                                "--format",
                                "json"),
                        Stream.of(more))
                .toArray(String[]::new));
        assertEquals(ExitCode.OK, execution.exitCode(), execution.err());
        return execution.json();
    }

    private Execution runs(String... more) {
        return Execution.of(Stream.concat(Stream.of("runs", "--journal", journal.toString()), Stream.of(more))
                .toArray(String[]::new));
    }

    private JsonNode list() {
        return runs("--format", "json").json().get("runs");
    }

    @Test
    void listsWhatSimulateKept() {
        simulate(journal, "--ebn0", "2,3.5", "--frames", "60000");
        simulate(journal, "--channel", "bsc:0.05", "--seed", "7", "--frames", "1");
        JsonNode list = list();
        assertEquals(3, list.size());
        assertEquals(2.0, list.get(0).get("ebn0Db").asDouble());
        assertEquals(3.5, list.get(1).get("ebn0Db").asDouble());
        assertTrue(list.get(2).get("ebn0Db").isNull());
        assertEquals(7, list.get(2).get("seed").asInt());
        assertEquals("bsc:0.05", list.get(2).get("channel").asText());
        assertEquals(1, list.get(2).get("blocks").asInt());
        long frames = list.get(0).get("frames").asLong();
        assertTrue(frames >= 60000 && frames % list.get(0).get("blocks").asLong() == 0, list.toString());
        assertTrue(list.get(0).get("changed").asText().matches("20\\d\\d-\\d\\d-\\d\\dT\\d\\d:\\d\\d:\\d\\dZ"));
        assertTrue(list.get(0).get("tool").asText().startsWith("nearlimit "));

        List<String> csv = runs("--format", "csv").out().lines().toList();
        assertEquals(4, csv.size());
        assertEquals(
                "id,code,decoder,quantiser,modulation,channel,ebn0Db,seed,blocks,frames,created,changed,tool",
                csv.get(0));
        String table = runs().out();
        assertTrue(table.contains(list.get(0).get("id").asText()), table);
        assertTrue(table.contains("3 points, "), table);
        assertTrue(
                table.lines().filter(line -> !line.contains(journal.toString())).allMatch(l -> l.length() <= 80),
                table);
    }

    @Test
    void showsTheCountsThatSimulateGives() {
        JsonNode point = simulate(journal, "--ebn0", "2", "--frames", "60000").at("/points/0");
        JsonNode listed = list().get(0);
        String id = listed.get("id").asText();
        // All frames of the blocks are counted; so simulate is asked for as many.
        JsonNode whole = simulate(
                journal, "--ebn0", "2", "--frames", listed.get("frames").asText());
        assertEquals(0, whole.at("/performance/blocksComputed").asInt());
        JsonNode counted = runs(id, "--format", "json").json().get("counted");
        for (String field : List.of("frames", "frameErrors", "bitErrors", "undetectedErrors", "fer", "ber")) {
            assertEquals(whole.at("/points/0").get(field), counted.get(field), field);
        }
        assertTrue(
                counted.get("frameErrors").asInt() >= point.get("frameErrors").asInt());
        String table = runs(id.substring(0, 5)).out();
        assertTrue(
                table.contains("frame errors      " + counted.get("frameErrors").asText() + ", FER "), table);
        assertTrue(table.lines().allMatch(line -> line.length() <= 80), table);
        assertEquals(2, runs(id, "--format", "csv").out().lines().count());
    }

    @Test
    void mergesAnotherJournal() {
        Path other = folder.resolve("other.sqlite");
        simulate(journal, "--ebn0", "2", "--frames", "1");
        simulate(other, "--ebn0", "2,3", "--frames", "1");
        Execution merged = runs("--merge", other.toString());
        assertEquals(ExitCode.OK, merged.exitCode(), merged.err());
        assertEquals("merged " + other + ": 1 block of frames added, 1 known\n", merged.out());
        assertEquals(2, list().size());
        JsonNode again = simulate(journal, "--ebn0", "2,3", "--frames", "1");
        assertEquals(0, again.at("/performance/blocksComputed").asInt());
        refused(
                runs("--merge", folder.resolve("none").toString()),
                folder.resolve("none") + ": no such file, a journal was expected");
        refused(runs("--merge", journal.toString()), journal + ": is the journal itself, another one was expected");
    }

    @Test
    void forgetsAPoint() {
        simulate(journal, "--ebn0", "2,3", "--frames", "1");
        String id = list().get(0).get("id").asText();
        Execution forgotten = runs("--forget", id);
        assertEquals("forgot " + id + " with 1 block of frames\n", forgotten.out());
        assertEquals(1, list().size());
        refused(runs("--forget", id), "the journal keeps no point with ID '" + id + "' (nearlimit runs lists them)");
        assertEquals(
                1,
                simulate(journal, "--ebn0", "2,3", "--frames", "1")
                        .at("/performance/blocksComputed")
                        .asInt());
    }

    @Test
    void anIdMustFitOnePoint() {
        simulate(journal, "--ebn0", "0:0.5:8", "--frames", "1");
        // Of 17 points two share the first of 16 digits.
        String shared = Stream.of("0123456789abcdef".split(""))
                .filter(digit -> matching(digit) > 1)
                .findFirst()
                .orElseThrow();
        refused(
                runs(shared),
                "ID '" + shared + "' fits " + matching(shared) + " points of the journal; give more of its digits");
        refused(runs("xyz"), "the journal keeps no point with ID 'xyz' (nearlimit runs lists them)");
        refused(runs(""), "the journal keeps no point with ID '' (nearlimit runs lists them)");
    }

    private long matching(String digit) {
        long count = 0;
        for (JsonNode run : list()) {
            count += run.get("id").asText().startsWith(digit) ? 1 : 0;
        }
        return count;
    }

    @Test
    void aUsualJournalThatIsNotThereYetIsEmptyAndNotMadeByLooking() throws IOException {
        Path usual = folder.resolve("data/nearlimit/journal.sqlite");
        Session session = new Session(false, new Interruption(), Optional.of(usual));
        assertEquals(
                "The journal " + usual + " keeps nothing yet.\n",
                Execution.of(session, "runs").out());
        refused(
                Execution.of(session, "runs", "3f"),
                "the journal keeps no point with ID '3f' (nearlimit runs lists them)");
        refused(
                Execution.of(session, "runs", "--merge", folder.resolve("none").toString()),
                folder.resolve("none") + ": no such file, a journal was expected");
        assertFalse(Files.exists(usual));
        simulate(journal, "--ebn0", "2", "--frames", "1");
        assertEquals(
                ExitCode.OK,
                Execution.of(session, "runs", "--merge", journal.toString()).exitCode());
        assertTrue(Execution.of(session, "runs").out().contains("1 point, 1 block of frames in "));
    }

    private static void refused(Execution execution, String message) {
        assertEquals("nearlimit: " + message + "\n", execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("", execution.out());
    }
}
