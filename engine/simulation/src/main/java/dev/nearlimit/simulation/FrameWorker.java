package dev.nearlimit.simulation;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;
import java.util.Optional;

/**
 * One thread's chain of payload, encoder, link, quantiser, decoder and error count, with all its buffers. Serves one
 * scheme at any point; nothing is allocated from batch to batch.
 */
final class FrameWorker {
    private final Scheme scheme;
    private final Decoder decoder;
    private final int[] informationPositions;
    private final long[] information;
    private final long[] codeword;
    private final long[] differences;
    private final LlrBatch received;
    private final DecodedBatch decoded;
    private final BlockRecorder recorder;
    private final int framesPerBlock;

    FrameWorker(Scheme scheme, Decoder decoder, int framesPerBlock) {
        this.scheme = scheme;
        this.decoder = decoder;
        this.informationPositions = scheme.code().informationPositions();
        this.information = new long[scheme.code().k()];
        this.codeword = new long[scheme.code().n()];
        this.differences = new long[scheme.code().k()];
        this.received = new LlrBatch(scheme.code().n());
        this.decoded = new DecodedBatch(scheme.code().n());
        this.framesPerBlock = framesPerBlock;
        this.recorder = new BlockRecorder(framesPerBlock, scheme.decoder().maxIterations() > 0);
    }

    /** Computes one block; empty if the run was told to end before it was done. */
    Optional<Block> compute(long block, Payload payload, Link link, RunControl control) {
        recorder.clear();
        long firstFrame = Math.multiplyExact(block, (long) framesPerBlock);
        for (int first = 0; first < framesPerBlock; first += FrameBatch.FRAMES) {
            if (control.stopRequested()) {
                return Optional.empty();
            }
            payload.fill(firstFrame + first, information);
            scheme.code().encoder().encode(information, codeword);
            link.carry(firstFrame + first, codeword, received);
            scheme.quantiser().apply(received);
            decoder.decode(received, decoded);
            record(first);
        }
        return Optional.of(recorder.toBlock(framesPerBlock));
    }

    private void record(int first) {
        long wrong = 0;
        for (int i = 0; i < informationPositions.length; i++) {
            long difference = decoded.bits()[informationPositions[i]] ^ information[i];
            differences[i] = difference;
            wrong |= difference;
        }
        long declared = decoded.declaredFailures();
        for (long rest = wrong | declared; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            long bit = 1L << lane;
            int count = (wrong & bit) != 0 ? wrongBits(lane) : 0;
            recorder.fail(first + lane, count, (declared & bit) == 0);
        }
        recorder.iterations(first, decoded.iterations());
    }

    private int wrongBits(int lane) {
        int count = 0;
        for (long difference : differences) {
            count += (int) (difference >>> lane) & 1;
        }
        return count;
    }
}
