package dev.nearlimit.cli.journal;

import dev.nearlimit.journal.KeptJob;
import java.time.Instant;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.OptionalLong;

/**
 * A point that the journal keeps, in the terms of a simulation.
 *
 * @param id first digits of the key, enough to tell points apart
 * @param k information bits of a frame, if known
 * @param ebn0Db Eb/N0 [dB]; empty where the channel has a fixed parameter
 * @param frames frames in all blocks, if known
 */
record KeptRun(
        String id,
        String code,
        OptionalInt k,
        String decoder,
        String quantiser,
        String modulation,
        String channel,
        OptionalDouble ebn0Db,
        OptionalLong seed,
        long blocks,
        OptionalLong frames,
        Instant created,
        Instant changed,
        String tool) {
    private static final int ID_DIGITS = 12;
    private static final String UNKNOWN = "?";

    static KeptRun of(KeptJob job) {
        return new KeptRun(
                job.hash().hex().substring(0, ID_DIGITS),
                fact(job, "code"),
                job.description()
                        .fact("k")
                        .map(k -> OptionalInt.of(Integer.parseInt(k)))
                        .orElse(OptionalInt.empty()),
                fact(job, "decoder"),
                fact(job, "quantiser"),
                fact(job, "modulation"),
                fact(job, "channel"),
                job.description()
                        .fact("ebn0Db")
                        .map(db -> OptionalDouble.of(Double.parseDouble(db)))
                        .orElse(OptionalDouble.empty()),
                job.description()
                        .fact("seed")
                        .map(seed -> OptionalLong.of(Long.parseLong(seed)))
                        .orElse(OptionalLong.empty()),
                job.pieces(),
                job.description()
                        .fact("framesPerBlock")
                        .map(frames -> OptionalLong.of(Long.parseLong(frames) * job.pieces()))
                        .orElse(OptionalLong.empty()),
                job.created(),
                job.changed(),
                job.tool());
    }

    private static String fact(KeptJob job, String name) {
        return job.description().fact(name).orElse(UNKNOWN);
    }

    /** Eb/N0, or not a number where there is none. */
    double ebn0DbOrNaN() {
        return ebn0Db.orElse(Double.NaN);
    }

    /** A number as text, or a mark where it is not known. */
    static String text(OptionalLong number) {
        return number.isPresent() ? String.valueOf(number.getAsLong()) : UNKNOWN;
    }

    /** A count of blocks in words. */
    static String blocks(long count) {
        return count + (count == 1 ? " block" : " blocks") + " of frames";
    }

    /** The decoder with its quantiser, where it has one, and the channel. */
    String scheme() {
        return code + ", " + decoder + (quantiser.equals("none") ? "" : ", " + quantiser) + ", " + modulation + " over "
                + channel;
    }
}
