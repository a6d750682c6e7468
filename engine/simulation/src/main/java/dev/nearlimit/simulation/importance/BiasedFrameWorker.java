package dev.nearlimit.simulation.importance;

import dev.nearlimit.codes.batch.FrameBatch;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.noise.UniformDraws;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.link.Payload;
import java.util.List;

/**
 * One thread's chain of payload, encoder, biased noise, quantiser, decoder and weighing, with all its buffers. The LLR of
 * a received value is formed as in an unbiased simulation.
 */
final class BiasedFrameWorker {
    private static final double HALF_WAY = 0.5;

    private final Scheme scheme;
    private final List<ErrorSet> sets;
    private final Decoder decoder;
    private final Payload payload;
    private final BiasedNoise noise;
    private final BiasMixture mixture;
    private final int[] informationPositions;
    private final float sigma;
    private final float llrOfUnit;
    private final long[] information;
    private final long[] codeword;
    private final long[] wrong;
    private final float[] samples;
    private final LlrBatch received;
    private final DecodedBatch decoded;

    BiasedFrameWorker(Scheme scheme, List<ErrorSet> sets, BiasMixture mixture, BiasedPoint point) {
        this.scheme = scheme;
        this.sets = sets;
        this.mixture = mixture;
        int n = scheme.code().n();
        this.decoder = scheme.decoder().newDecoder(scheme.code(), scheme.quantiser());
        this.payload =
                new Payload(new UniformDraws(new FrameStreams(point.seed(), point.ebn0MicroDb(), Stream.PAYLOAD)));
        this.noise = new BiasedNoise(point.seed(), point.ebn0MicroDb(), mixture, sets, n);
        this.informationPositions = scheme.code().informationPositions();
        this.sigma = point.sigma();
        this.llrOfUnit = point.llrOfUnit();
        this.information = new long[scheme.code().k()];
        this.codeword = new long[n];
        this.wrong = new long[n];
        this.samples = new float[n * FrameBatch.FRAMES];
        this.received = new LlrBatch(n);
        this.decoded = new DecodedBatch(n);
    }

    /** Up to 64 frames from one on. */
    WeightTally compute(long firstFrame, int frames) {
        payload.fill(firstFrame, information);
        scheme.code().encoder().encode(information, codeword);
        noise.fill(firstFrame, codeword, samples);
        System.arraycopy(samples, 0, received.values(), 0, samples.length);
        Kernels.reception().demap(codeword, 0, codeword.length, sigma, llrOfUnit, received.values(), 0);
        scheme.quantiser().apply(received);
        decoder.decode(received, decoded);
        return weigh(failed() & FrameBatch.laneMask(frames)).withFrames(frames);
    }

    /** Lanes with a wrong information bit or a declared failure; fills what is wrong at every position. */
    private long failed() {
        for (int i = 0; i < wrong.length; i++) {
            wrong[i] = decoded.bits()[i] ^ codeword[i];
        }
        long failed = decoded.declaredFailures();
        for (int position : informationPositions) {
            failed |= wrong[position];
        }
        return failed;
    }

    private WeightTally weigh(long failed) {
        WeightTally tally = WeightTally.NONE;
        if (failed == 0) {
            return tally;
        }
        double[] sums = noise.sums(codeword, samples);
        for (long rest = failed; rest != 0; rest &= rest - 1) {
            int lane = Long.numberOfTrailingZeros(rest);
            if (isDueToASet(sums, lane)) {
                tally = tally.withError(StrictMath.exp(mixture.logWeight(sums, lane)));
            }
        }
        return tally;
    }

    private boolean isDueToASet(double[] sums, int lane) {
        for (int j = 0; j < sets.size(); j++) {
            if (mixture.lean(j, sums[FrameBatch.softIndex(j, lane)]) >= HALF_WAY && mostIsWrong(sets.get(j), lane)) {
                return true;
            }
        }
        return false;
    }

    private boolean mostIsWrong(ErrorSet set, int lane) {
        int count = 0;
        for (int i = 0; i < set.weight(); i++) {
            count += (int) (wrong[set.position(i)] >>> lane & 1);
        }
        return 2 * count > set.weight();
    }
}
