package dev.nearlimit.cli.command;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import dev.nearlimit.cli.output.CsvText;
import dev.nearlimit.cli.output.JsonText;
import dev.nearlimit.cli.output.Numbers;
import dev.nearlimit.cli.output.Presentation;
import dev.nearlimit.cli.output.TextTable;
import dev.nearlimit.limits.Limit;
import java.util.List;

/**
 * Limits as a result to show.
 *
 * @param limits in the order of the table that they came from
 */
record LimitReport(List<Limit> limits) implements Presentation {
    private static final int DECIMALS = 4;

    @Override
    public String table() {
        TextTable table = new TextTable()
                .words("limit")
                .numbers("Eb/N0", "dB")
                .numbers("Es/N0", "dB")
                .numbers("SNR", "dB")
                .numbers("efficiency", "bit/dimension")
                .numbers("efficiency", "bit/symbol");
        for (Limit limit : limits) {
            table.row(
                    limit.name(),
                    Numbers.fixed(limit.ebn0Db(), DECIMALS),
                    Numbers.fixed(limit.esn0Db(), DECIMALS),
                    Numbers.fixed(limit.snrDb(), DECIMALS),
                    Numbers.fixed(limit.efficiencyBitsPerRealDimension(), DECIMALS),
                    Numbers.fixed(limit.efficiencyBitsPerSymbol(), DECIMALS));
        }
        StringBuilder text = new StringBuilder(table.toString()).append('\n');
        for (Limit limit : limits) {
            for (String line : TextTable.wrap(limit.name() + ": " + limit.definition() + ".", TextTable.WIDTH)) {
                text.append(line).append('\n');
            }
            for (String line : TextTable.wrap(limit.method() + ".", TextTable.WIDTH - 2)) {
                text.append("  ").append(line).append('\n');
            }
        }
        return text.toString();
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
        for (Limit limit : limits) {
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
        for (Limit limit : limits) {
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
        return root;
    }
}
