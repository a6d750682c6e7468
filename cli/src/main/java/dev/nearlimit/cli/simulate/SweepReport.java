package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.statistics.PairedFailures;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * A sweep as a result to show: at each point every combination, compared frame by frame with the best.
 *
 * @param decoder as the user gave it, without the swept settings
 * @param channel as the user gave it, without the swept settings
 * @param points those of which anything was counted; the last may lack combinations
 * @param endedBy what ended the run early; empty if it was not
 */
record SweepReport(
        SweepGrid grid,
        String decoder,
        String channel,
        Request request,
        List<SweepPoint> points,
        Optional<PointStop> endedBy,
        Performance performance)
        implements Presentation {
    private static final Pattern NUMBER = Pattern.compile("-?\\d{1,9}(\\.\\d+)?");
    private static final int MOST_ACROSS = 9;
    private static final List<String> COMPARISON = List.of(
            "best",
            "tiedWithBest",
            "ferOverBest",
            "framesCompared",
            "failedByBoth",
            "failedByThisOnly",
            "failedByBestOnly",
            "signTestP",
            "lossDb");

    private Scheme anyScheme() {
        return grid.combinations().get(0).scheme();
    }

    @Override
    public String table() {
        PropertyList about = new PropertyList()
                .add(
                        "code",
                        anyScheme().code().designator() + ", rate "
                                + anyScheme().code().rate())
                .add("decoder", decoder)
                .add("swept", String.join(", ", grid.settings()) + ": " + combinations())
                .add("link", anyScheme().modulation().designator() + " over " + channel)
                .add("each point", request.eachPoint());
        StringBuilder text = new StringBuilder(about.toString());
        for (int p = 0; p < points.size(); p++) {
            text.append('\n')
                    .append(heading(points.get(p)))
                    .append(overview(points.get(p)))
                    .append(table(p));
            if (request.details()) {
                text.append('\n').append(details(p));
            }
        }
        return text.append('\n')
                .append(legend())
                .append(Request.incompleteness(
                        allMeasured(),
                        request.points().size() * grid.combinations().size(),
                        endedBy))
                .append(performance.closingLine())
                .toString();
    }

    private String combinations() {
        int size = grid.combinations().size();
        return size == 1 ? "1 combination" : size + " combinations on common noise";
    }

    private static String heading(SweepPoint point) {
        return point.point().ebn0MicroDb().isPresent()
                ? "Eb/N0 " + Numbers.trimmed(point.point().ebn0Db()) + " dB\n\n"
                : "";
    }

    /** With two swept settings one across the other: FER over the best's, * the best, = tied with it. */
    private String overview(SweepPoint point) {
        int across = grid.valuesOfLast();
        int measured = point.measured().size();
        if (grid.settings().size() < 2
                || across > MOST_ACROSS
                || measured < grid.combinations().size()) {
            return "";
        }
        TextTable table = new TextTable().numbers(grid.settings().get(0));
        for (int c = 0; c < across; c++) {
            table.numbers(grid.combinations().get(c).values().get(1) + " ");
        }
        for (int first = 0; first < measured; first += across) {
            List<String> row = new ArrayList<>();
            row.add(grid.combinations().get(first).values().get(0));
            for (int c = first; c < first + across; c++) {
                String mark = c == point.best() ? "*" : point.tied(c) ? "=" : " ";
                row.add(ratio(point.timesBest(c)) + mark);
            }
            table.row(row.toArray(String[]::new));
        }
        return "FER over the best's (*; = tied with it), across: "
                + grid.settings().get(1) + "\n\n" + table + "\n";
    }

    private TextTable settingsColumns() {
        TextTable table = new TextTable();
        grid.settings().forEach(table::numbers);
        return table;
    }

    /** The point's table: rates, and what tells each combination from the best. */
    private TextTable table(int p) {
        SweepPoint point = points.get(p);
        TextTable table = settingsColumns()
                .numbers("FER")
                .words("95 % interval")
                .numbers("times")
                .numbers("loss", "dB")
                .numbers("it only")
                .numbers("best only")
                .numbers("p")
                .words("");
        SweepLoss loss = new SweepLoss(points);
        for (int c = 0; c < point.measured().size(); c++) {
            MeasuredPoint measured = point.measured().get(c);
            PairedFailures pair = point.againstBest(c);
            boolean best = c == point.best();
            List<String> row = new ArrayList<>(grid.combinations().get(c).values());
            Collections.addAll(
                    row,
                    Numbers.errorRate(measured.fer()),
                    Numbers.errorRates(
                            measured.ferInterval().low(), measured.ferInterval().high()),
                    ratio(point.timesBest(c)),
                    Numbers.db(loss.ofCombination(c, p)),
                    best ? "" : String.valueOf(pair.onlyFirst()),
                    best ? "" : String.valueOf(pair.onlySecond()),
                    best ? "" : Numbers.errorRate(pair.signTest()),
                    mark(point, c));
            table.row(row.toArray(String[]::new));
        }
        return table;
    }

    private static String ratio(double times) {
        return Numbers.fixed(times, times < 99.95 ? 1 : 0);
    }

    private static String mark(SweepPoint point, int c) {
        String mark = c == point.best() ? "best" : point.tied(c) ? "tied" : "";
        return point.measured().get(c).counts().complete() ? mark : (mark + " incomplete").trim();
    }

    private TextTable details(int p) {
        TextTable table = settingsColumns()
                .numbers("frames")
                .numbers("errors")
                .numbers("detected")
                .numbers("undetected")
                .numbers("wrong bits")
                .numbers("BER")
                .numbers("iterations");
        for (int c = 0; c < points.get(p).measured().size(); c++) {
            MeasuredPoint measured = points.get(p).measured().get(c);
            List<String> row = new ArrayList<>(grid.combinations().get(c).values());
            Collections.addAll(
                    row,
                    String.valueOf(measured.counts().frames()),
                    String.valueOf(measured.counts().frameErrors()),
                    String.valueOf(measured.counts().detectedErrors()),
                    String.valueOf(measured.counts().undetectedErrors()),
                    Numbers.fixed(measured.outcome().bitErrors().mean(), 1),
                    Numbers.errorRate(measured.ber()),
                    Numbers.fixed(measured.outcome().iterations().mean(), 1));
            table.row(row.toArray(String[]::new));
        }
        return table;
    }

    private static String legend() {
        String text = "times: FER over the lowest at this Eb/N0. loss: by how much less Eb/N0 the best has the same"
                + " FER, between the points measured (estimated). it only, best only: frames of the common noise that"
                + " one of the two failed and the other did not; p: sign test on them. tied: not to be told apart from"
                + " the best at 95 %, all pairs considered.";
        return String.join("\n", TextTable.wrap(text, TextTable.WIDTH)) + "\n\n";
    }

    private List<MeasuredPoint> allMeasured() {
        return points.stream().flatMap(point -> point.measured().stream()).toList();
    }

    @Override
    public CsvText csv() {
        List<String> columns = new ArrayList<>(grid.settings());
        columns.addAll(List.of("decoder", "quantiser", "channel"));
        columns.addAll(PointFields.COLUMNS);
        columns.addAll(COMPARISON);
        CsvText csv = new CsvText(columns.toArray(String[]::new));
        for (int p = 0; p < points.size(); p++) {
            for (int c = 0; c < points.get(p).measured().size(); c++) {
                Combination combination = grid.combinations().get(c);
                List<Object> values = new ArrayList<>(combination.values());
                values.add(combination.scheme().decoder().designator());
                values.add(combination.scheme().quantiser().designator());
                values.add(combination.scheme().channel().designator());
                values.addAll(PointFields.values(points.get(p).measured().get(c)));
                values.addAll(comparison(p, c));
                csv.record(values.toArray());
            }
        }
        return csv;
    }

    /** In the order of the columns. */
    private List<Object> comparison(int p, int c) {
        SweepPoint point = points.get(p);
        PairedFailures pair = point.againstBest(c);
        return List.of(
                c == point.best(),
                point.tied(c),
                point.timesBest(c),
                pair.frames(),
                pair.both(),
                pair.onlyFirst(),
                pair.onlySecond(),
                pair.signTest(),
                new SweepLoss(points).ofCombination(c, p));
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        ObjectNode about = root.putObject("scheme");
        about.put("code", anyScheme().code().designator());
        about.put("decoder", decoder);
        about.put("modulation", anyScheme().modulation().designator());
        about.put("channel", Channel.of(channel).designator());
        request.put(root, endedBy);
        ArrayNode sweep = root.putArray("sweep");
        for (int c = 0; c < grid.combinations().size(); c++) {
            put(sweep.addObject(), c);
        }
        performance.put(root.putObject("performance"));
        return root;
    }

    private void put(ObjectNode entry, int c) {
        Combination combination = grid.combinations().get(c);
        ObjectNode settings = entry.putObject("settings");
        for (int s = 0; s < grid.settings().size(); s++) {
            putValue(settings, grid.settings().get(s), combination.values().get(s));
        }
        entry.put("decoder", combination.scheme().decoder().designator());
        entry.put("quantiser", combination.scheme().quantiser().designator());
        entry.put("channel", combination.scheme().channel().designator());
        ArrayNode list = entry.putArray("points");
        for (int p = 0; p < points.size(); p++) {
            if (c < points.get(p).measured().size()) {
                ObjectNode node = list.addObject();
                PointFields.put(node, points.get(p).measured().get(c));
                putComparison(node.putObject("comparison"), p, c);
            }
        }
    }

    private void putComparison(ObjectNode node, int p, int c) {
        List<Object> values = comparison(p, c);
        for (int i = 0; i < values.size(); i++) {
            String field = COMPARISON.get(i);
            if (values.get(i) instanceof Double number) {
                JsonText.put(node, field, number);
            } else if (values.get(i) instanceof Boolean flag) {
                node.put(field, flag);
            } else {
                node.put(field, (Long) values.get(i));
            }
        }
    }

    private static void putValue(ObjectNode node, String field, String value) {
        if (NUMBER.matcher(value).matches()) {
            node.put(field, new BigDecimal(value));
        } else {
            node.put(field, value);
        }
    }
}
