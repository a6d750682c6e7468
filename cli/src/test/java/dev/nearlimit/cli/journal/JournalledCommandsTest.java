package dev.nearlimit.cli.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import dev.nearlimit.cli.Execution;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Interruption;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.ToolProcess;
import dev.nearlimit.journal.JournalCatalogue;
import dev.nearlimit.journal.KeptJob;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** simulate and shortlist with a journal: cut off, side by side, and with a journal that fails. */
final class JournalledCommandsTest {
    private static final String[] HAMMING = {
        "simulate",
        "hamming:7,4",
        "--decoder",
        "syndrome",
        "--ebn0",
        "2,3",
        "--frames",
        "200000",
        "--frame-errors",
        "200000",
        "--format",
        "json"
    };
    private static final String[] LDPC = {
        "simulate",
        "ldpc-802.11n:648,1/2",
        "--decoder",
        "min-sum:word=5",
        "--ebn0",
        "1,1.25",
        "--frames",
        "4000",
        "--frame-errors",
        "4000",
        "--format",
        "json"
    };

    /** Some two dozen blocks, of a tenth of a second and more without the better compiler. */
    private static final String[] SHARED = {
        "simulate",
        "ldpc-802.11n:648,1/2",
        "--decoder",
        "min-sum:word=5",
        "--ebn0",
        "1.25",
        "--frames",
        "1600",
        "--frame-errors",
        "1600",
        "--format",
        "json"
    };

    private static final String[] HAMMING_TABLE = Arrays.copyOf(HAMMING, HAMMING.length - 2);

    /** Blocks that a whole run of HAMMING takes; a frame limit is reached by no block too many. */
    private static final long BLOCKS =
            Execution.of(HAMMING).json().at("/performance/blocksComputed").asLong();

    @TempDir
    Path folder;

    private Path journal;

    @BeforeEach
    void chooseTheJournal() {
        journal = folder.resolve("journal.sqlite");
    }

    private static Execution run(String[] command, String... more) {
        return Execution.of(with(command, more));
    }

    private static String[] with(String[] command, String... more) {
        return Stream.concat(Stream.of(command), Stream.of(more)).toArray(String[]::new);
    }

    private long blocksKept() {
        if (!Files.exists(journal)) {
            return 0;
        }
        try (JournalCatalogue catalogue = JournalCatalogue.open(journal)) {
            return catalogue.jobs().stream().mapToLong(KeptJob::pieces).sum();
        }
    }

    private static long blocks(JsonNode result, String origin) {
        return result.at("/performance/" + origin).asLong();
    }

    @Test
    void aKilledRunEndsWithTheTableOfAnUninterruptedOne() throws IOException, InterruptedException {
        String[] command = with(LDPC, "--journal", journal.toString(), "--threads", "2");
        long kept = 0;
        for (int round = 0; round < 3; round++) {
            ToolProcess process = ToolProcess.start(folder, command);
            while (blocksKept() < kept + 3) {
                assertTrue(process.isAlive(), "ended before it could be killed");
                Thread.sleep(10);
            }
            process.kill();
            kept = blocksKept();
        }
        JsonNode resumed = run(command).json();
        JsonNode whole = run(LDPC, "--no-journal", "--threads", "1").json();
        assertEquals(whole.get("points"), resumed.get("points"));
        assertEquals(kept, blocks(resumed, "blocksFromJournal"));
        assertEquals(blocks(whole, "blocksComputed"), kept + blocks(resumed, "blocksComputed"));
        assertTrue(kept >= 9 && blocks(resumed, "blocksComputed") > 0, kept + " blocks were kept");
    }

    /**
     * Each block is computed by one of the two: claims see to that as long as neither process stands still for five
     * seconds, after which the other takes its blocks over. The tenth that is allowed for it is far below the whole that
     * two processes without claims would compute twice.
     */
    @Test
    void twoProcessesShareTheBlocksOfARun() throws IOException, InterruptedException {
        String[] command = with(SHARED, "--journal", journal.toString(), "--threads", "1");
        ToolProcess one = ToolProcess.start(folder, command);
        ToolProcess two = ToolProcess.start(folder, command);
        Execution first = one.await();
        Execution second = two.await();
        assertEquals(ExitCode.OK, first.exitCode(), first.err());
        assertEquals(ExitCode.OK, second.exitCode(), second.err());
        assertEquals(first.json().get("points"), second.json().get("points"));
        JsonNode whole = run(SHARED, "--no-journal").json();
        assertEquals(whole.get("points"), first.json().get("points"));
        long all = blocks(whole, "blocksComputed");
        long byFirst = blocks(first.json(), "blocksComputed");
        long bySecond = blocks(second.json(), "blocksComputed");
        String shares = byFirst + " and " + bySecond + " of " + all + " blocks";
        assertTrue(byFirst + bySecond >= all && byFirst + bySecond <= all + all / 10, shares);
        assertTrue(Math.min(byFirst, bySecond) > 0, shares);
        assertEquals(all, byFirst + blocks(first.json(), "blocksFromJournal"));
        assertEquals(all, blocksKept());
    }

    /** The killed process holds claims on blocks that the other needs; it gets them at once, not after a time. */
    @Test
    void aKilledProcessHoldsNobodyUp() throws IOException, InterruptedException {
        String[] command = with(SHARED, "--journal", journal.toString(), "--threads", "1");
        ToolProcess killed = ToolProcess.start(folder, command);
        ToolProcess survivor = ToolProcess.start(folder, command);
        while (blocksKept() < 6) {
            assertTrue(killed.isAlive(), "ended before it could be killed");
            Thread.sleep(10);
        }
        killed.kill();
        Execution execution = survivor.await();
        assertEquals(ExitCode.OK, execution.exitCode(), execution.err());
        assertEquals(
                run(SHARED, "--no-journal").json().get("points"),
                execution.json().get("points"));
    }

    @Test
    void aSecondRunTakesEveryBlockFromTheJournal() {
        JsonNode first = run(HAMMING, "--journal", journal.toString()).json();
        JsonNode second = run(HAMMING, "--journal", journal.toString()).json();
        assertEquals(first.get("points"), second.get("points"));
        assertEquals(BLOCKS, blocks(first, "blocksComputed"));
        assertEquals(0, blocks(first, "blocksFromJournal"));
        assertEquals(0, blocks(second, "blocksComputed"));
        assertEquals(BLOCKS, blocks(second, "blocksFromJournal"));
    }

    @Test
    void theClosingLineSaysWhatTheJournalGave() {
        String[] kept = with(HAMMING_TABLE, "--journal", journal.toString());
        assertTrue(closing(kept).endsWith("Of " + BLOCKS + " blocks of frames 0 came from the journal."));
        assertTrue(closing(kept).endsWith("Of " + BLOCKS + " blocks of frames " + BLOCKS + " came from the journal."));
        assertFalse(closing(HAMMING_TABLE).contains("journal"));
    }

    private static String closing(String[] command) {
        String out = Execution.of(command).out();
        return out.substring(out.indexOf("Took ")).replace('\n', ' ').trim();
    }

    @Test
    void aShortlistIsTakenFromTheJournalToo() throws IOException {
        Path file = Files.writeString(folder.resolve("link.yaml"), """
                name: Test link
                link: { bandwidthHz: 3000, rollOff: 0.25, bitRateBps: 1200, availableEbn0Db: 7.5, modulations: [qpsk] }
                payload: { bits: 4, fer: 5e-2 }
                candidates:
                  - code: hamming-extended:8,4
                    decoders: [bounded-distance, maximum-likelihood]
                """);
        String[] command = {
            "shortlist",
            file.toString(),
            "--threads",
            "1",
            "--out",
            folder.resolve("results").toString()
        };
        String[] kept = with(command, "--journal", journal.toString());
        Execution first = Execution.of(kept);
        assertEquals(ExitCode.OK, first.exitCode(), first.err());
        JsonNode second = Execution.of(with(kept, "--format", "json")).json();
        JsonNode without = Execution.of(with(command, "--format", "json")).json();
        assertEquals(without.get("operatingPoints"), second.get("operatingPoints"));
        long blocks = blocks(without, "blocksComputed");
        assertTrue(blocks > 0);
        assertEquals(0, blocks(second, "blocksComputed"));
        assertEquals(blocks, blocks(second, "blocksFromJournal"));
        assertTrue(first.out().contains("\n0 of " + blocks + " blocks of frames came from the journal\n"), first.out());
    }

    @Test
    void theUsersJournalIsTheDefaultAndIsMadeWithItsFolder() {
        journal = folder.resolve("data/nearlimit/journal.sqlite");
        Session session = new Session(false, new Interruption(), Optional.of(journal));
        assertEquals(ExitCode.OK, Execution.of(session, HAMMING).exitCode());
        assertEquals(BLOCKS, blocksKept());
        assertEquals(
                ExitCode.OK,
                Execution.of(session, with(HAMMING, "--no-journal", "--seed", "2"))
                        .exitCode());
        assertEquals(BLOCKS, blocksKept());
    }

    @Test
    void aDefaultJournalThatCannotBeOpenedIsDoneWithoutAfterAWarning() throws IOException {
        Files.writeString(journal, "Dear diary,\n".repeat(100));
        Session session = new Session(false, new Interruption(), Optional.of(journal));
        Execution execution = Execution.of(session, HAMMING);
        assertEquals(ExitCode.OK, execution.exitCode());
        assertEquals(
                "nearlimit: " + journal + ": is no journal: the file is not an SQLite database; this run keeps nothing"
                        + " (--journal names another file)\n",
                execution.err());
        assertEquals(run(HAMMING).json().get("points"), execution.json().get("points"));
        Path below = journal.resolve("nearlimit/journal.sqlite");
        Execution inAFile = Execution.of(new Session(false, new Interruption(), Optional.of(below)), HAMMING);
        assertEquals(ExitCode.OK, inAFile.exitCode());
        assertEquals(
                "nearlimit: " + below + ": the journal's folder cannot be made; this run keeps nothing (--journal names"
                        + " another file)\n",
                inAFile.err());
    }

    @Test
    void aNamedJournalThatCannotBeOpenedIsRefusedBeforeTheWork() throws IOException {
        refused(folder, "is a folder, a journal file was expected");
        refused(folder.resolve("none/journal"), "the journal's folder does not exist");
        Files.writeString(journal, "Dear diary,\n".repeat(100));
        refused(journal, "is no journal: the file is not an SQLite database");
    }

    private static void refused(Path path, String message) {
        Execution execution = Execution.of(
                "simulate", "hamming:7,4", "--decoder", "syndrome", "--ebn0", "2", "--journal", path.toString());
        assertEquals("nearlimit: " + path + ": " + message + "\n", execution.err());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals("", execution.out());
    }

    @Test
    void theOptionsExcludeEachOther() {
        Execution execution = run(HAMMING, "--no-journal", "--journal", journal.toString());
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertTrue(execution.err().contains("--journal and --no-journal exclude each other"), execution.err());
        assertFalse(Files.exists(journal));
    }

    @Test
    void damageFoundUnderWayCostsNoTable() throws IOException {
        JsonNode sound = run(HAMMING, "--journal", journal.toString()).json();
        try (RandomAccessFile file = new RandomAccessFile(journal.toFile(), "rw")) {
            // The pages behind the first ones hold the blocks' contents.
            file.seek(file.length() - 5 * 4096);
            file.write(new byte[4 * 4096]);
        }
        Execution execution = run(HAMMING, "--journal", journal.toString());
        assertEquals(ExitCode.TOOL_FAILED, execution.exitCode(), execution.err());
        assertEquals(sound.get("points"), execution.json().get("points"));
        assertEquals(1, execution.err().lines().count(), execution.err());
        assertTrue(execution.err().startsWith("nearlimit: " + journal + ": journal is damaged: "), execution.err());
        assertTrue(
                execution.err().endsWith("; the run goes on, but what it computes from here on is not kept\n"),
                execution.err());
    }

    /** The shell limits the size of files, so that writing fails in earnest while the run is under way. */
    @Test
    void aJournalThatCannotGrowCostsNoTable() throws IOException, InterruptedException {
        String[] command = {
            "simulate",
            "hamming:7,4",
            "--decoder",
            "syndrome",
            "--ebn0",
            "-10",
            "--frames",
            "2000000",
            "--frame-errors",
            "2000000",
            "--format",
            "json"
        };
        Execution execution = ToolProcess.start(
                        folder,
                        List.of("/bin/sh", "-c", "ulimit -f 4000; exec \"$@\"", "sh"),
                        with(command, "--journal", journal.toString()))
                .await();
        assertEquals(ExitCode.TOOL_FAILED, execution.exitCode(), execution.err());
        assertEquals(
                "nearlimit: " + journal + ": journal cannot be read or written: input/output error; the run goes on,"
                        + " but what it computes from here on is not kept\n",
                execution.err());
        assertEquals(run(command).json().get("points"), execution.json().get("points"));
        long kept = blocksKept();
        assertTrue(kept > 0, "what was kept before the failure is there");
        JsonNode later = run(command, "--journal", journal.toString()).json();
        assertEquals(kept, blocks(later, "blocksFromJournal"));
    }
}
