package dev.nearlimit.shortlist;

import dev.nearlimit.shortlist.result.SchemeResult;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Puts schemes in order: those that meet every demand by needed Eb/N0, equal ones by bandwidth and then operations; then
 * the others by how many demands they fail and by how much.
 */
final class Ranking {
    /** A row with what orders it. */
    record Row(SchemeResult scheme, double missDb) {}

    private static final Comparator<Row> BEST_FIRST = Comparator.comparingDouble(
                    (Row row) -> row.scheme().neededEbn0Db())
            .thenComparingDouble(row -> row.scheme().occupiedBandwidthHz())
            .thenComparingDouble(row -> row.scheme().operationsPerBit().worstCase());

    /** Schemes whose needed Eb/N0 is known come first: only of them can be said how near they are.
     * Those that a cut-short run neither met nor rejected come last. */
    private static final Comparator<Row> NEAREST_FIRST = Comparator.comparing(
                    (Row row) -> row.scheme().fails().isEmpty())
            .thenComparing(row -> row.scheme().neededEbn0Db() == null)
            .thenComparingInt(row -> row.scheme().fails().size())
            .thenComparingDouble(Row::missDb)
            .thenComparing(row -> row.scheme().neededEbn0Db(), Comparator.nullsLast(Comparator.naturalOrder()));

    private Ranking() {}

    static List<SchemeResult> rank(List<Row> rows) {
        List<Row> meeting = rows.stream()
                .filter(row -> row.scheme().meets())
                .sorted(BEST_FIRST)
                .toList();
        List<Row> failing = rows.stream()
                .filter(row -> !row.scheme().meets())
                .sorted(NEAREST_FIRST)
                .toList();
        List<SchemeResult> ranked = new ArrayList<>();
        for (Row row : meeting) {
            SchemeResult best = meeting.get(0).scheme();
            ranked.add(row.scheme().ranked(ranked.size() + 1, overlaps(best, row.scheme()), onFront(row, meeting)));
        }
        for (Row row : failing) {
            ranked.add(row.scheme());
        }
        return ranked;
    }

    private static boolean overlaps(SchemeResult best, SchemeResult other) {
        return low(other) <= high(best);
    }

    /** An end of the interval that is not known is as far out as can be. */
    private static double low(SchemeResult scheme) {
        return scheme.neededEbn0DbLow() == null ? Double.NEGATIVE_INFINITY : scheme.neededEbn0DbLow();
    }

    private static double high(SchemeResult scheme) {
        return scheme.neededEbn0DbHigh() == null ? Double.POSITIVE_INFINITY : scheme.neededEbn0DbHigh();
    }

    private static boolean onFront(Row row, List<Row> meeting) {
        return meeting.stream().noneMatch(other -> dominates(other.scheme(), row.scheme()));
    }

    private static boolean dominates(SchemeResult a, SchemeResult b) {
        double[] first = measures(a);
        double[] second = measures(b);
        boolean better = false;
        for (int i = 0; i < first.length; i++) {
            if (first[i] > second[i]) {
                return false;
            }
            better |= first[i] < second[i];
        }
        return better;
    }

    private static double[] measures(SchemeResult scheme) {
        return new double[] {
            scheme.neededEbn0Db(),
            scheme.occupiedBandwidthHz(),
            scheme.latencyS().total(),
            scheme.operationsPerBit().worstCase()
        };
    }
}
