package dev.nearlimit.journal;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ObjLongConsumer;

/**
 * The upkeep of a journal file: lists it, reads a job through, merges another journal in, forgets jobs. Runs may be using
 * the file meanwhile. Pieces are streamed, never held all at once. Not shared by threads.
 */
public final class JournalCatalogue implements AutoCloseable {
    private static final String JOBS = "SELECT hash, description, tool, created_epoch_s, changed_epoch_s,"
            + " (SELECT count(*) FROM pieces WHERE job = jobs.id) FROM jobs"
            + " WHERE substr(hash, 1, length(?1)) = ?1 ORDER BY changed_epoch_s, id";
    private static final String FACTS = "SELECT key, value FROM json_each(?)";
    private static final String PIECES = "SELECT piece, crc32c, content FROM pieces"
            + " WHERE job = (SELECT id FROM jobs WHERE hash = ?) ORDER BY piece";
    private static final String CHECKSUM =
            "SELECT crc32c FROM pieces WHERE job = (SELECT id FROM jobs WHERE hash = ?) AND piece = ?";

    private final JournalFile file;
    private final Path path;

    private JournalCatalogue(JournalFile file, Path path) {
        this.file = file;
        this.path = path;
    }

    /**
     * Opens a journal that is there.
     *
     * @throws JournalException if there is no such file, or {@link SqliteJournal#open} would refuse it
     */
    public static JournalCatalogue open(Path path) {
        return new JournalCatalogue(JournalFile.openExisting(path), path);
    }

    /** As {@link #open}, but makes the journal where there is none, to merge others into. */
    public static JournalCatalogue make(Path path) {
        return new JournalCatalogue(JournalFile.open(path), path);
    }

    /** All jobs, the last changed last. */
    public List<KeptJob> jobs() {
        return jobs("");
    }

    /** The jobs whose hash begins with these hexadecimal digits, the last changed last. */
    public List<KeptJob> jobs(String prefix) {
        List<KeptJob> jobs = new ArrayList<>();
        try (PreparedStatement statement = file.prepare(JOBS)) {
            statement.setString(1, prefix);
            try (ResultSet result = statement.executeQuery()) {
                while (result.next()) {
                    jobs.add(new KeptJob(
                            new ContentHash(result.getString(1)),
                            description(result.getString(2)),
                            result.getString(3),
                            Instant.ofEpochSecond(result.getLong(4)),
                            Instant.ofEpochSecond(result.getLong(5)),
                            result.getLong(6)));
                }
            }
        } catch (SQLException e) {
            throw file.failure(e);
        }
        return jobs;
    }

    private JobDescription description(String json) throws SQLException {
        Map<String, String> facts = new LinkedHashMap<>();
        try (PreparedStatement statement = file.prepare(FACTS)) {
            statement.setString(1, json);
            try (ResultSet result = statement.executeQuery()) {
                while (result.next()) {
                    facts.put(result.getString(1), result.getString(2));
                }
            }
        }
        return new JobDescription(facts);
    }

    /**
     * Hands over a job's pieces with their numbers, in ascending order.
     *
     * @throws JournalException if one is damaged
     */
    public void forEachPiece(ContentHash job, ObjLongConsumer<byte[]> receiver) {
        try (PreparedStatement statement = file.prepare(PIECES)) {
            statement.setString(1, job.hex());
            try (ResultSet result = statement.executeQuery()) {
                while (result.next()) {
                    byte[] content = result.getBytes(3);
                    if (Checksum.of(content) != result.getLong(2)) {
                        throw file.damaged(
                                "block " + result.getLong(1) + " of job " + job.hex() + " fails its checksum");
                    }
                    receiver.accept(content, result.getLong(1));
                }
            }
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    /** Removes a job with all its pieces and gives the space back; false if there is no such job. */
    public boolean forget(ContentHash job) {
        try {
            int removed = file.inTransaction(() -> {
                try (PreparedStatement statement = file.prepare("DELETE FROM jobs WHERE hash = ?")) {
                    statement.setString(1, job.hex());
                    return statement.executeUpdate();
                }
            });
            file.execute("PRAGMA incremental_vacuum");
            return removed > 0;
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    /**
     * Takes in what another journal holds; all of it or nothing. The other journal stays as it is.
     *
     * @throws JournalException if the other is no journal or damaged, is this very file, or holds a piece that differs
     *     from the one here, which a reproducible run never makes
     */
    public MergedPieces merge(Path other) {
        if (isThisFile(other)) {
            throw new JournalException(other.toString(), "is the journal itself, another one was expected");
        }
        long[] counts = new long[2];
        try (JournalCatalogue source = open(other)) {
            PieceWriter writer = new PieceWriter(file);
            file.inTransaction(() -> {
                for (KeptJob job : source.jobs()) {
                    writer.job(
                            job.hash(),
                            job.description(),
                            job.tool(),
                            job.created().getEpochSecond(),
                            job.changed().getEpochSecond());
                    source.forEachPiece(job.hash(), (content, piece) -> counts[take(writer, job, content, piece)]++);
                }
                return null;
            });
        } catch (SQLException e) {
            throw file.failure(e);
        }
        return new MergedPieces(counts[0], counts[1]);
    }

    /** 0 if the piece was new, 1 if it was there. */
    private int take(PieceWriter writer, KeptJob job, byte[] content, long piece) {
        try {
            if (writer.piece(job.hash(), piece, content)) {
                return 0;
            }
            try (PreparedStatement statement = file.prepare(CHECKSUM)) {
                statement.setString(1, job.hash().hex());
                statement.setLong(2, piece);
                try (ResultSet result = statement.executeQuery()) {
                    if (result.getLong(1) != Checksum.of(content)) {
                        throw new JournalException(
                                file.name(),
                                "the journals differ in block " + piece + " of job "
                                        + job.hash().hex() + "; nothing was merged");
                    }
                }
            }
            return 1;
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    private boolean isThisFile(Path other) {
        try {
            return Files.exists(other) && Files.isSameFile(path, other);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public void close() {
        file.close();
    }
}
