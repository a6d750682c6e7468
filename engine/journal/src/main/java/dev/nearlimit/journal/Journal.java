package dev.nearlimit.journal;

import java.util.Optional;

/** Keeps finished pieces of work by job and piece number. Implementations may be used by several threads at once. */
public interface Journal {
    /** The piece kept under this key and number, if any. */
    Optional<byte[]> find(ContentHash job, long piece);

    /** Keeps a piece; keeping the same piece twice is harmless, since a key fixes its bits. */
    void keep(ContentHash job, long piece, byte[] content);
}
