package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.limits.Limit;
import dev.nearlimit.limits.QuantisedLimit;
import dev.nearlimit.limits.UniformLlrQuantiser;
import java.util.List;
import java.util.stream.Stream;

/**
 * Limits as a result to show.
 *
 * @param limits in the order of the table that they came from
 * @param quantised limits behind a quantiser, shown after the others: of a step asked for, of the best step
 */
record LimitReport(List<Limit> limits, List<QuantisedLimit> quantised) implements Presentation {
    private static final int DECIMALS = 4;

    private List<Limit> all() {
        return Stream.concat(limits.stream(), quantised.stream().map(QuantisedLimit::limit))
                .toList();
    }

    @Override
    public String table() {
        TextTable table = new TextTable()
                .words("limit")
                .numbers("Eb/N0", "dB")
                .numbers("Es/N0", "dB")
                .numbers("SNR", "dB")
                .numbers("efficiency", "bit/dimension")
                .numbers("efficiency", "bit/symbol");
        for (Limit limit : all()) {
            table.row(
                    limit.name(),
                    Numbers.fixed(limit.ebn0Db(), DECIMALS),
                    Numbers.fixed(limit.esn0Db(), DECIMALS),
                    Numbers.fixed(limit.snrDb(), DECIMALS),
                    Numbers.fixed(limit.efficiencyBitsPerRealDimension(), DECIMALS),
                    Numbers.fixed(limit.efficiencyBitsPerSymbol(), DECIMALS));
        }
        StringBuilder text = new StringBuilder(table.toString()).append('\n');
        if (!quantised.isEmpty()) {
            text.append(lossTable()).append('\n');
        }
        for (Limit limit : all()) {
            for (String line : TextTable.wrap(limit.name() + ": " + limit.definition() + ".", TextTable.WIDTH)) {
                text.append(line).append('\n');
            }
            for (String line : TextTable.wrap(limit.method() + ".", TextTable.WIDTH - 2)) {
                text.append("  ").append(line).append('\n');
            }
        }
        return text.toString();
    }

    private TextTable lossTable() {
        TextTable table =
                new TextTable().words("quantiser").numbers("step", "LLR").numbers("loss", "dB");
        for (QuantisedLimit entry : quantised) {
            UniformLlrQuantiser quantiser = entry.quantiser();
            String which = isBest(entry) ? ", best step" : "";
            table.row(
                    quantiser.wordBits() + "-bit " + quantiser.rise().designator() + which,
                    quantiser.hasStep() ? Numbers.fixed(quantiser.step(), DECIMALS) : Numbers.UNKNOWN,
                    Numbers.fixed(entry.lossDb(), DECIMALS));
        }
        return table;
    }

    private static boolean isBest(QuantisedLimit entry) {
        return entry.limit().name().equals(QuantisedLimit.BEST_NAME);
    }

    @Override
    public CsvText csv() {
        CsvText csv = new CsvText(
                "name",
                "ebn0Db",
                "esn0Db",
                "snrDb",
                "efficiencyBitsPerRealDimension",
                "efficiencyBitsPerSymbol",
                "definition",
                "method");
        for (Limit limit : all()) {
            csv.record(
                    limit.name(),
                    limit.ebn0Db(),
                    limit.esn0Db(),
                    limit.snrDb(),
                    limit.efficiencyBitsPerRealDimension(),
                    limit.efficiencyBitsPerSymbol(),
                    limit.definition(),
                    limit.method());
        }
        return csv;
    }

    @Override
    public ObjectNode json() {
        ObjectNode root = JsonText.object();
        ArrayNode rows = root.putArray("limits");
        for (Limit limit : all()) {
            ObjectNode row = rows.addObject();
            row.put("name", limit.name());
            row.put("definition", limit.definition());
            row.put("method", limit.method());
            JsonText.put(row, "ebn0Db", limit.ebn0Db());
            JsonText.put(row, "esn0Db", limit.esn0Db());
            JsonText.put(row, "snrDb", limit.snrDb());
            JsonText.put(row, "efficiencyBitsPerRealDimension", limit.efficiencyBitsPerRealDimension());
            JsonText.put(row, "efficiencyBitsPerSymbol", limit.efficiencyBitsPerSymbol());
        }
        if (!quantised.isEmpty()) {
            putQuantiser(root.putObject("quantiser"));
        }
        return root;
    }

    private void putQuantiser(ObjectNode node) {
        UniformLlrQuantiser any = quantised.get(0).quantiser();
        node.put("word", any.wordBits());
        node.put("rise", any.rise().designator());
        for (QuantisedLimit entry : quantised) {
            if (entry.quantiser().hasStep()) {
                node.put(isBest(entry) ? "bestStep" : "step", entry.quantiser().step());
            }
            node.put(isBest(entry) ? "bestLossDb" : "lossDb", entry.lossDb());
        }
    }
}
