package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class JournalCatalogueTest {
    private static final ContentHash JOB = JournalContract.JOB;
    private static final ContentHash OTHER = JournalContract.OTHER;
    private static final JobDescription DESCRIPTION =
            JobDescription.NONE.with("code", "./my \"own\"\n\u00e9.mtx").with("seed", "7");

    @TempDir
    Path folder;

    private Path write(String name, long epochS, ContentHash job, long... pieces) {
        Path path = folder.resolve(name);
        Clock clock = Clock.fixed(Instant.ofEpochSecond(epochS), ZoneOffset.UTC);
        try (SqliteJournal journal = SqliteJournal.open(path, "tool 1", clock)) {
            journal.describe(job, DESCRIPTION);
            for (long piece : pieces) {
                journal.keep(job, piece, JournalContract.content(piece));
            }
        }
        return path;
    }

    @Test
    void listsJobsWithWhatIsKnownOfThem() {
        Path path = write("a", 1000, JOB, 0, 1, 2);
        write("a", 2000, OTHER, 0);
        write("a", 3000, JOB, 2, 3);
        try (JournalCatalogue catalogue = JournalCatalogue.open(path)) {
            assertEquals(
                    List.of(
                            new KeptJob(
                                    OTHER,
                                    DESCRIPTION,
                                    "tool 1",
                                    Instant.ofEpochSecond(2000),
                                    Instant.ofEpochSecond(2000),
                                    1),
                            new KeptJob(
                                    JOB,
                                    DESCRIPTION,
                                    "tool 1",
                                    Instant.ofEpochSecond(1000),
                                    Instant.ofEpochSecond(3000),
                                    4)),
                    catalogue.jobs());
            assertEquals(
                    List.of(JOB),
                    catalogue.jobs(JOB.hex().substring(0, 6)).stream()
                            .map(KeptJob::hash)
                            .toList());
            assertEquals(List.of(), catalogue.jobs("%"));
        }
    }

    @Test
    void handsPiecesOverInOrder() {
        Path path = write("a", 1000, JOB, 7, 2, 11);
        List<Long> numbers = new ArrayList<>();
        try (JournalCatalogue catalogue = JournalCatalogue.open(path)) {
            catalogue.forEachPiece(JOB, (content, piece) -> {
                assertArrayEquals(JournalContract.content(piece), content);
                numbers.add(piece);
            });
            catalogue.forEachPiece(OTHER, (content, piece) -> numbers.add(-1L));
        }
        assertEquals(List.of(2L, 7L, 11L), numbers);
    }

    @Test
    void aMergeAddsWhatIsMissing() {
        Path here = write("a", 1000, JOB, 0, 1, 2);
        Path there = write("b", 500, JOB, 2, 3);
        write("b", 2000, OTHER, 9);
        try (JournalCatalogue catalogue = JournalCatalogue.open(here)) {
            assertEquals(new MergedPieces(2, 1), catalogue.merge(there));
            assertEquals(new MergedPieces(0, 3), catalogue.merge(there));
            List<KeptJob> jobs = catalogue.jobs();
            assertEquals(List.of(4L, 1L), jobs.stream().map(KeptJob::pieces).toList());
            assertEquals(Instant.ofEpochSecond(1000), jobs.get(0).changed());
            assertEquals(DESCRIPTION, jobs.get(1).description());
        }
    }

    @Test
    void aMergeOfADifferentPieceIsRefusedWhole() {
        Path here = write("a", 1000, JOB, 5);
        Path there = write("b", 1000, JOB, 4);
        try (SqliteJournal journal = SqliteJournal.open(there, "tool 1")) {
            journal.keep(JOB, 5, new byte[] {1});
        }
        try (JournalCatalogue catalogue = JournalCatalogue.open(here)) {
            JournalException e = assertThrows(JournalException.class, () -> catalogue.merge(there));
            assertEquals("the journals differ in block 5 of job " + JOB.hex() + "; nothing was merged", e.getMessage());
            assertEquals(1, catalogue.jobs().get(0).pieces());
        }
    }

    @Test
    void aJournalIsNotMergedIntoItself() {
        Path here = write("a", 1000, JOB, 5);
        try (JournalCatalogue catalogue = JournalCatalogue.open(here)) {
            assertEquals(
                    "is the journal itself, another one was expected",
                    assertThrows(JournalException.class, () -> catalogue.merge(folder.resolve("./a")))
                            .getMessage());
        }
    }

    @Test
    void forgettingGivesTheSpaceBack() throws IOException {
        Path path = write("a", 1000, OTHER, 0);
        long small = Files.size(path);
        write("a", 1000, JOB, java.util.stream.LongStream.range(0, 500).toArray());
        assertTrue(Files.size(path) > small + 300_000);
        try (JournalCatalogue catalogue = JournalCatalogue.open(path)) {
            assertTrue(catalogue.forget(JOB));
            assertFalse(catalogue.forget(JOB));
            assertEquals(
                    List.of(OTHER), catalogue.jobs().stream().map(KeptJob::hash).toList());
        }
        assertTrue(Files.size(path) < small + 20_000, Files.size(path) + " bytes, " + small + " before");
    }

    @Test
    void whatIsNotThereIsNotMade() {
        Path path = folder.resolve("none");
        assertEquals(
                "no such file, a journal was expected",
                assertThrows(JournalException.class, () -> JournalCatalogue.open(path))
                        .getMessage());
        assertFalse(Files.exists(path));
    }
}
