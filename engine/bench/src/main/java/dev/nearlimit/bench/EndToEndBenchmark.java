package dev.nearlimit.bench;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.StoppingRule;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Payload, encoding, channel, quantiser, decoding and counting on one thread: coded bits a microsecond, which is Mb/s. */
@State(Scope.Thread)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 1)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@OperationsPerInvocation(EndToEndBenchmark.FRAMES * EndToEndBenchmark.N)
public class EndToEndBenchmark {
    static final int FRAMES = 6400;
    static final int N = 1944;

    @Param({"false", "true"})
    public boolean earlyStop;

    private Scheme scheme;
    private long seed;

    @Setup
    public void prepare() {
        Code code = Catalogue.standard().build("ldpc-802.11n:" + N + ",1/2");
        DecoderChoice choice = DecoderDesignator.parse("min-sum:iterations=10,word=5,offset=1,early-stop=" + earlyStop);
        scheme = new Scheme(code, choice.decoder(), Modulation.BPSK, choice.quantiser(), Channel.of("awgn"));
    }

    @Benchmark
    @Fork(
            value = 1,
            jvmArgsAppend = {"--add-modules", "jdk.incubator.vector", "-Djdk.incubator.vector.VECTOR_ACCESS_OOB_CHECK=0"
            })
    public PointCounts vector() {
        return run();
    }

    @Benchmark
    @Fork(value = 1, jvmArgsAppend = "-Dnearlimit.kernels=plain")
    public PointCounts plain() {
        return run();
    }

    private PointCounts run() {
        StoppingRule rule = new StoppingRule(FRAMES, Long.MAX_VALUE);
        // A journal of its own and another seed: nothing is taken from an earlier run.
        return new Simulator(1, new MemoryJournal()).run(scheme, Point.ofEbn0Db(1.75), seed++, rule, RunControl.none());
    }
}
