package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.requirement.Link;
import dev.nearlimit.shortlist.requirement.Loss;
import dev.nearlimit.shortlist.result.OperatingPoint.BudgetLine;
import java.util.ArrayList;
import java.util.List;

/** The link budget line by line, ending in the Eb/N0 that is left for code and decoder. */
final class LinkBudget {
    private LinkBudget() {}

    static List<BudgetLine> lines(Link link) {
        List<BudgetLine> lines = new ArrayList<>();
        if (link.cOverN0DbHz().isPresent()) {
            lines.add(new BudgetLine("received C/N0 [dBHz]", link.cOverN0DbHz().getAsDouble()));
            lines.add(new BudgetLine("information bit rate", -10 * Math.log10(link.bitRateBps())));
        } else {
            lines.add(new BudgetLine("received Eb/N0", link.availableEbn0Db().getAsDouble()));
        }
        for (Loss loss : link.losses()) {
            lines.add(new BudgetLine("loss: " + loss.name(), loss.db() == 0 ? 0 : -loss.db()));
        }
        lines.add(new BudgetLine("Eb/N0 left for code and decoder", link.leftEbn0Db()));
        return lines;
    }
}
