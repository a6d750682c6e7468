package dev.nearlimit.simulation;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.RefillingDecoder;
import dev.nearlimit.decoders.batch.BatchSource;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.FinishedFrames;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;
import java.util.ArrayDeque;

/**
 * One thread's chain of payload, encoder, link, quantiser, decoder and error count, with all its buffers. Serves one
 * scheme at any point. A decoder that refills its lanes goes on from block to block without a pause, so several blocks
 * may be under way at a time.
 */
final class FrameWorker implements BatchSource, FinishedFrames {
    /** Where numbers of blocks come from and finished blocks go. */
    interface BlockFeed {
        /** Number of the next block to compute, or -1 when there is none now. */
        long next();

        void done(long number, Block block);
    }

    /** A batch under way: what was sent, what was received, and where the outcome is noted. */
    private static final class SentBatch {
        private final long[] information;
        private final LlrBatch received;
        private BlockRecorder block;
        private int firstFrameInBlock;

        SentBatch(Scheme scheme) {
            int n = scheme.code().n();
            this.information = new long[scheme.code().k()];
            this.received = scheme.decoder().readsLevels() ? LlrBatch.ofLevels(n) : new LlrBatch(n);
        }
    }

    private final Scheme scheme;
    private final Decoder decoder;
    private final int framesPerBlock;
    private final int[] informationPositions;
    private final long[] codeword;
    private final long[] differences;
    private final float[] positions = new float[Link.MOST_POSITIONS * FrameBatch.FRAMES];
    private final SentBatch[] underWay;
    private final DecodedBatch decoded;
    private final ArrayDeque<BlockRecorder> idle = new ArrayDeque<>();

    private BlockFeed feed;
    private Payload payload;
    private Link link;
    private RunControl control;
    private BlockRecorder open;
    private int framesSent;
    private long batches;

    FrameWorker(Scheme scheme, Decoder decoder, int framesPerBlock) {
        this.scheme = scheme;
        this.decoder = decoder;
        this.framesPerBlock = framesPerBlock;
        this.informationPositions = scheme.code().informationPositions();
        this.codeword = new long[scheme.code().n()];
        this.differences = new long[scheme.code().k()];
        this.decoded = new DecodedBatch(scheme.code().n());
        this.underWay = new SentBatch[decoder instanceof RefillingDecoder ? RefillingDecoder.BATCHES_UNDER_WAY : 1];
        for (int i = 0; i < underWay.length; i++) {
            underWay[i] = new SentBatch(scheme);
        }
    }

    /** Computes blocks until the feed has none or the run is told to end; then what is unfinished is dropped. */
    void run(BlockFeed from, Payload pointPayload, Link pointLink, RunControl pointControl) {
        feed = from;
        payload = pointPayload;
        link = pointLink;
        control = pointControl;
        open = null;
        batches = 0;
        if (decoder instanceof RefillingDecoder refilling) {
            refilling.decode(this, this);
            return;
        }
        for (LlrBatch received = next(); received != null; received = next()) {
            decoder.decode(received, decoded);
            accept(batches - 1, -1L, decoded);
        }
    }

    @Override
    public LlrBatch next() {
        if (control.stopRequested() || !openBlock()) {
            return null;
        }
        SentBatch batch = underWay[(int) (batches++ % underWay.length)];
        batch.block = open;
        batch.firstFrameInBlock = framesSent;
        send(batch, Math.multiplyExact(open.number(), (long) framesPerBlock) + framesSent);
        framesSent += FrameBatch.FRAMES;
        return batch.received;
    }

    /** Makes sure that there is a block with frames left to send. */
    private boolean openBlock() {
        if (open != null && framesSent < framesPerBlock) {
            return true;
        }
        long number = feed.next();
        if (number < 0) {
            open = null;
            return false;
        }
        open = idle.isEmpty()
                ? new BlockRecorder(framesPerBlock, scheme.decoder().maxIterations() > 0)
                : idle.pop();
        open.start(number);
        framesSent = 0;
        return true;
    }

    private void send(SentBatch batch, long firstFrame) {
        payload.fill(firstFrame, batch.information);
        scheme.code().encoder().encode(batch.information, codeword);
        link.start(firstFrame);
        LlrBatch received = batch.received;
        boolean keepsValues = received.values().length > 0;
        float[] values = keepsValues ? received.values() : positions;
        for (int first = 0; first < codeword.length; first += Link.MOST_POSITIONS) {
            int count = Math.min(Link.MOST_POSITIONS, codeword.length - first);
            int at = keepsValues ? first * FrameBatch.FRAMES : 0;
            link.carry(codeword, first, count, values, at);
            scheme.quantiser()
                    .apply(values, at, count * FrameBatch.FRAMES, received.levels(), first * FrameBatch.FRAMES);
        }
    }

    @Override
    public void accept(long number, long lanes, DecodedBatch ended) {
        SentBatch batch = underWay[(int) (number % underWay.length)];
        long wrong = 0;
        for (int i = 0; i < informationPositions.length; i++) {
            long difference = ended.bits()[informationPositions[i]] ^ batch.information[i];
            differences[i] = difference;
            wrong |= difference;
        }
        wrong &= lanes;
        long declared = ended.declaredFailures() & lanes;
        BlockRecorder block = batch.block;
        for (long rest = wrong | declared; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            long bit = 1L << lane;
            int count = (wrong & bit) != 0 ? wrongBits(lane) : 0;
            block.fail(batch.firstFrameInBlock + lane, count, (declared & bit) == 0);
        }
        if (block.ended(batch.firstFrameInBlock, lanes, ended.iterations())) {
            feed.done(block.number(), block.toBlock());
            idle.push(block);
        }
    }

    private int wrongBits(int lane) {
        int count = 0;
        for (long difference : differences) {
            count += (int) (difference >>> lane) & 1;
        }
        return count;
    }
}
