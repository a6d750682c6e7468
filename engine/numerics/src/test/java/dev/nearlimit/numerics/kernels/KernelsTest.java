package dev.nearlimit.numerics.kernels;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class KernelsTest {
    /** Prints the name of the kernels and a sum over what they make. */
    static final class Probe {
        private Probe() {}

        public static void main(String[] args) {
            NoiseKernels kernels = Kernels.noise();
            float[] radius = new float[64];
            kernels.radius(new int[64], radius, new float[64], 64);
            System.out.println(Kernels.name() + " " + radius[63]);
        }
    }

    @Test
    void choosesOnceAndByPresenceOfTheModuleAlone() {
        assertInstanceOf(PlainNoiseKernels.class, Kernels.choose(null, false).noise());
        assertInstanceOf(PlainNoiseKernels.class, Kernels.choose("plain", true).noise());
        assertInstanceOf(VectorNoiseKernels.class, Kernels.choose(null, true).noise());
        assertInstanceOf(VectorNoiseKernels.class, Kernels.choose("", true).noise());
        assertTrue(Kernels.choose(null, true).noise().name().matches("vector \\d+-bit"));
        assertEquals("plain", Kernels.plain().noise().name());
    }

    /** In a JVM of its own: one that was started without the module has no vector classes at all. */
    @Test
    void runsWithoutTheModule() throws Exception {
        assertEquals("plain", nameIn(List.of()));
        assertEquals("plain", nameIn(List.of("--add-modules", "jdk.incubator.vector", "-Dnearlimit.kernels=plain")));
        assertTrue(nameIn(List.of("--add-modules", "jdk.incubator.vector")).startsWith("vector "));
    }

    private static String nameIn(List<String> options) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.addAll(options);
        command.addAll(List.of("-cp", System.getProperty("java.class.path"), Probe.class.getName()));
        Process process = new ProcessBuilder(command)
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).trim();
        assertEquals(0, process.waitFor(), printed);
        // sqrt(-2 ln(2^-32)), in single precision; the last digits are the same whatever the kernels.
        String expected = Float.toString(Radius.ofDraw(0));
        assertTrue(printed.endsWith(" " + expected), printed + ", expected " + expected);
        return printed.substring(0, printed.lastIndexOf(' '));
    }
}
