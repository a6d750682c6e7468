package dev.nearlimit.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The tool in a process of its own, which a test may kill; its output goes to files. */
public final class ToolProcess {
    private final Process process;
    private final Path out;
    private final Path err;

    private ToolProcess(Process process, Path out, Path err) {
        this.process = process;
        this.out = out;
        this.err = err;
    }

    /** Starts the tool from this test's class path; data, temporary files and output stay in the folder. */
    public static ToolProcess start(Path folder, String... args) throws IOException {
        return start(folder, List.of(), args);
    }

    /** As {@link #start}, by a program that ends in starting what it is given. */
    public static ToolProcess start(Path folder, List<String> by, String... args) throws IOException {
        List<String> command = new ArrayList<>(by);
        command.addAll(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-Xmx256m",
                "-XX:TieredStopAtLevel=1",
                "-XX:+UseSerialGC",
                "-XX:-UsePerfData",
                "--enable-native-access=ALL-UNNAMED",
                "-Djava.io.tmpdir=" + folder,
                "-cp",
                System.getProperty("java.class.path"),
                Main.class.getName()));
        command.addAll(List.of(args));
        Path out = Files.createTempFile(folder, "out", ".txt");
        Path err = Files.createTempFile(folder, "err", ".txt");
        ProcessBuilder builder =
                new ProcessBuilder(command).redirectOutput(out.toFile()).redirectError(err.toFile());
        builder.environment().put("XDG_DATA_HOME", folder.toString());
        return new ToolProcess(builder.start(), out, err);
    }

    /** kill -9. */
    public void kill() throws InterruptedException {
        process.destroyForcibly().waitFor();
    }

    public boolean isAlive() {
        return process.isAlive();
    }

    /** Waits for the end. */
    public Execution await() throws IOException, InterruptedException {
        int code = process.waitFor();
        return new Execution(code, Files.readString(out), Files.readString(err));
    }
}
