package dev.nearlimit.journal;

import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The claims of one owner, and those of others as far as they stand in its way. A claim is a lease: it holds as long as
 * its owner renews it, and is void at once where its process is known to be gone. Methods that take part in a transaction
 * of the caller throw {@link SQLException}. Not shared by threads.
 */
final class ClaimTable {
    /** Time without a renewal after which a claim is void: its owner hangs, or was stopped. */
    static final long LEASE_MS = 5_000;

    private static final String CLAIMS = "SELECT id, first_piece, end_piece, owner, process_id, processes,"
            + " renewed_epoch_ms FROM claims WHERE job = ? ORDER BY first_piece";
    private static final String KEPT = "SELECT piece FROM pieces"
            + " WHERE job = (SELECT id FROM jobs WHERE hash = ?) AND piece >= ? AND piece < ? ORDER BY piece";
    private static final String INSERT =
            "INSERT INTO claims (job, first_piece, end_piece, owner, process_id, processes,"
                    + " renewed_epoch_ms) VALUES (?, ?, ?, ?, ?, ?, ?)";
    private static final String DELETE = "DELETE FROM claims WHERE id = ?";
    private static final String DELETE_OWN = "DELETE FROM claims WHERE owner = ? AND job = ? AND first_piece = ?";
    private static final String DELETE_ALL_OWN = "DELETE FROM claims WHERE owner = ?";
    private static final String RENEW = "UPDATE claims SET renewed_epoch_ms = ? WHERE owner = ?";

    private final JournalFile file;
    private final Owner owner;
    /** Own claims with the number of their pieces that are still to come. */
    private final Map<Claim, long[]> missing = new HashMap<>();
    /** Own claims that are of no use any more. */
    private final List<Claim> done = new ArrayList<>();

    ClaimTable(JournalFile file) {
        this.file = file;
        this.owner = Owner.ofThisProcess();
    }

    /** Whether this owner holds claims, which must be renewed. */
    boolean holdsAny() {
        return !missing.isEmpty();
    }

    /** Whether {@link #writeReleases} has anything to do. */
    boolean hasReleases() {
        return !done.isEmpty();
    }

    /** Makes a claim within a transaction; {@link #hold} it once that is committed. */
    Optional<Claim> find(ContentHash job, long from, long end, int most, long nowMs) throws SQLException {
        List<Claim> taken = live(job, nowMs);
        long at = from;
        long nextTaken = Long.MAX_VALUE;
        long nextKept;
        PreparedStatement statement = file.statement(KEPT);
        statement.setString(1, job.hex());
        statement.setLong(2, from);
        statement.setLong(3, end);
        try (ResultSet kept = statement.executeQuery()) {
            nextKept = next(kept);
            int claim = 0;
            while (at < end) {
                while (claim < taken.size() && taken.get(claim).end() <= at) {
                    claim++;
                }
                nextTaken = claim < taken.size() ? taken.get(claim).first() : Long.MAX_VALUE;
                while (nextKept < at) {
                    nextKept = next(kept);
                }
                if (nextTaken <= at) {
                    at = taken.get(claim).end();
                } else if (nextKept == at) {
                    at++;
                } else {
                    break;
                }
            }
        }
        if (at >= end) {
            return Optional.empty();
        }
        long stop = Math.min(Math.min(end, nextTaken), nextKept);
        Claim claim = new Claim(job, at, stop - at > most ? at + most : stop);
        insert(claim, nowMs);
        return Optional.of(claim);
    }

    private static long next(ResultSet kept) throws SQLException {
        return kept.next() ? kept.getLong(1) : Long.MAX_VALUE;
    }

    /** Claims that hold, by ascending first piece; removes the others. */
    private List<Claim> live(ContentHash job, long nowMs) throws SQLException {
        List<Claim> live = new ArrayList<>();
        List<Long> dead = new ArrayList<>();
        PreparedStatement statement = file.statement(CLAIMS);
        statement.setString(1, job.hex());
        try (ResultSet row = statement.executeQuery()) {
            while (row.next()) {
                Owner holder = new Owner(row.getString(4), row.getLong(5), row.getString(6));
                boolean own = holder.equals(owner);
                // A clock that was set back makes a time of the future, which must not hold for ever.
                boolean lapsed = Math.abs(nowMs - row.getLong(7)) > LEASE_MS;
                if (!own && (lapsed || holder.isGone(owner))) {
                    dead.add(row.getLong(1));
                } else {
                    live.add(new Claim(job, row.getLong(2), row.getLong(3)));
                }
            }
        }
        for (long id : dead) {
            PreparedStatement delete = file.statement(DELETE);
            delete.setLong(1, id);
            delete.executeUpdate();
        }
        return live;
    }

    private void insert(Claim claim, long nowMs) throws SQLException {
        PreparedStatement statement = file.statement(INSERT);
        statement.setString(1, claim.job().hex());
        statement.setLong(2, claim.first());
        statement.setLong(3, claim.end());
        statement.setString(4, owner.id());
        statement.setLong(5, owner.processId());
        statement.setString(6, owner.processes());
        statement.setLong(7, nowMs);
        statement.executeUpdate();
    }

    /** Notes a claim that was committed. */
    void hold(Claim claim) {
        missing.put(claim, new long[] {claim.end() - claim.first()});
    }

    /** Notes that a piece was committed; a claim of which all pieces are there is done. */
    void kept(ContentHash job, long piece) {
        for (Map.Entry<Claim, long[]> entry : missing.entrySet()) {
            Claim claim = entry.getKey();
            if (claim.first() <= piece && piece < claim.end() && claim.job().equals(job)) {
                if (--entry.getValue()[0] == 0) {
                    release(claim);
                }
                return;
            }
        }
    }

    /** Notes that a claim is of no use any more. */
    void release(Claim claim) {
        if (missing.remove(claim) != null) {
            done.add(claim);
        }
    }

    /** Removes claims that are done, within a transaction; {@link #releasesWritten} once that is committed. */
    void writeReleases() throws SQLException {
        for (Claim claim : done) {
            PreparedStatement statement = file.statement(DELETE_OWN);
            statement.setString(1, owner.id());
            statement.setString(2, claim.job().hex());
            statement.setLong(3, claim.first());
            statement.executeUpdate();
        }
    }

    void releasesWritten() {
        done.clear();
    }

    /** Renews all claims of this owner, within a transaction. */
    void renew(long nowMs) throws SQLException {
        PreparedStatement statement = file.statement(RENEW);
        statement.setLong(1, nowMs);
        statement.setString(2, owner.id());
        statement.executeUpdate();
    }

    /** Removes all claims of this owner, within a transaction. */
    void releaseAll() throws SQLException {
        PreparedStatement statement = file.statement(DELETE_ALL_OWN);
        statement.setString(1, owner.id());
        statement.executeUpdate();
        missing.clear();
        done.clear();
    }
}
