package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import org.junit.jupiter.api.Test;

final class NoJournalTest {
    @Test
    void forgetsAtOnce() {
        try (Journal journal = new NoJournal()) {
            journal.describe(JournalContract.JOB, JobDescription.NONE);
            journal.keep(JournalContract.JOB, 0, new byte[] {1});
            assertEquals(Optional.empty(), journal.find(JournalContract.JOB, 0));
        }
    }
}
