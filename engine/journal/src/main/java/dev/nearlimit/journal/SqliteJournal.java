package dev.nearlimit.journal;

import java.nio.file.Path;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;

/**
 * A journal in a file. Several threads share one object, several processes the file.
 *
 * <p>Pieces are committed together, by {@link #flush}, with a claim, or by a thread of the journal's own {@value
 * #COMMIT_INTERVAL_MS} ms after they were handed over, so that a process killed at any moment loses what it had under way
 * and what was finished within that time. Until then they are found here all the same. What goes wrong on that thread is
 * thrown by the next call that writes, and the pieces stay to be written later.
 */
public final class SqliteJournal implements Journal {
    /** How long a piece waits for its commit at most [ms]. */
    public static final long COMMIT_INTERVAL_MS = 200;

    private static final long RENEWAL_MS = 1_000;
    /** Pieces that wait take no more memory than this. */
    private static final long MOST_BYTES_WAITING = 4 << 20;

    private static final String FIND =
            "SELECT content, crc32c FROM pieces WHERE job = (SELECT id FROM jobs WHERE hash = ?) AND piece = ?";

    private final JournalFile file;
    private final PieceWriter writer;
    private final ClaimTable claims;
    private final String tool;
    private final Clock clock;
    private final Map<ContentHash, JobDescription> descriptions = new ConcurrentHashMap<>();
    private final Map<ContentHash, Map<Long, byte[]>> waiting = new LinkedHashMap<>();
    private final ScheduledExecutorService committer;
    private long bytesWaiting;
    private long renewedMs;
    private JournalException failure;
    private boolean closed;

    private SqliteJournal(JournalFile file, String tool, Clock clock) {
        this.file = file;
        this.writer = new PieceWriter(file);
        this.claims = new ClaimTable(file);
        this.tool = tool;
        this.clock = clock;
        this.committer = Executors.newSingleThreadScheduledExecutor(task -> {
            Thread thread = new Thread(task, "journal");
            thread.setDaemon(true);
            return thread;
        });
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
        SqliteJournal journal = new SqliteJournal(JournalFile.open(path), tool, clock);
        journal.committer.scheduleWithFixedDelay(
                journal::commitInTime, COMMIT_INTERVAL_MS / 2, COMMIT_INTERVAL_MS / 2, TimeUnit.MILLISECONDS);
        return journal;
    }

    @Override
    public synchronized Optional<byte[]> find(ContentHash job, long piece) {
        byte[] content = waiting.getOrDefault(job, Map.of()).get(piece);
        if (content != null) {
            return Optional.of(content.clone());
        }
        try {
            PreparedStatement statement = file.statement(FIND);
            statement.setString(1, job.hex());
            statement.setLong(2, piece);
            try (ResultSet result = statement.executeQuery()) {
                if (!result.next()) {
                    return Optional.empty();
                }
                content = result.getBytes(1);
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
        throwFailure();
        if (waiting.computeIfAbsent(job, key -> new LinkedHashMap<>()).putIfAbsent(piece, content.clone()) == null) {
            bytesWaiting += content.length;
        }
        if (bytesWaiting > MOST_BYTES_WAITING) {
            commit();
        }
    }

    /** Notes the description, which reaches the file with the job's first piece. */
    @Override
    public void describe(ContentHash job, JobDescription description) {
        descriptions.put(job, description);
    }

    @Override
    public synchronized Optional<Claim> claim(ContentHash job, long from, long end, int most) {
        throwFailure();
        try {
            // What waits is written first, so that what is claimed is neither in the file nor about to be.
            Optional<Claim> claim = file.inTransaction(() -> {
                write();
                return claims.find(job, from, end, most, clock.millis());
            });
            written();
            claim.ifPresent(claims::hold);
            return claim;
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    @Override
    public synchronized void release(Claim claim) {
        claims.release(claim);
    }

    @Override
    public synchronized void flush() {
        throwFailure();
        if (!waiting.isEmpty() || claims.hasReleases()) {
            commit();
        }
    }

    /** Called by the journal's own thread twice in the time that a piece may wait. */
    private synchronized void commitInTime() {
        if (closed || failure != null) {
            return;
        }
        try {
            boolean renewalDue = claims.holdsAny() && Math.abs(clock.millis() - renewedMs) >= RENEWAL_MS;
            if (!waiting.isEmpty() || claims.hasReleases() || renewalDue) {
                commit();
            }
        } catch (JournalException e) {
            failure = e;
        }
    }

    /** What went wrong on the journal's own thread, once. */
    private void throwFailure() {
        JournalException thrown = failure;
        failure = null;
        if (thrown != null) {
            throw thrown;
        }
    }

    private void commit() {
        try {
            file.inTransaction(() -> {
                write();
                return null;
            });
            written();
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    private void write() throws SQLException {
        long nowMs = clock.millis();
        long nowS = Math.floorDiv(nowMs, 1000);
        for (Map.Entry<ContentHash, Map<Long, byte[]>> entry : waiting.entrySet()) {
            ContentHash job = entry.getKey();
            // The job is written again each time: somebody may have forgotten it meanwhile.
            writer.job(job, descriptions.getOrDefault(job, JobDescription.NONE), tool, nowS, nowS);
            for (Map.Entry<Long, byte[]> piece : entry.getValue().entrySet()) {
                writer.piece(job, piece.getKey(), piece.getValue());
            }
        }
        claims.writeReleases();
        if (claims.holdsAny()) {
            claims.renew(nowMs);
            renewedMs = nowMs;
        }
    }

    private void written() {
        claims.releasesWritten();
        waiting.forEach((job, pieces) -> pieces.keySet().forEach(piece -> claims.kept(job, piece)));
        waiting.clear();
        bytesWaiting = 0;
    }

    /** Writes what waits and gives back every claim. */
    @Override
    public synchronized void close() {
        if (closed) {
            return;
        }
        closed = true;
        committer.shutdown();
        try (file) {
            if (!waiting.isEmpty() || claims.holdsAny() || claims.hasReleases()) {
                file.inTransaction(() -> {
                    write();
                    claims.releaseAll();
                    return null;
                });
            }
        } catch (SQLException e) {
            throw file.failure(e);
        }
    }

    /** For tests that bring a fault about. */
    JournalFile file() {
        return file;
    }
}
