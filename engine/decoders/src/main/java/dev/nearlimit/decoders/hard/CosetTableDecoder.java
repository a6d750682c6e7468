package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

/** Corrects what has a coset leader of weight t or less and declares a failure for the rest. */
final class CosetTableDecoder implements Decoder {
    private final CosetLeaders leaders;
    private final int t;
    private final SyndromeBatch syndromes;

    CosetTableDecoder(CosetLeaders leaders, int t) {
        this.leaders = leaders;
        this.t = t;
        this.syndromes = new SyndromeBatch(leaders);
    }

    @Override
    public void decode(LlrBatch received, DecodedBatch decoded) {
        received.hardDecisions(decoded.bits());
        int[] ofFrame = syndromes.of(decoded.bits());
        long failures = 0;
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            if (leaders.weight(ofFrame[f]) <= t) {
                leaders.addLeader(ofFrame[f], 1L << f, decoded.bits());
            } else {
                failures |= 1L << f;
            }
        }
        Arrays.fill(decoded.iterations(), 0);
        decoded.setDeclaredFailures(failures);
    }
}
