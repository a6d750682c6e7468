package dev.nearlimit.algebra.distance;

import dev.nearlimit.algebra.distance.MinimumDistance.Status;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import dev.nearlimit.codes.structure.BchStructure;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * Encloses a minimum distance without a search: from below by the columns of the parity-check matrix and by the BCH bound
 * (Bose and Ray-Chaudhuri 1960, Hocquenghem 1959), from above by the lightest generator row and by
 * {@link DistanceBounds}.
 */
final class DistanceInterval {
    private DistanceInterval() {}

    static MinimumDistance of(Code code) {
        int byColumns = leastByColumns(code.parityCheck());
        if (byColumns < 3) {
            String why =
                    byColumns == 1 ? "a position that no check covers" : "two equal columns of the parity-check matrix";
            return MinimumDistance.exactly(byColumns, Status.PROVEN, why);
        }
        int low = byColumns;
        String lowFrom = "at least 3: the columns of the parity-check matrix differ and none is zero";
        Optional<BchStructure> bch = code.structure(BchStructure.class);
        int designed =
                bch.map(zeros -> 2 * zeros.t() + (zeros.extended() ? 2 : 1)).orElse(0);
        if (designed > low) {
            low = designed;
            lowFrom = "at least " + designed + ": BCH bound";
        }
        DistanceBounds bounds = DistanceBounds.of(code.n(), code.k());
        int lightest = lightestRow(code.generator());
        if (lightest <= bounds.best()) {
            return between(low, lowFrom, lightest, "a generator row has weight " + lightest, Status.FOUND);
        }
        String bound = "at most " + bounds.best() + ": " + bounds.nameOfBest() + " bound";
        return between(low, lowFrom, bounds.best(), bound, Status.PROVEN);
    }

    private static MinimumDistance between(int low, String lowFrom, int high, String highFrom, Status statusOfHigh) {
        String how = lowFrom + "; " + highFrom;
        return low == high
                ? MinimumDistance.exactly(low, Status.PROVEN, how)
                : new MinimumDistance(OptionalInt.empty(), low, high, statusOfHigh, how);
    }

    /**
     * 1 if a column is zero, 2 if two are equal, else 3: the distance is the least number of columns that add up to zero,
     * and with 3 it may be larger.
     */
    private static int leastByColumns(SparseBitMatrix parityCheck) {
        SparseBitMatrix columns = parityCheck.transpose();
        Set<List<Integer>> seen = new HashSet<>();
        boolean twice = false;
        for (int c = 0; c < columns.rows(); c++) {
            List<Integer> ones = IntStream.of(columns.row(c)).boxed().toList();
            if (ones.isEmpty()) {
                return 1;
            }
            twice |= !seen.add(ones);
        }
        return twice ? 2 : 3;
    }

    private static int lightestRow(BitMatrix generator) {
        return IntStream.range(0, generator.rows())
                .map(generator::rowWeight)
                .min()
                .orElseThrow();
    }
}
