package dev.nearlimit.cli.shortlist;

import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.shortlist.result.OperatingPoint;
import dev.nearlimit.shortlist.result.OperatingPoint.BudgetLine;
import dev.nearlimit.shortlist.result.SchemeResult;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;

/** The shortlist for a terminal of 80 columns: the answer first, then the budget, the ranked and the rejected. */
final class ShortlistTable {
    /** Rows of each table that are shown unless all are asked for. */
    private static final int SHOWN = 12;

    private static final String NUMBERS = "%3s %16s %9s %8s %8s %8s %10s%n";

    private final StringBuilder text = new StringBuilder();
    private final boolean all;

    private ShortlistTable(boolean all) {
        this.all = all;
    }

    static String of(ShortlistRun run, boolean all) {
        ShortlistTable table = new ShortlistTable(all);
        table.write(run);
        return table.text.toString();
    }

    private void write(ShortlistRun run) {
        OperatingPoint point = run.point();
        text.append(run.requirement().name()).append('\n');
        if (!run.result().complete()) {
            paragraph("INCOMPLETE: the run was interrupted; what follows is what it had found by then.");
        }
        text.append('\n');
        paragraph(point.verdict());
        text.append('\n');
        budget(point);
        List<SchemeResult> meeting =
                point.schemes().stream().filter(SchemeResult::meets).toList();
        List<SchemeResult> rejected = point.schemes().stream()
                .filter(scheme -> !scheme.fails().isEmpty())
                .toList();
        if (!meeting.isEmpty()) {
            ranked(meeting);
        }
        if (!rejected.isEmpty()) {
            rejected(rejected);
        }
        int unfinished = point.schemes().size() - meeting.size() - rejected.size();
        if (unfinished > 0) {
            text.append("Not finished: ").append(unfinished).append(" schemes, neither met nor rejected\n\n");
        }
        text.append(String.format(
                Locale.ROOT,
                "%d schemes, %s codewords simulated, seed %d, %d %s, %s%n",
                point.schemes().size(),
                Numbers.engineering(run.result().framesSimulated()).trim(),
                run.result().seed(),
                run.threads(),
                run.threads() == 1 ? "thread" : "threads",
                Numbers.duration(run.elapsedS())));
        if (run.kept()) {
            long blocks = run.blocks().computed() + run.blocks().found();
            text.append(String.format(
                    Locale.ROOT,
                    "%d of %d blocks of frames came from the journal%n",
                    run.blocks().found(),
                    blocks));
        }
    }

    private void budget(OperatingPoint point) {
        TextTable table = new TextTable().words("link budget").numbers("value", "dB");
        for (BudgetLine line : point.linkBudget()) {
            table.row(line.item(), Numbers.db(line.db()));
        }
        text.append(table).append('\n');
    }

    /** Two lines a scheme: what it is, and below its numbers. */
    private void ranked(List<SchemeResult> meeting) {
        text.append("Meets every demand\n\n");
        text.append(
                String.format(Locale.ROOT, NUMBERS, "", "needed Eb/N0", "margin", "gain", "gap", "band", "ops/bit"));
        text.append(String.format(Locale.ROOT, NUMBERS, "", "[dB]", "[dB]", "[dB]", "[dB]", "[kHz]", "worst"));
        boolean ties = meeting.stream().filter(SchemeResult::tiedWithBest).count() > 1;
        for (SchemeResult scheme : shown(meeting)) {
            boolean tied = ties && scheme.tiedWithBest();
            text.append(String.format(Locale.ROOT, "%3d%s %s%n", scheme.rank(), tied ? "=" : " ", name(scheme)));
            text.append(String.format(
                    Locale.ROOT,
                    NUMBERS,
                    "",
                    needed(scheme),
                    Numbers.db(scheme.marginDb()),
                    optional(scheme.codingGainDb()),
                    optional(ownGap(scheme)),
                    Numbers.fixed(scheme.occupiedBandwidthHz() / 1000, 1),
                    Numbers.fixed(scheme.operationsPerBit().worstCase(), 0)));
        }
        more(meeting.size());
        text.append('\n');
        paragraph("needed: \u00b1 half of its 95 % interval, ~ where only bracketed coarsely, alone where exact."
                + " =: cannot be told apart from the best. gain: over uncoded at the same BER. gap: to the limit of the"
                + " modulation at this rate, or of hard decisions where the decoder is hard. ops/bit: decoder operations"
                + " per information bit in the worst case.");
        text.append('\n');
    }

    /** Schemes that differ in modulation alone and fail alike stand together. */
    private void rejected(List<SchemeResult> rejected) {
        text.append("Rejected, nearest first\n\n");
        Map<String, List<SchemeResult>> alike = new LinkedHashMap<>();
        for (SchemeResult scheme : rejected) {
            alike.computeIfAbsent(codeAndDecoder(scheme) + ShortlistCsv.fails(scheme), key -> new ArrayList<>())
                    .add(scheme);
        }
        List<List<SchemeResult>> groups = List.copyOf(alike.values());
        int rows = all ? groups.size() : Math.min(SHOWN, groups.size());
        for (List<SchemeResult> group : groups.subList(0, rows)) {
            String modulations = group.stream()
                    .map(scheme -> scheme.modulation().toUpperCase(Locale.ROOT))
                    .collect(Collectors.joining(" or "));
            text.append("  ")
                    .append(codeAndDecoder(group.get(0)))
                    .append(", ")
                    .append(modulations)
                    .append('\n');
            for (String line : TextTable.wrap(ShortlistCsv.fails(group.get(0)), TextTable.WIDTH - 6)) {
                text.append("      ").append(line).append('\n');
            }
        }
        more(groups.size());
        text.append('\n');
    }

    private List<SchemeResult> shown(List<SchemeResult> schemes) {
        return all ? schemes : schemes.subList(0, Math.min(SHOWN, schemes.size()));
    }

    private void more(int rows) {
        int hidden = all ? 0 : rows - SHOWN;
        if (hidden > 0) {
            text.append("  and ").append(hidden).append(" more: --all shows them here, the report has them too\n");
        }
    }

    /** The estimate with half of its interval's width; the interval itself stands in the CSV and the report. */
    private static String needed(SchemeResult scheme) {
        String estimate = Numbers.db(scheme.neededEbn0Db());
        if (scheme.stage().equals("exact")) {
            return estimate;
        }
        if (scheme.neededEbn0DbLow() == null || scheme.neededEbn0DbHigh() == null) {
            return estimate + " ?";
        }
        double half = (scheme.neededEbn0DbHigh() - scheme.neededEbn0DbLow()) / 2;
        return estimate + (scheme.stage().equals("coarse") ? " ~" : " \u00b1") + Numbers.db(half);
    }

    private static Double ownGap(SchemeResult scheme) {
        return scheme.gapToHardDecisionLimitDb() != null
                ? scheme.gapToHardDecisionLimitDb()
                : scheme.gapToModulationLimitDb();
    }

    private static String optional(Double value) {
        return value == null ? Numbers.UNKNOWN : Numbers.db(value);
    }

    private static String name(SchemeResult scheme) {
        return codeAndDecoder(scheme) + ", " + scheme.modulation().toUpperCase(Locale.ROOT);
    }

    private static String codeAndDecoder(SchemeResult scheme) {
        return scheme.code() + ", " + scheme.shortDecoder();
    }

    private void paragraph(String words) {
        for (String line : TextTable.wrap(words, TextTable.WIDTH)) {
            text.append(line).append('\n');
        }
    }
}
