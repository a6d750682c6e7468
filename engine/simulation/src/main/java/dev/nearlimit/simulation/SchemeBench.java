package dev.nearlimit.simulation;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.codes.structure.BchStructure;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.JobDescription;
import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.simulation.link.Link;
import dev.nearlimit.simulation.link.Payload;
import java.util.ArrayDeque;

/**
 * A scheme made ready to run at any point: idle workers kept for the next run, because making a decoder can take longer
 * than a run, and the part of the journal key that the scheme fixes.
 */
final class SchemeBench {
    /** Operations that a block should take: a few milliseconds in lanes, some tens where a decoder goes frame by frame. */
    private static final double OPERATIONS_PER_BLOCK = 1e8;
    /** Making and demapping a received value, and starting a frame's streams, in the same unit. */
    private static final double OPERATIONS_PER_BIT = 16;

    private static final double OPERATIONS_PER_FRAME = 300;
    private static final int MOST_BATCHES = 1024;

    private final Scheme scheme;
    private final int framesPerBlock;
    private final ContentHash schemeHash;
    private final ArrayDeque<FrameWorker> idle = new ArrayDeque<>();

    /**
     * Makes the first decoder at once, so that one that does not fit is refused before anything else is asked of it.
     *
     * @param framesPerBlock frames in a block; 0 for a size by the scheme's cost
     */
    SchemeBench(Scheme scheme, int framesPerBlock) {
        Decoder decoder = scheme.decoder().newDecoder(scheme.code(), scheme.quantiser());
        this.scheme = scheme;
        this.framesPerBlock = framesPerBlock == 0 ? defaultFramesPerBlock(scheme) : framesPerBlock;
        this.schemeHash = hash(scheme);
        idle.push(new FrameWorker(scheme, decoder, this.framesPerBlock));
    }

    /** Frames in a block by default: a function of the scheme alone, so that a later run finds the same blocks. */
    static int defaultFramesPerBlock(Scheme scheme) {
        double decoding = scheme.decoder()
                .operationsPerFrame(scheme.code(), scheme.decoder().maxIterations())
                .total();
        double frame = OPERATIONS_PER_FRAME + OPERATIONS_PER_BIT * scheme.code().n() + Math.max(0, decoding);
        double batches = Math.floor(OPERATIONS_PER_BLOCK / frame / FrameBatch.FRAMES);
        return FrameBatch.FRAMES * (int) Math.max(1, Math.min(MOST_BATCHES, batches));
    }

    int framesPerBlock() {
        return framesPerBlock;
    }

    FrameWorker take() {
        synchronized (idle) {
            if (!idle.isEmpty()) {
                return idle.pop();
            }
        }
        return new FrameWorker(scheme, scheme.decoder().newDecoder(scheme.code(), scheme.quantiser()), framesPerBlock);
    }

    void giveBack(FrameWorker worker) {
        synchronized (idle) {
            idle.push(worker);
        }
    }

    /** The journal key of this scheme at a point. */
    ContentHash jobKey(Point point, long seed) {
        return ContentHash.builder()
                .add("scheme", schemeHash.hex())
                .add("point", point.toString())
                .add("seed", seed)
                .add("frames per block", framesPerBlock)
                .add("block format", Block.FORMAT)
                .build();
    }

    /** What a job is, for whoever lists the journal: designators, sizes [bit], Eb/N0 [dB] where there is one, seed. */
    JobDescription description(Point point, long seed) {
        JobDescription description = JobDescription.NONE
                .with("code", scheme.code().designator())
                .with("n", String.valueOf(scheme.code().n()))
                .with("k", String.valueOf(scheme.code().k()))
                .with("decoder", scheme.decoder().designator())
                .with("quantiser", scheme.quantiser().designator())
                .with("modulation", scheme.modulation().designator())
                .with("channel", scheme.channel().designator());
        if (point.ebn0MicroDb().isPresent()) {
            description = description.with("ebn0Db", String.valueOf(point.ebn0Db()));
        }
        return description.with("seed", String.valueOf(seed)).with("framesPerBlock", String.valueOf(framesPerBlock));
    }

    private static ContentHash hash(Scheme scheme) {
        Code code = scheme.code();
        ContentHash.Builder key = ContentHash.builder();
        // The encoder is systematic at the information positions, so these and the checks fix its mapping.
        key.add("n", code.n()).add("k", code.k());
        for (int r = 0; r < code.parityCheck().rows(); r++) {
            key.add("check", code.parityCheck().row(r));
        }
        key.add("information positions", code.informationPositions());
        key.add(
                "zeros",
                code.structure(BchStructure.class).map(BchStructure::toString).orElse("none"));
        key.add("guaranteed distance", code.guaranteedDistance());
        return key.add("decoder", scheme.decoder().designator())
                .add("decoder revision", scheme.decoder().revision())
                .add("quantiser", scheme.quantiser().designator())
                .add("modulation", scheme.modulation().designator())
                .add("channel", scheme.channel().designator())
                .add("streams revision", FrameStreams.REVISION)
                .add("noise revision", GaussianNoise.REVISION)
                .add("payload revision", Payload.REVISION)
                .add("link revision", Link.REVISION)
                .build();
    }
}
