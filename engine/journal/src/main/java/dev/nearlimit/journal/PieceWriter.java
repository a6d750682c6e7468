package dev.nearlimit.journal;

import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.util.Map;

/** Writes jobs and pieces within a transaction of the caller. What is there already stays as it is. */
final class PieceWriter {
    private static final String JOB =
            "INSERT INTO jobs (hash, description, tool, created_epoch_s, changed_epoch_s) VALUES (?, %s, ?, ?, ?)"
                    + " ON CONFLICT (hash) DO UPDATE SET"
                    + " changed_epoch_s = max(changed_epoch_s, excluded.changed_epoch_s)";
    private static final String PIECE = "INSERT OR IGNORE INTO pieces (job, piece, crc32c, content)"
            + " VALUES ((SELECT id FROM jobs WHERE hash = ?), ?, ?, ?)";

    private final JournalFile file;

    PieceWriter(JournalFile file) {
        this.file = file;
    }

    /** Adds a job, or notes that it has changed. */
    void job(ContentHash hash, JobDescription description, String tool, long createdEpochS, long changedEpochS)
            throws SQLException {
        // SQLite writes the JSON, which gets its escapes right.
        String pairs = "?, ?, ".repeat(description.facts().size());
        String json = "json_object(" + (pairs.isEmpty() ? "" : pairs.substring(0, pairs.length() - 2)) + ")";
        PreparedStatement statement = file.statement(String.format(JOB, json));
        int at = 1;
        statement.setString(at++, hash.hex());
        for (Map.Entry<String, String> fact : description.facts().entrySet()) {
            statement.setString(at++, fact.getKey());
            statement.setString(at++, fact.getValue());
        }
        statement.setString(at++, tool);
        statement.setLong(at++, createdEpochS);
        statement.setLong(at, changedEpochS);
        statement.executeUpdate();
    }

    /** Adds a piece of a job that is there; false if it had the piece. */
    boolean piece(ContentHash hash, long piece, byte[] content) throws SQLException {
        PreparedStatement statement = file.statement(PIECE);
        statement.setString(1, hash.hex());
        statement.setLong(2, piece);
        statement.setLong(3, Checksum.of(content));
        statement.setBytes(4, content);
        return statement.executeUpdate() > 0;
    }
}
