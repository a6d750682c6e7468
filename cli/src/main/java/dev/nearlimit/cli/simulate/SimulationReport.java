package dev.nearlimit.cli.simulate;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.PropertyList;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.Scheme;
import java.util.List;
import java.util.Optional;

/**
 * Measured error rates of one scheme as a result to show.
 *
 * @param points those of which any frame was counted; the last may be incomplete
 * @param endedBy what ended the run early; empty if it was not
 */
record SimulationReport(
        Scheme scheme,
        Request request,
        List<MeasuredPoint> points,
        Optional<PointStop> endedBy,
        Performance performance)
        implements Presentation {
    @Override
    public String table() {
        PropertyList about = new PropertyList()
                .add(
                        "code",
                        scheme.code().designator() + ", rate " + scheme.code().rate())
                .add("decoder", scheme.decoder().designator())
                .add("quantiser", scheme.quantiser().designator())
                .add(
                        "link",
                        scheme.modulation().designator() + " over "
                                + scheme.channel().designator())
                .add("each point", request.eachPoint());
        TextTable table = new TextTable()
                .numbers("Eb/N0", "dB")
                .words("rate")
                .numbers("measured")
                .words("95 % interval")
                .numbers("errors")
                .numbers("frames")
                .numbers("iterations")
                .words("");
        points.forEach(point -> addRows(table, point));
        return about + "\n" + table + "\n" + (request.details() ? PointDetails.text(points) : "")
                + Request.incompleteness(points, request.points().size(), endedBy) + performance.closingLine();
    }

    private void addRows(TextTable table, MeasuredPoint point) {
        PointCounts counts = point.counts();
        table.row(
                Numbers.trimmed(point.ebn0Db()),
                "FER",
                Numbers.errorRate(point.fer()),
                Numbers.errorRates(
                        point.ferInterval().low(), point.ferInterval().high()),
                String.valueOf(counts.frameErrors()),
                String.valueOf(counts.frames()),
                scheme.decoder().maxIterations() > 0 ? Numbers.fixed(point.averageIterations(), 1) : Numbers.UNKNOWN,
                counts.complete() ? "" : "incomplete");
        table.row(
                "",
                "BER",
                Numbers.errorRate(point.ber()),
                Numbers.errorRates(
                        point.berInterval().low(), point.berInterval().high()),
                String.valueOf(counts.bitErrors()),
                "",
                "",
                "");
        table.row(
                "",
                "UER",
                Numbers.errorRate(point.uer()),
                "at most " + Numbers.errorRate(point.uerHigh()),
                String.valueOf(counts.undetectedErrors()),
                "",
                "",
                "");
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText(PointFields.COLUMNS.toArray(String[]::new));
        points.forEach(point -> csv.record(PointFields.values(point).toArray()));
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        ObjectNode about = root.putObject("scheme");
        about.put("code", scheme.code().designator());
        about.put("decoder", scheme.decoder().designator());
        about.put("modulation", scheme.modulation().designator());
        about.put("quantiser", scheme.quantiser().designator());
        about.put("channel", scheme.channel().designator());
        request.put(root, endedBy);
        ArrayNode list = root.putArray("points");
        points.forEach(point -> PointFields.put(list.addObject(), point));
        performance.put(root.putObject("performance"));
        return root;
    }
}
