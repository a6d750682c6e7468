package dev.nearlimit.cli.shortlist;

import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.input.ThreadsOption;
import dev.nearlimit.cli.journal.JournalOptions;
import dev.nearlimit.cli.journal.RunJournal;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.OutputFile;
import dev.nearlimit.cli.output.OutputFormat;
import dev.nearlimit.cli.progress.Progress;
import dev.nearlimit.cli.report.HtmlReport;
import dev.nearlimit.cli.requirement.RequirementReader;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.shortlist.Shortlister;
import dev.nearlimit.shortlist.SimulatedMeters;
import dev.nearlimit.shortlist.requirement.Requirement;
import dev.nearlimit.shortlist.result.ShortlistResult;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Simulator;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code shortlist}: the job itself, from a requirement file to ranked schemes and a report. */
@Command(
        name = "shortlist",
        description = "Which codes with which decoders meet a link's requirement, ranked by the Eb/N0 they need.",
        footer = {
            "%nExample:",
            "  nearlimit shortlist cli/examples/harbour-buoy.yaml --out results",
            "prints the shortlist and writes report.html, shortlist.csv and shortlist.json to",
            "the folder results. A requirement that nothing meets is answered with what comes",
            "closest, and exit code 0. The same command goes on where a run was cut off."
        })
public final class ShortlistCommand implements Callable<Integer> {
    private static final String RESULTS = "shortlist.json";
    private static final String CSV = "shortlist.csv";
    private static final String REPORT = "report.html";

    private final Session session;

    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", paramLabel = "FILE", description = "The requirement, a YAML file (see README.md).")
    private Path file;

    @Option(
            names = "--format",
            paramLabel = "FORMAT",
            defaultValue = "table",
            description = "What to print: table, csv or json (default: ${DEFAULT-VALUE}).")
    private OutputFormat format;

    @Option(
            names = "--out",
            paramLabel = "FOLDER",
            defaultValue = "",
            description = "Folder for report.html, shortlist.csv and shortlist.json (default: the current one);"
                    + " is made if it is not there.")
    private Path folder;

    @Option(names = "--all", description = "Show every scheme in the table, not only the first of each kind.")
    private boolean all;

    @Option(
            names = "--seed",
            paramLabel = "N",
            defaultValue = "1",
            description =
                    "Seed of all random numbers (default: ${DEFAULT-VALUE}); the same seed gives the same result.")
    private long seed;

    @Mixin
    private ThreadsOption threads;

    @Mixin
    private JournalOptions journal;

    public ShortlistCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        Requirement requirement = RequirementReader.read(file);
        requireFolder();
        long start = System.nanoTime();
        int workers = threads.count();
        // A search comes back to points: without a file, their blocks are kept while the run lasts.
        RunJournal kept = journal.open(session, new MemoryJournal());
        Simulator simulator = new Simulator(workers, kept.journal());
        ShortlistResult result;
        try (kept) {
            result = shortlist(requirement, simulator);
        }
        double elapsedS = (System.nanoTime() - start) / 1e9;
        ShortlistRun run = new ShortlistRun(
                requirement,
                result,
                file.toString(),
                "nearlimit shortlist " + file + " --seed " + seed,
                workers,
                elapsedS,
                simulator.blocks(),
                kept.isFile());
        ShortlistReport report = new ShortlistReport(run, all);
        write(report);
        if (!result.complete()) {
            return ExitCode.INTERRUPTED;
        }
        return kept.failed() ? ExitCode.TOOL_FAILED : ExitCode.OK;
    }

    private ShortlistResult shortlist(Requirement requirement, Simulator simulator) {
        try (Progress progress =
                Progress.start(session.terminal(), spec.commandLine().getErr(), "shortlist")) {
            ProgressLine line = new ProgressLine(progress);
            SimulatedMeters meters = new SimulatedMeters(
                    simulator,
                    seed,
                    RunControl.none()
                            .withCancellation(session.interruption()::requested)
                            .withProgress(line::counted));
            return new Shortlister(meters).run(requirement, line::stage, session.interruption()::requested);
        }
    }

    /** Fails before hours of work rather than after. */
    private void requireFolder() {
        if (Files.exists(folder) && !Files.isDirectory(folder)) {
            throw new InputException("--out is a file, a folder was expected", folder.toString(), 0, 0);
        }
        OutputFile.makeFolder(folder);
        for (String name : List.of(RESULTS, CSV, REPORT)) {
            OutputFile.requireWritable(folder, name);
        }
    }

    private void write(ShortlistReport report) {
        ObjectNode json = report.json();
        OutputFile.write(folder.resolve(RESULTS), JsonText.of(json));
        OutputFile.write(folder.resolve(CSV), report.csv().toString());
        HtmlReport.write(json, folder.resolve(REPORT));
        PrintWriter out = spec.commandLine().getOut();
        switch (format) {
            case TABLE -> {
                out.print(report.table());
                out.println("written: " + folder.resolve(REPORT) + ", " + folder.resolve(CSV) + ", "
                        + folder.resolve(RESULTS));
            }
            case CSV -> out.print(report.csv());
            case JSON -> out.print(JsonText.of(json));
        }
        out.flush();
    }
}
