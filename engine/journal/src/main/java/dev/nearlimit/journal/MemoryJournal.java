package dev.nearlimit.journal;

import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** A journal that lives as long as the process: enough for a search that comes back to a point with a tighter target. */
public final class MemoryJournal implements Journal {
    private record Key(ContentHash job, long piece) {}

    private final ConcurrentHashMap<Key, byte[]> pieces = new ConcurrentHashMap<>();

    @Override
    public Optional<byte[]> find(ContentHash job, long piece) {
        return Optional.ofNullable(pieces.get(new Key(job, piece))).map(byte[]::clone);
    }

    @Override
    public void keep(ContentHash job, long piece, byte[] content) {
        pieces.putIfAbsent(new Key(job, piece), content.clone());
    }
}
