package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.numerics.kernels.Kernels;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Kernels are chosen once in a JVM, so whole points are run in this one and in one forced to the plain kernels. */
class KernelIndependenceTest {
    private static final List<String> DECODERS = List.of(
            "min-sum:iterations=8,word=4,offset=1",
            "min-sum:iterations=8,word=5,scale=6/8",
            "min-sum:iterations=8,word=6",
            "min-sum:iterations=8,word=5,schedule=flooding",
            "min-sum:iterations=8,word=6,schedule=flooding",
            "min-sum:iterations=8,word=5,step=0.7",
            "min-sum:iterations=8,word=4,step=0.7,rise=mid-rise",
            "min-sum:iterations=8",
            "min-sum:iterations=8,schedule=flooding",
            "sum-product:iterations=4",
            "sum-product:iterations=4,schedule=flooding");

    static final class Probe {
        private Probe() {}

        public static void main(String[] args) {
            System.out.println(Kernels.name());
            points().forEach(System.out::println);
        }
    }

    @Test
    void countsDependNotOnTheKernels() throws Exception {
        assertTrue(Kernels.name().startsWith("vector "), "this test needs --add-modules jdk.incubator.vector");
        List<String> expected = new ArrayList<>(List.of("plain"));
        expected.addAll(points());
        assertEquals(expected, inAnotherJvm("-Dnearlimit.kernels=plain"));
    }

    private static List<String> points() {
        List<String> result = new ArrayList<>();
        for (String decoder : DECODERS) {
            DecoderChoice choice = DecoderDesignator.parse(decoder);
            Scheme scheme = new Scheme(
                    Catalogue.standard().build("ldpc-802.11n:648,1/2"),
                    choice.decoder(),
                    Modulation.BPSK,
                    choice.quantiser(),
                    Channel.of("awgn"));
            StoppingRule rule = new StoppingRule(640, 300);
            PointCounts counts =
                    new Simulator(1, new MemoryJournal()).run(scheme, Point.ofEbn0Db(1.5), 1, rule, RunControl.none());
            assertTrue(counts.frameErrors() > 0, decoder);
            result.add(decoder + ": " + counts);
        }
        return result;
    }

    private static List<String> inAnotherJvm(String option) throws Exception {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        option,
                        "-cp",
                        System.getProperty("java.class.path"),
                        Probe.class.getName())
                .redirectErrorStream(true)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, process.waitFor(), printed);
        return printed.lines().toList();
    }
}
