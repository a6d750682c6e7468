package dev.nearlimit.bench;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import java.util.Random;
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

/**
 * The decoder alone, 10 iterations on every frame: coded bits a microsecond, which is Mb/s. Word lengths of 5 and 7 bits
 * fit 8-bit lanes, 6 and 8 bits need 16; decoders without a word length work in single precision.
 */
@State(Scope.Thread)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 1)
@BenchmarkMode(Mode.Throughput)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@OperationsPerInvocation(64 * LdpcDecoderBenchmark.N)
public class LdpcDecoderBenchmark {
    static final int N = 1944;

    /** With blanks for commas, which separate values of a parameter on the command line. */
    @Param({
        "min-sum:word=5 scale=6/8",
        "min-sum:word=5 offset=1",
        "min-sum:word=6 scale=6/8",
        "min-sum:word=6 offset=1",
        "min-sum:scale=6/8",
        "min-sum:offset=0.5",
        "sum-product"
    })
    public String designator;

    @Param({"layered", "flooding"})
    public String schedule;

    private final LlrBatch received = new LlrBatch(N);
    private final DecodedBatch decoded = new DecodedBatch(N);
    private Decoder decoder;

    @Setup
    public void prepare() {
        Code code = Catalogue.standard().build("ldpc-802.11n:" + N + ",1/2");
        String common = "iterations=10,early-stop=false,schedule=" + schedule;
        String separator = designator.contains(":") ? "," : ":";
        DecoderChoice choice = DecoderDesignator.parse(designator.replace(' ', ',') + separator + common);
        decoder = choice.decoder().newDecoder(code, choice.quantiser());
        Random random = new Random(1);
        for (int i = 0; i < received.levels().length; i++) {
            long level = Math.round(4 + 5 * random.nextGaussian());
            received.levels()[i] = (byte) Math.max(-15, Math.min(15, level));
            received.values()[i] = 0.5f * received.levels()[i] + (float) random.nextGaussian() / 8;
        }
    }

    @Benchmark
    @Fork(
            value = 1,
            jvmArgsAppend = {"--add-modules", "jdk.incubator.vector", "-Djdk.incubator.vector.VECTOR_ACCESS_OOB_CHECK=0"
            })
    public DecodedBatch vector() {
        return decode();
    }

    @Benchmark
    @Fork(value = 1, jvmArgsAppend = "-Dnearlimit.kernels=plain")
    public DecodedBatch plain() {
        return decode();
    }

    private DecodedBatch decode() {
        decoder.decode(received, decoded);
        return decoded;
    }
}
