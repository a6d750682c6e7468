package dev.nearlimit.cli.journal;

import dev.nearlimit.cli.ExitCode;
import dev.nearlimit.cli.Session;
import dev.nearlimit.cli.failure.InputException;
import dev.nearlimit.cli.output.OutputOptions;
import dev.nearlimit.journal.JournalCatalogue;
import dev.nearlimit.journal.KeptJob;
import dev.nearlimit.journal.MergedPieces;
import dev.nearlimit.simulation.KeptPoint;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code runs}: what the journal keeps. */
@Command(
        name = "runs",
        description = "Lists the points whose blocks of frames the journal keeps, shows one of them, merges another"
                + " journal in, or forgets a point.",
        footer = {
            "%nExamples:",
            "  nearlimit runs --format csv --out runs.csv",
            "  nearlimit runs 3f09ac51",
            "  nearlimit runs --merge from-another-machine.sqlite",
            "Each point has an ID; any first digits of it that no other point shares will do."
        })
public final class RunsCommand implements Callable<Integer> {
    private final Session session;

    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", arity = "0..1", paramLabel = "ID", description = "Show this point with its counts.")
    private String shown;

    @Option(
            names = "--journal",
            paramLabel = "FILE",
            description = "The journal (default: the one in the user's data folder).")
    private Path file;

    @Option(
            names = "--merge",
            paramLabel = "FILE",
            description = "Take in what this journal keeps, all of it or nothing; it stays as it is.")
    private Path merged;

    @Option(names = "--forget", paramLabel = "ID", description = "Remove this point with all its blocks.")
    private String forgotten;

    @Mixin
    private OutputOptions output;

    public RunsCommand(Session session) {
        this.session = session;
    }

    @Override
    public Integer call() {
        if ((shown == null ? 0 : 1) + (merged == null ? 0 : 1) + (forgotten == null ? 0 : 1) > 1) {
            throw new InputException("ID, --merge and --forget exclude each other");
        }
        Path journal = journal();
        if (file == null && !Files.exists(journal)) {
            withoutJournal(journal);
            return ExitCode.OK;
        }
        try (JournalCatalogue catalogue = JournalCatalogue.open(journal)) {
            if (merged != null) {
                merge(catalogue);
            } else if (forgotten != null) {
                forget(catalogue);
            } else if (shown != null) {
                show(catalogue);
            } else {
                output.show(new RunsReport(journal, catalogue.jobs()));
            }
        }
        return ExitCode.OK;
    }

    private Path journal() {
        if (file != null) {
            return file;
        }
        return session.journal()
                .orElseThrow(() -> new InputException("there is no usual journal; --journal names one"));
    }

    /** The usual journal is made by the first run that keeps anything, or to take another in. */
    private void withoutJournal(Path journal) {
        if (shown != null || forgotten != null) {
            throw unknown(shown != null ? shown : forgotten);
        }
        if (merged == null) {
            output.show(new RunsReport(journal, List.of()));
            return;
        }
        try {
            Files.createDirectories(journal.toAbsolutePath().getParent());
        } catch (IOException e) {
            throw new InputException("the journal's folder cannot be made", journal.toString(), 0, 0);
        }
        JournalCatalogue.open(merged).close();
        try (JournalCatalogue catalogue = JournalCatalogue.make(journal)) {
            merge(catalogue);
        }
    }

    private void merge(JournalCatalogue catalogue) {
        MergedPieces pieces = catalogue.merge(merged);
        say("merged " + merged + ": " + KeptRun.blocks(pieces.added()) + " added, " + pieces.known() + " known");
    }

    private void forget(JournalCatalogue catalogue) {
        KeptJob job = find(catalogue, forgotten);
        catalogue.forget(job.hash());
        say("forgot " + KeptRun.of(job).id() + " with " + KeptRun.blocks(job.pieces()));
    }

    private void show(JournalCatalogue catalogue) {
        KeptJob job = find(catalogue, shown);
        KeptPoint point = new KeptPoint();
        catalogue.forEachPiece(job.hash(), point::add);
        output.show(new RunReport(KeptRun.of(job), point.counts()));
    }

    private void say(String line) {
        PrintWriter out = spec.commandLine().getOut();
        out.println(line);
        out.flush();
    }

    private static KeptJob find(JournalCatalogue catalogue, String id) {
        List<KeptJob> jobs = id.isEmpty() ? List.of() : catalogue.jobs(id.toLowerCase(Locale.ROOT));
        if (jobs.isEmpty()) {
            throw unknown(id);
        }
        if (jobs.size() > 1) {
            throw new InputException(
                    "ID '" + id + "' fits " + jobs.size() + " points of the journal; give more of its digits");
        }
        return jobs.get(0);
    }

    private static InputException unknown(String id) {
        return new InputException("the journal keeps no point with ID '" + id + "' (nearlimit runs lists them)");
    }
}
