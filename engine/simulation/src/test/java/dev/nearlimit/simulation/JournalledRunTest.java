package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.journal.JournalCatalogue;
import dev.nearlimit.journal.KeptJob;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.journal.SqliteJournal;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Runs that keep their blocks in a file. */
final class JournalledRunTest {
    private static final Scheme SCHEME = Uncoded.scheme(8, "awgn", true);
    private static final Point POINT = Point.ofEbn0Db(3.25);

    @TempDir
    Path folder;

    private SqliteJournal journal() {
        return SqliteJournal.open(folder.resolve("journal.sqlite"), "tool 1");
    }

    private PointCounts run(Simulator simulator, StoppingRule rule) {
        return simulator.run(SCHEME, POINT, 5, rule, RunControl.none());
    }

    @Test
    void aLaterRunGoesOnFromTheFile() {
        StoppingRule tight = new StoppingRule(6400, 1_000_000);
        try (SqliteJournal journal = journal()) {
            Simulator simulator = new Simulator(1, journal, 64);
            run(simulator, new StoppingRule(640, 1_000_000));
            assertEquals(new BlockOrigins(10, 0, 640), simulator.blocks());
        }
        try (SqliteJournal journal = journal()) {
            Simulator simulator = new Simulator(2, journal, 64);
            PointCounts counts = run(simulator, tight);
            assertEquals(new BlockOrigins(90, 10, 5760), simulator.blocks());
            assertEquals(run(new Simulator(1, new MemoryJournal()), tight), counts);
            // What a search comes back to is no news.
            run(simulator, tight);
            assertEquals(new BlockOrigins(90, 10, 5760), simulator.blocks());
        }
    }

    /** A rule on errors ends within a block: threads that find it met do not run ahead once more. */
    @Test
    void aFinishedPointComputesNothing() {
        StoppingRule rule = new StoppingRule(1_000_000, 20);
        try (SqliteJournal journal = journal()) {
            PointCounts counts = run(new Simulator(2, journal, 64), rule);
            for (int i = 0; i < 20; i++) {
                Simulator again = new Simulator(4, journal, 64);
                assertEquals(counts, run(again, rule));
                assertEquals(0, again.blocks().computed());
            }
        }
    }

    @Test
    void theFileSaysWhatItKeepsAndCanBeCountedAgain() {
        PointCounts counts;
        try (SqliteJournal journal = journal()) {
            counts = run(new Simulator(2, journal, 64), new StoppingRule(6400, 1_000_000));
        }
        try (JournalCatalogue catalogue = JournalCatalogue.open(folder.resolve("journal.sqlite"))) {
            List<KeptJob> jobs = catalogue.jobs();
            assertEquals(1, jobs.size());
            assertEquals(100, jobs.get(0).pieces());
            assertEquals(
                    Map.of(
                            "code", "uncoded",
                            "n", "8",
                            "k", "8",
                            "decoder", "uncoded:talkative=true",
                            "quantiser", "none",
                            "modulation", "bpsk",
                            "channel", "awgn",
                            "ebn0Db", "3.25",
                            "seed", "5",
                            "framesPerBlock", "64"),
                    jobs.get(0).description().facts());
            KeptPoint point = new KeptPoint();
            catalogue.forEachPiece(jobs.get(0).hash(), point::add);
            PointCounts again = point.counts();
            assertTrue(counts.frameErrors() > 100, counts.toString());
            assertEquals(
                    new PointCounts(
                            6400,
                            counts.frameErrors(),
                            counts.bitErrors(),
                            counts.bitErrorSquares(),
                            counts.undetectedErrors(),
                            counts.iterations(),
                            false),
                    again);
        }
    }

    @Test
    void blocksBehindAGapAreNotCounted() {
        byte[] block = new Block(64, new int[] {3}, new int[] {2}, new boolean[] {true}, new int[0]).toBytes();
        KeptPoint point = new KeptPoint();
        point.add(block, 0);
        point.add(block, 1);
        point.add(block, 3);
        assertEquals(new PointCounts(128, 2, 4, 8, 2, 0, false), point.counts());
    }
}
