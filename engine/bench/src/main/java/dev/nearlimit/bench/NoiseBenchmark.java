package dev.nearlimit.bench;

import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Gaussian noise, random streams included: nanoseconds a sample. */
@State(Scope.Thread)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 1)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@OperationsPerInvocation(64 * NoiseBenchmark.DIMENSIONS)
public class NoiseBenchmark {
    static final int DIMENSIONS = 1944;

    private final GaussianNoise noise = new GaussianNoise(new FrameStreams(1, 1, Stream.NOISE));
    private final float[] samples = new float[64 * DIMENSIONS];
    private long frame;

    @Benchmark
    @Fork(
            value = 1,
            jvmArgsAppend = {"--add-modules", "jdk.incubator.vector", "-Djdk.incubator.vector.VECTOR_ACCESS_OOB_CHECK=0"
            })
    public float[] vector() {
        return next();
    }

    @Benchmark
    @Fork(value = 1, jvmArgsAppend = "-Dnearlimit.kernels=plain")
    public float[] plain() {
        return next();
    }

    private float[] next() {
        noise.fill(frame, samples, DIMENSIONS);
        frame += 64;
        return samples;
    }
}
