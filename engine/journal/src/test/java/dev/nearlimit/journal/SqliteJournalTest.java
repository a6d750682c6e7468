package dev.nearlimit.journal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

final class SqliteJournalTest extends JournalContract {
    @TempDir
    Path folder;

    private final List<Journal> opened = new ArrayList<>();

    private Path path() {
        return folder.resolve("journal.sqlite");
    }

    @Override
    SqliteJournal journal() {
        SqliteJournal journal = SqliteJournal.open(path(), "tool 1");
        opened.add(journal);
        return journal;
    }

    @AfterEach
    void close() {
        opened.forEach(Journal::close);
    }

    @Test
    void outlivesItsClosing() {
        try (SqliteJournal journal = SqliteJournal.open(path(), "tool 1")) {
            journal.keep(JOB, 3, content(3));
        }
        assertArrayEquals(content(3), journal().find(JOB, 3).orElseThrow());
    }

    @Test
    void twoObjectsOnOneFileSeeEachOther() {
        SqliteJournal one = journal();
        SqliteJournal two = journal();
        one.keep(JOB, 0, content(0));
        one.flush();
        assertArrayEquals(content(0), two.find(JOB, 0).orElseThrow());
        two.keep(JOB, 0, content(0));
        two.keep(JOB, 1, content(1));
        two.flush();
        assertArrayEquals(content(1), one.find(JOB, 1).orElseThrow());
    }

    @Test
    void aJobForgottenMeanwhileIsKeptAnew() {
        SqliteJournal journal = journal();
        journal.describe(JOB, JobDescription.NONE.with("code", "hamming:7,4"));
        journal.keep(JOB, 0, content(0));
        journal.flush();
        try (JournalCatalogue catalogue = JournalCatalogue.open(path())) {
            assertTrue(catalogue.forget(JOB));
            assertEquals(Optional.empty(), journal.find(JOB, 0));
            journal.keep(JOB, 1, content(1));
            journal.flush();
            KeptJob job = catalogue.jobs().get(0);
            assertEquals(1, job.pieces());
            assertEquals("hamming:7,4", job.description().fact("code").orElseThrow());
        }
    }

    @Test
    void pathsMayHaveBlanksAndLettersOfAnyScript() throws IOException {
        Path there = Files.createDirectory(folder.resolve("M\u00fcller & S\u00f6hne #1 100%"))
                .resolve("\u65e5 \u8a8c;.sqlite");
        try (SqliteJournal journal = SqliteJournal.open(there, "tool 1")) {
            journal.keep(JOB, 0, content(0));
        }
        assertTrue(Files.exists(there));
    }

    @Test
    void aFolderIsRefused() {
        refused(folder, "is a folder, a journal file was expected");
    }

    @Test
    void aFolderThatIsNotThereIsRefused() {
        refused(folder.resolve("none/journal.sqlite"), "the journal's folder does not exist");
    }

    @Test
    void aDeviceIsRefused() {
        refused(Path.of("/dev/null"), "is no regular file, a journal file was expected");
    }

    /** On a file system where nobody, not even the superuser, can make a file. */
    @Test
    void aPlaceThatCannotBeWrittenIsRefused() {
        assumeTrue(Files.isDirectory(Path.of("/proc/self")), "there is no /proc");
        refused(Path.of("/proc/self/journal.sqlite"), "journal cannot be opened: no permission, or no room to make it");
    }

    @Test
    void anotherKindOfFileIsRefusedAndLeftAlone() throws IOException {
        String text = "Dear diary,\n".repeat(100);
        Files.writeString(path(), text);
        refused(path(), "is no journal: the file is not an SQLite database");
        assertEquals(text, Files.readString(path()));
    }

    @Test
    void anotherApplicationsDatabaseIsRefusedAndLeftAlone() throws SQLException, IOException {
        sql("CREATE TABLE recipes (name TEXT)");
        byte[] before = Files.readAllBytes(path());
        refused(path(), "is an SQLite file of another application, a journal was expected");
        assertArrayEquals(before, Files.readAllBytes(path()));
    }

    @Test
    void aNewerLayoutIsRefused() throws SQLException {
        SqliteJournal.open(path(), "tool 1").close();
        sql("PRAGMA user_version = 9");
        refused(
                path(),
                "journal has layout 9, this version reads layouts up to 2; a newer version of the tool wrote it");
    }

    /** As a journal of the first layout, which knew no claims, was left by the version that wrote it. */
    @Test
    void anOlderLayoutIsBroughtUpToDate() throws SQLException {
        try (SqliteJournal journal = SqliteJournal.open(path(), "tool 1")) {
            journal.keep(JOB, 3, content(3));
        }
        sql("DROP TABLE claims");
        sql("PRAGMA user_version = 1");
        SqliteJournal journal = journal();
        assertArrayEquals(content(3), journal.find(JOB, 3).orElseThrow());
        assertEquals(Optional.of(new Claim(JOB, 0, 3)), journal.claim(JOB, 0, 9, 5));
    }

    @Test
    void anEmptyFileBecomesAJournal() throws IOException {
        Files.createFile(path());
        SqliteJournal journal = journal();
        journal.keep(JOB, 0, content(0));
        assertArrayEquals(content(0), journal.find(JOB, 0).orElseThrow());
    }

    @Test
    void aFileCutShortOrOverwrittenIsReported() throws IOException {
        try (SqliteJournal journal = SqliteJournal.open(path(), "tool 1")) {
            for (int i = 0; i < 200; i++) {
                journal.keep(JOB, i, content(i));
            }
        }
        byte[] bytes = Files.readAllBytes(path());
        // From the second page on, so that the file is still recognised.
        Arrays.fill(bytes, 4096, bytes.length, (byte) 0xA5);
        Files.write(path(), bytes);
        JournalException e = assertThrows(JournalException.class, () -> {
            Journal journal = journal();
            journal.find(JOB, 0);
        });
        assertEquals("journal is damaged: what SQLite reads in it makes no sense", e.getMessage());
    }

    @Test
    void aBitThatTurnedInAPieceIsNoticed() throws IOException {
        byte[] piece = "a piece that is easy to find in the file".getBytes(StandardCharsets.US_ASCII);
        try (SqliteJournal journal = SqliteJournal.open(path(), "tool 1")) {
            journal.keep(JOB, 4, piece);
        }
        byte[] bytes = Files.readAllBytes(path());
        int at = new String(bytes, StandardCharsets.ISO_8859_1).indexOf("easy to find");
        bytes[at] ^= 1;
        Files.write(path(), bytes);
        SqliteJournal journal = journal();
        JournalException e = assertThrows(JournalException.class, () -> journal.find(JOB, 4));
        assertEquals("journal is damaged: block 4 of job " + JOB.hex() + " fails its checksum", e.getMessage());
    }

    /** Without a flush, a piece is in the file a moment later; the test waits for it fifty times as long. */
    @Test
    void aPieceIsCommittedInTimeByItself() throws InterruptedException {
        SqliteJournal one = journal();
        SqliteJournal two = journal();
        one.keep(JOB, 0, content(0));
        long giveUpAt = System.nanoTime() + 50 * SqliteJournal.COMMIT_INTERVAL_MS * 1_000_000;
        while (two.find(JOB, 0).isEmpty()) {
            assertTrue(System.nanoTime() < giveUpAt, "not committed");
            Thread.sleep(10);
        }
        assertArrayEquals(content(0), two.find(JOB, 0).orElseThrow());
    }

    /** SQLite's own limit on pages brings about the very error of a full disk. */
    @Test
    void aFullDiskIsReportedAndNothingIsLost() throws SQLException {
        SqliteJournal journal = journal();
        journal.keep(JOB, 0, content(0));
        journal.flush();
        journal.file().execute("PRAGMA max_page_count = 20");
        JournalException e = assertThrows(JournalException.class, () -> {
            for (int i = 1; i < 200; i++) {
                journal.keep(JOB, i, content(i));
            }
            journal.flush();
        });
        assertEquals("journal cannot be written: the disk is full", e.getMessage());
        assertEquals(path().toString(), e.file());
        assertArrayEquals(content(0), journal.find(JOB, 0).orElseThrow());
        journal.file().execute("PRAGMA max_page_count = 100000");
        journal.keep(JOB, 1000, content(1000));
        journal.close();
        assertArrayEquals(content(1), journal().find(JOB, 1).orElseThrow());
        assertArrayEquals(content(1000), journal().find(JOB, 1000).orElseThrow());
    }

    /** Makes SQLite refuse to write as it does on a read-only file, which a test run by the superuser cannot have. */
    @Test
    void aReadOnlyFileIsReported() throws SQLException {
        SqliteJournal journal = journal();
        journal.keep(JOB, 0, content(0));
        journal.flush();
        journal.file().execute("PRAGMA query_only = ON");
        JournalException e = assertThrows(JournalException.class, () -> {
            journal.keep(JOB, 1, content(1));
            journal.flush();
        });
        assertEquals("journal cannot be written: it is read-only", e.getMessage());
        assertArrayEquals(content(0), journal.find(JOB, 0).orElseThrow());
        assertArrayEquals(content(1), journal.find(JOB, 1).orElseThrow());
        journal.file().execute("PRAGMA query_only = OFF");
    }

    /** A caller that only ever keeps learns of a failed commit all the same. */
    @Test
    void aFailureOfTheJournalsOwnThreadIsThrownByALaterCall() throws SQLException, InterruptedException {
        SqliteJournal journal = journal();
        journal.file().execute("PRAGMA query_only = ON");
        long giveUpAt = System.nanoTime() + 50 * SqliteJournal.COMMIT_INTERVAL_MS * 1_000_000;
        JournalException thrown = null;
        for (int i = 0; thrown == null; i++) {
            assertTrue(System.nanoTime() < giveUpAt, "nothing was thrown");
            try {
                journal.keep(JOB, i, new byte[] {1});
                Thread.sleep(10);
            } catch (JournalException e) {
                thrown = e;
            }
        }
        assertEquals("journal cannot be written: it is read-only", thrown.getMessage());
        journal.file().execute("PRAGMA query_only = OFF");
    }

    @Test
    void claimsOfTwoOwnersAreApartAndLeaveOutWhatIsKept() {
        SqliteJournal one = journal();
        SqliteJournal two = journal();
        one.keep(JOB, 4, content(4));
        one.keep(JOB, 9, content(9));
        assertEquals(Optional.of(new Claim(JOB, 0, 3)), one.claim(JOB, 0, 100, 3));
        assertEquals(Optional.of(new Claim(JOB, 3, 4)), two.claim(JOB, 0, 100, 3));
        assertEquals(Optional.of(new Claim(JOB, 5, 8)), two.claim(JOB, 0, 100, 3));
        assertEquals(Optional.of(new Claim(JOB, 8, 9)), one.claim(JOB, 2, 100, 3));
        assertEquals(Optional.empty(), one.claim(JOB, 0, 10, 3));
        assertEquals(Optional.of(new Claim(OTHER, 0, 3)), two.claim(OTHER, 0, 100, 3));
        assertEquals(
                Optional.of(new Claim(JOB, 10, Long.MAX_VALUE)),
                two.claim(JOB, 0, Long.MAX_VALUE, 2_000_000_000)
                        .map(claim -> new Claim(JOB, claim.first(), Long.MAX_VALUE)));
    }

    @Test
    void whatWasReleasedOrNeverComputedCanBeClaimedAgain() {
        SqliteJournal one = journal();
        SqliteJournal two = journal();
        Claim claim = one.claim(JOB, 0, 100, 10).orElseThrow();
        one.keep(JOB, 0, content(0));
        one.keep(JOB, 2, content(2));
        one.release(claim);
        one.flush();
        assertEquals(Optional.of(new Claim(JOB, 1, 2)), two.claim(JOB, 0, 100, 10));
        two.close();
        assertEquals(Optional.of(new Claim(JOB, 1, 2)), one.claim(JOB, 0, 100, 10));
    }

    /** A claim whose pieces are all there leaves the file, or days of work would fill it with claims. */
    @Test
    void finishedClaimsLeaveNoTrace() throws SQLException {
        SqliteJournal journal = journal();
        for (int i = 0; i < 50; i++) {
            Claim claim = journal.claim(JOB, 0, 1000, 2).orElseThrow();
            assertEquals(new Claim(JOB, 2L * i, 2L * i + 2), claim);
            journal.keep(JOB, claim.first() + 1, content(1));
            journal.keep(JOB, claim.first(), content(0));
        }
        journal.flush();
        journal.flush();
        assertEquals(0, count("claims"));
        assertEquals(100, count("pieces"));
    }

    /** The first owner's clock stands still, so that it never renews. */
    @Test
    void aClaimThatIsNotRenewedLapses() {
        Instant start = Instant.ofEpochSecond(1000);
        SqliteJournal one = journal(start);
        Claim claim = one.claim(JOB, 0, 10, 10).orElseThrow();
        SqliteJournal soon = journal(start.plusMillis(ClaimTable.LEASE_MS));
        assertEquals(Optional.empty(), soon.claim(JOB, 0, 10, 10));
        SqliteJournal late = journal(start.plusMillis(ClaimTable.LEASE_MS + 1));
        assertEquals(Optional.of(claim), late.claim(JOB, 0, 10, 10));
        // Its first owner may still come back; what it computed is welcome.
        one.keep(JOB, 0, content(0));
        one.flush();
        assertArrayEquals(content(0), late.find(JOB, 0).orElseThrow());
    }

    @Test
    void aClaimThatIsRenewedHolds() throws InterruptedException {
        SqliteJournal one = journal();
        assertTrue(one.claim(JOB, 0, 10, 10).isPresent());
        Thread.sleep(2_000);
        SqliteJournal later = journal(Instant.now().plusMillis(ClaimTable.LEASE_MS - 1_000));
        assertEquals(Optional.empty(), later.claim(JOB, 0, 10, 10));
    }

    private SqliteJournal journal(Instant standingAt) {
        SqliteJournal journal = SqliteJournal.open(path(), "tool 1", Clock.fixed(standingAt, ZoneOffset.UTC));
        opened.add(journal);
        return journal;
    }

    private long count(String table) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + path());
                Statement run = connection.createStatement();
                ResultSet result = run.executeQuery("SELECT count(*) FROM " + table)) {
            return result.getLong(1);
        }
    }

    @Test
    void refusesPathsThatTheDriverWouldMisread() {
        refused(folder.resolve("journal.sqlite?mode=memory"), "the path of a journal must not contain '?'");
        assertFalse(Files.exists(path()));
    }

    private static void refused(Path path, String message) {
        JournalException e = assertThrows(JournalException.class, () -> SqliteJournal.open(path, "tool 1"));
        assertEquals(message, e.getMessage());
        assertEquals(path.toString(), e.file());
    }

    private void sql(String statement) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + path());
                Statement run = connection.createStatement()) {
            run.executeUpdate(statement);
        }
    }
}
