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
     * Keeps a piece; keeping the same piece twice is harmless, since a key fixes its bits.
     *
     * @throws JournalException if the journal cannot be written
     */
    void keep(ContentHash job, long piece, byte[] content);

    /** Says in words what a job is, for whoever lists the journal; journals that nobody lists do without. */
    default void describe(ContentHash job, JobDescription description) {}

    /** Lets go of what the journal holds open; nothing is kept or found afterwards. */
    @Override
    default void close() {}
}
