package dev.nearlimit.journal;

final class MemoryJournalTest extends JournalContract {
    @Override
    Journal journal() {
        return new MemoryJournal();
    }
}
