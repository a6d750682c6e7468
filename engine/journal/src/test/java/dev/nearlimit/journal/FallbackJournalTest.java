package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

final class FallbackJournalTest {
    private static final ContentHash JOB = JournalContract.JOB;

    /** Keeps so many pieces, then none. */
    private static final class Filling implements Journal {
        private final Journal pieces = new MemoryJournal();
        private int room;

        Filling(int room) {
            this.room = room;
        }

        @Override
        public Optional<byte[]> find(ContentHash job, long piece) {
            return pieces.find(job, piece);
        }

        @Override
        public void keep(ContentHash job, long piece, byte[] content) {
            if (room-- <= 0) {
                throw new JournalException("full", "journal cannot be written: the disk is full");
            }
            pieces.keep(job, piece, content);
        }
    }

    @Test
    void aFailureIsReportedOnceAndTheSecondTakesOver() {
        List<String> reports = new ArrayList<>();
        Journal second = new MemoryJournal();
        FallbackJournal journal = new FallbackJournal(new Filling(2), second, e -> reports.add(e.getMessage()));
        for (int i = 0; i < 5; i++) {
            assertEquals(i > 2, journal.failed(), "before piece " + i);
            journal.keep(JOB, i, new byte[] {(byte) i});
        }
        assertTrue(journal.failed());
        assertEquals(List.of("journal cannot be written: the disk is full"), reports);
        assertEquals(Optional.empty(), journal.find(JOB, 0));
        assertArrayEquals(new byte[] {2}, journal.find(JOB, 2).orElseThrow());
        assertEquals(Optional.empty(), second.find(JOB, 1));
    }

    /** A claim of the first journal means nothing to the second, which gives whatever it is asked for. */
    @Test
    void claimsAndReleasesSurviveTheChange() {
        FallbackJournal journal = new FallbackJournal(new Filling(0), new MemoryJournal(), e -> {});
        Claim claim = journal.claim(JOB, 0, 100, 10).orElseThrow();
        journal.keep(JOB, 0, new byte[] {1});
        assertTrue(journal.failed());
        journal.release(claim);
        journal.flush();
        assertEquals(Optional.of(new Claim(JOB, 0, 10)), journal.claim(JOB, 0, 100, 10));
    }

    @Test
    void aSoundJournalIsUsedAlone() {
        Journal second = new MemoryJournal();
        try (FallbackJournal journal = new FallbackJournal(new Filling(9), second, e -> {
            throw new AssertionError(e);
        })) {
            journal.keep(JOB, 0, new byte[] {1});
            assertFalse(journal.failed());
        }
        assertEquals(Optional.empty(), second.find(JOB, 0));
    }
}
