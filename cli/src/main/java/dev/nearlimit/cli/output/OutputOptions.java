package dev.nearlimit.cli.output;

import java.io.PrintWriter;
import java.nio.file.Path;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The options {@code --format} and {@code --out}, mixed into every command that has a result. */
public final class OutputOptions {
    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    @Option(
            names = "--format",
            paramLabel = "FORMAT",
            defaultValue = "table",
            description = "table, csv or json (default: ${DEFAULT-VALUE}).")
    private OutputFormat format;

    @Option(
            names = "--out",
            paramLabel = "PATH",
            description = "Write to this file instead of standard output; the file is whole or absent.")
    private Path out;

    /** Shows a result where and as the user asked for it. */
    public void show(Presentation result) {
        String text = switch (format) {
            case TABLE -> result.table();
            case CSV -> result.csv().toString();
            case JSON -> JsonText.of(result.json());
        };
        if (out != null) {
            OutputFile.write(out, text);
            return;
        }
        PrintWriter writer = command.commandLine().getOut();
        writer.print(text);
        writer.flush();
    }
}
