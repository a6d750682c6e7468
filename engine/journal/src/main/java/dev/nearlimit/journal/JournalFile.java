package dev.nearlimit.journal;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.HashMap;
import java.util.Map;
import org.sqlite.SQLiteConfig;
import org.sqlite.SQLiteErrorCode;
import org.sqlite.SQLiteException;

/**
 * The SQLite file behind a journal: opened, recognised, and laid out where it is new. Its faults come out as
 * {@link JournalException}. Not shared by threads; processes may share the file.
 *
 * <p>Write-ahead logging with synchronous=NORMAL: a commit survives the death of the process at any moment, and the
 * file survives a loss of power, at which the last commits may be missing.
 */
final class JournalFile implements AutoCloseable {
    /** The layout that this version reads and writes, kept as user_version. */
    static final int SCHEMA = 2;
    /** "NLMT", by which a journal is told from other SQLite files. */
    private static final int APPLICATION_ID = 0x4E4C4D54;

    private static final int BUSY_TIMEOUT_MS = 30_000;
    private static final int RETRY_MS = 20;

    private static final String[] LAYOUT = {
        "CREATE TABLE jobs (id INTEGER PRIMARY KEY, hash TEXT NOT NULL UNIQUE, description TEXT NOT NULL,"
                + " tool TEXT NOT NULL, created_epoch_s INTEGER NOT NULL, changed_epoch_s INTEGER NOT NULL) STRICT",
        // The index on job and piece counts a job's pieces without touching their contents.
        "CREATE TABLE pieces (job INTEGER NOT NULL REFERENCES jobs (id) ON DELETE CASCADE, piece INTEGER NOT NULL,"
                + " crc32c INTEGER NOT NULL, content BLOB NOT NULL, UNIQUE (job, piece)) STRICT",
        "PRAGMA application_id = " + APPLICATION_ID,
    };
    /** What layout 2 has beside layout 1. */
    private static final String[] SINCE_2 = {
        "CREATE TABLE claims (id INTEGER PRIMARY KEY, job TEXT NOT NULL, first_piece INTEGER NOT NULL,"
                + " end_piece INTEGER NOT NULL, owner TEXT NOT NULL, process_id INTEGER NOT NULL,"
                + " processes TEXT NOT NULL, renewed_epoch_ms INTEGER NOT NULL) STRICT",
        "CREATE INDEX claims_of_job ON claims (job, first_piece)",
        "PRAGMA user_version = " + SCHEMA,
    };

    private final String name;
    private final Connection connection;
    private final Map<String, PreparedStatement> statements = new HashMap<>();

    private JournalFile(String name, Connection connection) {
        this.name = name;
        this.connection = connection;
    }

    /**
     * Opens a journal for reading and writing; makes it where there is no file or an empty one.
     *
     * @throws JournalException if the file is no journal, of a newer layout, damaged, or cannot be read and written
     */
    static JournalFile open(Path path) {
        String name = path.toString();
        requirePlainFile(path, name);
        JournalFile file;
        try {
            SQLiteConfig config = new SQLiteConfig();
            config.setBusyTimeout(BUSY_TIMEOUT_MS);
            config.setSynchronous(SQLiteConfig.SynchronousMode.NORMAL);
            config.enforceForeignKeys(true);
            file = new JournalFile(name, config.createConnection("jdbc:sqlite:" + path.toAbsolutePath()));
        } catch (SQLException e) {
            throw failure(name, e);
        }
        try {
            file.recogniseOrLayOut();
            return file;
        } catch (SQLException e) {
            file.closeQuietly(e);
            throw failure(name, e);
        } catch (JournalException e) {
            file.closeQuietly(e);
            throw e;
        }
    }

    /** As {@link #open}, for a file that must be there. */
    static JournalFile openExisting(Path path) {
        if (!Files.exists(path)) {
            throw new JournalException(path.toString(), "no such file, a journal was expected");
        }
        return open(path);
    }

    private static void requirePlainFile(Path path, String name) {
        if (Files.isDirectory(path)) {
            throw new JournalException(name, "is a folder, a journal file was expected");
        }
        if (Files.exists(path) && !Files.isRegularFile(path)) {
            throw new JournalException(name, "is no regular file, a journal file was expected");
        }
        Path folder = path.toAbsolutePath().getParent();
        if (folder == null || !Files.isDirectory(folder)) {
            throw new JournalException(name, "the journal's folder does not exist");
        }
        if (name.indexOf('?') >= 0) {
            throw new JournalException(name, "the path of a journal must not contain '?'");
        }
    }

    private void recogniseOrLayOut() throws SQLException {
        // A stranger's file is left as it is, so it is looked at before anything is set.
        execute("BEGIN");
        recognise();
        execute("COMMIT");
        // Can be chosen only while the file is empty; forgotten jobs then give their space back.
        execute("PRAGMA auto_vacuum = INCREMENTAL");
        switchToWriteAheadLog();
        execute("BEGIN IMMEDIATE");
        int schema = recognise();
        if (schema < 1) {
            executeAll(LAYOUT);
        }
        if (schema < 2) {
            executeAll(SINCE_2);
        }
        execute("COMMIT");
    }

    /** The layout's version, 0 for an empty file; refuses everything that is no journal of ours. */
    private int recognise() throws SQLException {
        int application = number("PRAGMA application_id");
        int schema = number("PRAGMA user_version");
        if (application == 0 && schema == 0 && number("SELECT count(*) FROM sqlite_master") == 0) {
            return 0;
        }
        if (application != APPLICATION_ID) {
            throw new JournalException(name, "is an SQLite file of another application, a journal was expected");
        }
        if (schema < 1 || schema > SCHEMA) {
            throw new JournalException(
                    name,
                    "journal has layout " + schema + ", this version reads layouts up to " + SCHEMA
                            + "; a newer version of the tool wrote it");
        }
        return schema;
    }

    /** The switch wants the file to itself for a moment and does not wait by itself as other statements do. */
    private void switchToWriteAheadLog() throws SQLException {
        long giveUpAt = System.nanoTime() + BUSY_TIMEOUT_MS * 1_000_000L;
        while (true) {
            try {
                execute("PRAGMA journal_mode = WAL");
                return;
            } catch (SQLiteException e) {
                if (primary(e) != SQLiteErrorCode.SQLITE_BUSY || System.nanoTime() > giveUpAt) {
                    throw e;
                }
                pause();
            }
        }
    }

    private static void pause() {
        try {
            Thread.sleep(RETRY_MS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    /** The file as it was named. */
    String name() {
        return name;
    }

    /** A statement for the caller to close. */
    PreparedStatement prepare(String sql) throws SQLException {
        return connection.prepareStatement(sql);
    }

    /** A statement that is kept for the next time; its results must be closed before it is used again. */
    PreparedStatement statement(String sql) throws SQLException {
        PreparedStatement statement = statements.get(sql);
        if (statement == null) {
            statement = connection.prepareStatement(sql);
            statements.put(sql, statement);
        }
        return statement;
    }

    /** Runs a statement without parameters and result. */
    void execute(String sql) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            // As an update, for only that runs a statement to its end: giving space back takes a step a page.
            statement.executeUpdate(sql);
        }
    }

    private void executeAll(String... statements) throws SQLException {
        for (String statement : statements) {
            execute(statement);
        }
    }

    private int number(String sql) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet result = statement.executeQuery(sql)) {
            return result.getInt(1);
        }
    }

    /** Work that is done whole or not at all. */
    @FunctionalInterface
    interface Work<T> {
        T run() throws SQLException;
    }

    /** Does work in one transaction, waiting for other writers first. */
    <T> T inTransaction(Work<T> work) throws SQLException {
        execute("BEGIN IMMEDIATE");
        try {
            T result = work.run();
            execute("COMMIT");
            return result;
        } catch (SQLException | RuntimeException e) {
            rollBack(e);
            throw e;
        }
    }

    private void rollBack(Exception reason) {
        try {
            execute("ROLLBACK");
        } catch (SQLException e) {
            // SQLite has rolled back by itself after some failures, a full disk among them.
            reason.addSuppressed(e);
        }
    }

    JournalException failure(SQLException e) {
        // The driver closes a statement that failed without saying so.
        statements.clear();
        return failure(name, e);
    }

    JournalException damaged(String what) {
        return new JournalException(name, "journal is damaged: " + what);
    }

    private static JournalException failure(String name, SQLException e) {
        String message = switch (primary(e)) {
            case SQLITE_NOTADB -> "is no journal: the file is not an SQLite database";
            case SQLITE_CORRUPT -> "journal is damaged: what SQLite reads in it makes no sense";
            case SQLITE_FULL -> "journal cannot be written: the disk is full";
            case SQLITE_READONLY, SQLITE_PERM -> "journal cannot be written: it is read-only";
            case SQLITE_CANTOPEN -> "journal cannot be opened: no permission, or no room to make it";
            case SQLITE_BUSY, SQLITE_LOCKED ->
                "journal was held by another process for more than " + BUSY_TIMEOUT_MS / 1000 + " s";
            case SQLITE_IOERR -> "journal cannot be read or written: input/output error";
            default -> "journal failed: " + String.valueOf(e.getMessage()).replaceAll("\\s+", " ");
        };
        return new JournalException(name, message, e);
    }

    /** The kind of an error, without the details of SQLite's extended codes. */
    private static SQLiteErrorCode primary(SQLException e) {
        if (e instanceof SQLiteException own) {
            return SQLiteErrorCode.getErrorCode(own.getResultCode().code & 0xFF);
        }
        return SQLiteErrorCode.UNKNOWN_ERROR;
    }

    private void closeQuietly(Exception reason) {
        try {
            connection.close();
        } catch (SQLException e) {
            reason.addSuppressed(e);
        }
    }

    @Override
    public void close() {
        try {
            connection.close();
        } catch (SQLException e) {
            throw failure(e);
        }
    }
}
