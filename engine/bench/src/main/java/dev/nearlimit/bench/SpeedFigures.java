package dev.nearlimit.bench;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.NoJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.numerics.kernels.Kernels;
import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.StoppingRule;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.Locale;
import java.util.Random;
import java.util.function.LongSupplier;

/**
 * One figure a line, by the processor time of one thread, so that a machine with other work gives figures that can be
 * compared: {@code engine/bench/figures} runs this beside the yardstick in C and prints ratios. A figure is the best of
 * several stretches, after a warm-up.
 */
public final class SpeedFigures {
    private static final int N = 1944;
    /** Where 10 iterations leave a FER of about 2e-3. */
    private static final double EBN0_DB = 2.2;

    private static final long WARM_UP_NS = 3_000_000_000L;
    private static final long STRETCH_NS = 300_000_000L;
    private static final int STRETCHES = 6;
    private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

    private SpeedFigures() {}

    public static void main(String[] arguments) {
        System.out.println("kernels " + Kernels.name());
        print("noise [ns/sample]", 1e9 / best(noise()));
        print("decoder [Mb/s]", best(decoder()) / 1e6);
        print("end to end [Mb/s]", best(endToEnd("early-stop=false")) / 1e6);
        print("end to end, early stop [Mb/s]", best(endToEnd("early-stop=true")) / 1e6);
        if (!Kernels.name().equals("plain")) { // there it would take minutes to say the same
            print("two threads over one [times]", twoThreads());
        }
    }

    /** How many times as fast two threads are as one, both by the clock on the wall and in turn; needs two idle cores. */
    private static double twoThreads() {
        double[] framesPerS = new double[2];
        for (int round = 0; round < 4; round++) {
            for (int threads = 1; threads <= 2; threads++) {
                Simulator simulator = new Simulator(threads, new NoJournal());
                StoppingRule rule = new StoppingRule(128_000, Long.MAX_VALUE);
                long start = System.nanoTime();
                simulator.run(scheme("early-stop=true"), Point.ofEbn0Db(EBN0_DB), round, rule, RunControl.none());
                double found = rule.maxFrames() * 1e9 / (System.nanoTime() - start);
                framesPerS[threads - 1] = Math.max(framesPerS[threads - 1], found);
            }
        }
        return framesPerS[1] / framesPerS[0];
    }

    private static void print(String name, double figure) {
        System.out.printf(Locale.ROOT, "%s %.3f%n", name, figure);
    }

    /** Units of work a second; the work returns how many units a call did. */
    private static double best(LongSupplier work) {
        for (long start = THREADS.getCurrentThreadCpuTime(); THREADS.getCurrentThreadCpuTime() - start < WARM_UP_NS; ) {
            work.getAsLong();
        }
        double best = 0;
        for (int stretch = 0; stretch < STRETCHES; stretch++) {
            long start = THREADS.getCurrentThreadCpuTime();
            long units = 0;
            long taken;
            do {
                units += work.getAsLong();
                taken = THREADS.getCurrentThreadCpuTime() - start;
            } while (taken < STRETCH_NS);
            best = Math.max(best, units * 1e9 / taken);
        }
        return best;
    }

    private static LongSupplier noise() {
        GaussianNoise noise = new GaussianNoise(new FrameStreams(1, 1, Stream.NOISE));
        float[] samples = new float[64 * 32];
        return () -> {
            noise.start(0);
            for (int i = 0; i < N; i += 32) {
                noise.next(samples, 0, 32);
            }
            return 64L * 32 * ((N + 31) / 32);
        };
    }

    private static LongSupplier decoder() {
        DecoderChoice choice = DecoderDesignator.parse("min-sum:iterations=10,early-stop=false,word=5,offset=1");
        Decoder decoder = choice.decoder().newDecoder(code(), choice.quantiser());
        LlrBatch received = new LlrBatch(N);
        Random random = new Random(1);
        for (int i = 0; i < received.levels().length; i++) {
            long level = Math.round(4 + 5 * random.nextGaussian());
            received.levels()[i] = (byte) Math.max(-15, Math.min(15, level));
        }
        DecodedBatch decoded = new DecodedBatch(N);
        return () -> {
            decoder.decode(received, decoded);
            return 64L * N;
        };
    }

    private static Scheme scheme(String settings) {
        DecoderChoice choice = DecoderDesignator.parse("min-sum:iterations=10,word=5,offset=1," + settings);
        return new Scheme(code(), choice.decoder(), Modulation.BPSK, choice.quantiser(), Channel.of("awgn"));
    }

    private static LongSupplier endToEnd(String settings) {
        Scheme scheme = scheme(settings);
        Simulator simulator = new Simulator(1, new NoJournal());
        long[] seed = {0};
        return () -> {
            StoppingRule rule = new StoppingRule(6400, Long.MAX_VALUE);
            PointCounts counts = simulator.run(scheme, Point.ofEbn0Db(EBN0_DB), seed[0]++, rule, RunControl.none());
            return counts.frames() * N;
        };
    }

    private static Code code() {
        return Catalogue.standard().build("ldpc-802.11n:" + N + ",1/2");
    }
}
