package dev.nearlimit.journal;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;

/**
 * A journal whose failure does not end the run that uses it: the first {@link JournalException} is reported, and from
 * then on another journal takes its place. What the first had found is right all the same; what it held beyond that is
 * computed again.
 */
public final class FallbackJournal implements Journal {
    private final Journal first;
    private final Journal second;
    private final Consumer<JournalException> report;
    private volatile Journal current;

    /** @param report told once, by the thread that met the failure */
    public FallbackJournal(Journal first, Journal second, Consumer<JournalException> report) {
        this.first = first;
        this.second = second;
        this.report = report;
        this.current = first;
    }

    /** Whether the first journal has failed. */
    public boolean failed() {
        return current == second;
    }

    @Override
    public Optional<byte[]> find(ContentHash job, long piece) {
        return withFallback(journal -> journal.find(job, piece));
    }

    @Override
    public void keep(ContentHash job, long piece, byte[] content) {
        withFallback(journal -> {
            journal.keep(job, piece, content);
            return true;
        });
    }

    @Override
    public void describe(ContentHash job, JobDescription description) {
        withFallback(journal -> {
            journal.describe(job, description);
            return true;
        });
    }

    @Override
    public Optional<Claim> claim(ContentHash job, long from, long end, int most) {
        return withFallback(journal -> journal.claim(job, from, end, most));
    }

    @Override
    public void release(Claim claim) {
        withFallback(journal -> {
            journal.release(claim);
            return true;
        });
    }

    @Override
    public void flush() {
        withFallback(journal -> {
            journal.flush();
            return true;
        });
    }

    /** Closes both; a failure of the first is reported if none was before. */
    @Override
    public void close() {
        try {
            first.close();
        } catch (JournalException e) {
            giveUp(e);
        } finally {
            second.close();
        }
    }

    private <T> T withFallback(Function<Journal, T> work) {
        Journal journal = current;
        try {
            return work.apply(journal);
        } catch (JournalException e) {
            if (journal == second) {
                throw e;
            }
            giveUp(e);
            return work.apply(second);
        }
    }

    private void giveUp(JournalException e) {
        synchronized (this) {
            if (failed()) {
                return;
            }
            current = second;
        }
        report.accept(e);
    }
}
