package dev.nearlimit.cli.report;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;

/**
 * Opens a local page in a headless Chromium and hands back the document after its scripts have run, with what they wrote
 * to the console. A new, empty profile is used each time; the process is killed when its time is up.
 */
public final class HeadlessBrowser {
    private static final List<String> NAMES = List.of("chromium", "chromium-browser");
    private static final Duration TIME_LIMIT = Duration.ofSeconds(60);

    /** How much of the page's own time passes before the document is taken, in ms; no real waiting is tied to it. */
    private static final int VIRTUAL_TIME_MS = 4000;

    private final Path program;

    private HeadlessBrowser(Path program) {
        this.program = program;
    }

    /** The browser of this machine; the test that asks is skipped, with the reason, where there is none. */
    public static HeadlessBrowser findOrSkip() {
        Optional<HeadlessBrowser> found = Stream.concat(
                        Stream.of(System.getenv().getOrDefault("PATH", "").split(File.pathSeparator))
                                .flatMap(folder -> NAMES.stream().map(name -> Path.of(folder, name))),
                        Stream.of(Path.of("/usr/bin/chromium")))
                .filter(Files::isExecutable)
                .findFirst()
                .map(HeadlessBrowser::new);
        if (found.isEmpty()) {
            Assumptions.abort("skipped: no Chromium on this machine");
        }
        return found.get();
    }

    /**
     * What a page became.
     *
     * @param dom the document as HTML after the scripts have run
     * @param console what the page or the browser wrote to the console, one line each; the log does not tell errors from
     *     other lines, so a page that should be without errors had better write nothing
     */
    public record Page(String dom, List<String> console) {}

    /**
     * Opens a page.
     *
     * @param page the file
     * @param scratch an empty folder for the profile and the output
     */
    public Page open(Path page, Path scratch) throws IOException, InterruptedException {
        Path dom = scratch.resolve("dom.html");
        Path log = scratch.resolve("browser.log");
        Process browser = new ProcessBuilder(
                        program.toString(),
                        "--headless",
                        "--no-sandbox",
                        "--disable-gpu",
                        "--disable-quic",
                        "--no-first-run",
                        "--disable-background-networking",
                        "--disable-component-update",
                        "--disable-sync",
                        "--user-data-dir=" + Files.createDirectory(scratch.resolve("profile")),
                        "--window-size=1400,1000",
                        "--virtual-time-budget=" + VIRTUAL_TIME_MS,
                        "--enable-logging=stderr",
                        "--v=0",
                        "--dump-dom",
                        page.toUri().toString())
                .redirectOutput(dom.toFile())
                .redirectError(log.toFile())
                .start();
        try {
            if (!browser.waitFor(TIME_LIMIT.toSeconds(), TimeUnit.SECONDS)) {
                throw new AssertionError("the browser was not done after " + TIME_LIMIT.toSeconds() + " s:\n"
                        + Files.readString(log, StandardCharsets.UTF_8));
            }
        } finally {
            browser.descendants().forEach(ProcessHandle::destroyForcibly);
            browser.destroyForcibly().waitFor();
        }
        if (browser.exitValue() != 0) {
            throw new AssertionError("the browser ended with " + browser.exitValue() + ":\n"
                    + Files.readString(log, StandardCharsets.UTF_8));
        }
        List<String> console = Files.readString(log, StandardCharsets.UTF_8)
                .lines()
                .filter(line -> line.contains("CONSOLE"))
                .toList();
        return new Page(Files.readString(dom, StandardCharsets.UTF_8), console);
    }
}
