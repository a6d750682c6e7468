package dev.nearlimit.decoders.hard;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.coset.CosetLeaders;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import java.util.Arrays;

/** Adds the coset leader of each frame's syndrome to its hard decisions. */
final class SyndromeDecoder implements Decoder {
    private final CosetLeaders leaders;
    private final SyndromeBatch syndromes;

    SyndromeDecoder(CosetLeaders leaders) {
        this.leaders = leaders;
        this.syndromes = new SyndromeBatch(leaders);
    }

    @Override
    public void decode(LlrBatch received, DecodedBatch decoded) {
        received.hardDecisions(decoded.bits());
        int[] ofFrame = syndromes.of(decoded.bits());
        for (int f = 0; f < FrameBatch.FRAMES; f++) {
            leaders.addLeader(ofFrame[f], 1L << f, decoded.bits());
        }
        Arrays.fill(decoded.iterations(), 0);
        decoded.setDeclaredFailures(0);
    }
}
