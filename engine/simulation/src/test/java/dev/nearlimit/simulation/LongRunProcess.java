package dev.nearlimit.simulation;

import dev.nearlimit.journal.Journal;
import dev.nearlimit.journal.SqliteJournal;
import java.nio.file.Path;

/**
 * A process that runs a million frames in small blocks, most of which fail, so that what a run keeps of a block is much
 * beside the heap that its test gives it. Prints the counts.
 */
final class LongRunProcess {
    private static final Scheme SCHEME = Uncoded.scheme(8, "awgn", true);
    private static final Point POINT = Point.ofEbn0Db(-3);
    static final long FRAMES = 1_000_000;

    private LongRunProcess() {}

    /** Arguments: the journal's file; frames to run. */
    public static void main(String[] args) {
        try (Journal journal = SqliteJournal.open(Path.of(args[0]), "tool 1")) {
            System.out.println(run(2, journal, Long.parseLong(args[1])));
        }
    }

    static PointCounts run(int threads, Journal journal, long frames) {
        StoppingRule rule = new StoppingRule(frames, Long.MAX_VALUE);
        return new Simulator(threads, journal, 64).run(SCHEME, POINT, 5, rule, RunControl.none());
    }

    /** Starts this class in a JVM of its own with a heap of so many MiB. */
    static Process start(int heapMiB, Path folder, String journal, long frames) throws java.io.IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Xmx" + heapMiB + "m",
                        "-XX:+UseSerialGC",
                        "-XX:TieredStopAtLevel=1",
                        "--enable-native-access=ALL-UNNAMED",
                        "-Djava.io.tmpdir=" + folder,
                        "-cp",
                        System.getProperty("java.class.path"),
                        LongRunProcess.class.getName(),
                        journal,
                        String.valueOf(frames))
                .redirectErrorStream(true)
                .start();
    }
}
