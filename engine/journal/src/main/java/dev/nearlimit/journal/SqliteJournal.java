package dev.nearlimit.journal;

import java.nio.file.Path;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/**
 * A journal in a file. Every piece is committed by itself, so that a process killed at any moment loses only what it had
 * not handed over yet; several threads share one object, several processes the file.
 */
public final class SqliteJournal implements Journal {
    private static final String FIND =
            "SELECT content, crc32c FROM pieces" + " WHERE job = (SELECT id FROM jobs WHERE hash = ?) AND piece = ?";

    private final JournalFile file;
    private final PieceWriter writer;
    private final String tool;
    private final Clock clock;
    private final Map<ContentHash, JobDescription> descriptions = new ConcurrentHashMap<>();

    private SqliteJournal(JournalFile file, String tool, Clock clock) {
        this.file = file;
        this.writer = new PieceWriter(file);
        this.tool = tool;
        this.clock = clock;
    }

    /**
     * Opens a journal; makes it where there is no file. The folder must be there.
     *
     * @param tool name and version of the tool, noted with each new job
     * @throws JournalException if the file is no journal, of a newer layout, damaged, or cannot be read and written
     */
    public static SqliteJournal open(Path path, String tool) {
        return open(path, tool, Clock.systemUTC());
    }

    static SqliteJournal open(Path path, String tool, Clock clock) {
        return new SqliteJournal(JournalFile.open(path), tool, clock);
    }

    @Override
    public synchronized Optional<byte[]> find(ContentHash job, long piece) {
        try (PreparedStatement statement = file.prepare(FIND)) {
            statement.setString(1, job.hex());
            statement.setLong(2, piece);
            try (ResultSet result = statement.executeQuery()) {
                if (!result.next()) {
                    return Optional.empty();
                }
                byte[] content = result.getBytes(1);
                if (Checksum.of(content) != result.getLong(2)) {
                    throw file.damaged("block " + piece + " of job " + job.hex() + " fails its checksum");
                }
                return Optional.of(content);
            }
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    @Override
    public synchronized void keep(ContentHash job, long piece, byte[] content) {
        long nowS = clock.instant().getEpochSecond();
        try {
            file.inTransaction(() -> {
                // The job is written again each time: somebody may have forgotten it meanwhile.
                writer.job(job, descriptions.getOrDefault(job, JobDescription.NONE), tool, nowS, nowS);
                writer.piece(job, piece, content);
            });
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    /** Notes the description, which reaches the file with the job's first piece. */
    @Override
    public void describe(ContentHash job, JobDescription description) {
        descriptions.put(job, description);
    }

    @Override
    public synchronized void close() {
        file.close();
    }

    /** For tests that bring a fault about. */
    JournalFile file() {
        return file;
    }
}
