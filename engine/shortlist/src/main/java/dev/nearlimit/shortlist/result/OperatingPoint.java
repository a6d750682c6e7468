package dev.nearlimit.shortlist.result;

import java.util.List;

/**
 * One operating point of the link with everything found for it.
 *
 * @param name its name
 * @param linkBudget the budget line by line
 * @param availableEbn0Db Eb/N0 left for code and decoder [dB]
 * @param verdict the answer in one sentence
 * @param schemes schemes that meet every demand by rank, then the others, nearest first
 * @param curves reference curves for charts
 */
public record OperatingPoint(
        String name,
        List<BudgetLine> linkBudget,
        double availableEbn0Db,
        String verdict,
        List<SchemeResult> schemes,
        ReferenceCurves curves) {
    public OperatingPoint {
        linkBudget = List.copyOf(linkBudget);
        schemes = List.copyOf(schemes);
    }

    /**
     * A line of the link budget.
     *
     * @param item what it is
     * @param db its value [dB, or dBHz where the item says so]
     */
    public record BudgetLine(String item, double db) {}
}
