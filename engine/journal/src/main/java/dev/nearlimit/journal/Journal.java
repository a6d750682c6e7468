package dev.nearlimit.journal;

import java.util.Optional;

/** Keeps finished pieces of work by job and piece number. Implementations may be used by several threads at once. */
public interface Journal extends AutoCloseable {
    /**
     * The piece kept under this key and number, if any.
     *
     * @throws JournalException if the journal cannot be read or the piece is damaged
     */
    Optional<byte[]> find(ContentHash job, long piece);

    /**
     * Keeps a piece; keeping the same piece twice is harmless, since a key fixes its bits. A journal in a file may write
     * it a moment later: see {@link #flush}.
     *
     * @throws JournalException if the journal cannot be written
     */
    void keep(ContentHash job, long piece, byte[] content);

    /** Says in words what a job is, for whoever lists the journal; journals that nobody lists do without. */
    default void describe(ContentHash job, JobDescription description) {}

    /**
     * Claims pieces to compute, which no other run of the job is given until they are released or their owner is gone. A
     * piece that is claimed and then kept needs no release. Whether pieces were claimed never changes what they contain:
     * a claim that is lost costs work done twice, nothing else.
     *
     * <p>A journal that knows of no other run gives what it is asked for, kept or not.
     *
     * @param from lowest piece wanted
     * @param end piece after the highest wanted, above {@code from}
     * @param most pieces at most, at least 1
     * @return the lowest pieces without a gap that are neither kept nor under way elsewhere; empty if all are
     * @throws JournalException if the journal cannot be read or written
     */
    default Optional<Claim> claim(ContentHash job, long from, long end, int most) {
        return Optional.of(new Claim(job, from, end - from > most ? from + most : end));
    }

    /** Gives back what of a claim was not kept, with the next flush; a claim of another journal is ignored. */
    default void release(Claim claim) {}

    /**
     * Returns once everything handed over is where it outlives the process.
     *
     * @throws JournalException if the journal cannot be written
     */
    default void flush() {}

    /** Lets go of what the journal holds open; nothing is kept or found afterwards. */
    @Override
    default void close() {}
}
