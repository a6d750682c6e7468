package dev.nearlimit.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import picocli.CommandLine;

/** What every command tells about itself. */
final class HelpTest {
    static List<String> commands() {
        CommandLine root = NearlimitCommand.commandLine(
                new Session(false, new Interruption()),
                new PrintWriter(new StringWriter()),
                new PrintWriter(new StringWriter()));
        return new ArrayList<>(root.getSubcommands().keySet());
    }

    @ParameterizedTest
    @MethodSource("commands")
    void showsAnExampleTheExitCodesAndTheCommonOptions(String command) {
        Execution help = Execution.of(command, "--help");
        assertEquals(0, help.exitCode());
        assertEquals("", help.err());
        assertTrue(help.out().contains("Example"), help.out());
        assertTrue(help.out().contains("  nearlimit " + command + " "), help.out());
        assertTrue(help.out().contains("Exit codes:"), help.out());
        assertTrue(help.out().contains("bad input"), help.out());
        assertTrue(help.out().contains("--format"), help.out());
        // A stray percent sign makes the parser leave its own placeholders in the text.
        assertFalse(help.out().contains("%n"), help.out());
        assertFalse(help.out().contains("%%"), help.out());
        assertTrue(help.out().lines().allMatch(line -> line.length() <= 80), help.out());
    }

    @Test
    void listsAllCommands() {
        Execution help = Execution.of("--help");
        assertEquals(0, help.exitCode());
        for (String command : commands()) {
            assertTrue(help.out().contains("\n  " + command + " "), help.out());
        }
    }

    @Test
    void versionNamesToolJvmAndKernels() {
        List<String> lines = Execution.of("--version").out().lines().toList();
        assertEquals(3, lines.size());
        assertTrue(lines.get(0).matches("nearlimit \\d+\\.\\d+\\.\\d+.*"), lines.get(0));
        assertTrue(lines.get(1).contains(Runtime.version().toString()), lines.get(1));
        assertFalse(lines.get(2).substring("kernels:".length()).isBlank(), lines.get(2));
    }

    @Test
    void commandMustBeGiven() {
        Execution execution = Execution.of();
        assertEquals(ExitCode.BAD_INPUT, execution.exitCode());
        assertEquals(
                "nearlimit: no command given; known are " + String.join(", ", commands()) + " (see nearlimit --help)\n",
                execution.err());
    }
}
