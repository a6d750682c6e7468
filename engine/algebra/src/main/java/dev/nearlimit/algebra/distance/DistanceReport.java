package dev.nearlimit.algebra.distance;

import dev.nearlimit.algebra.distance.MinimumDistance.Status;
import dev.nearlimit.algebra.weight.EnumerationListener;
import dev.nearlimit.algebra.weight.InformationWeightEnumerator;
import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.KnownDistance;
import java.util.Optional;

/**
 * All that this room knows of a code's distances, in one place for whoever describes a code to a user.
 *
 * @param minimumDistance the minimum distance or an interval for it
 * @param bounds upper bounds for any code of this length and dimension
 * @param weights the whole weight enumerator with information weights, where an enumeration is feasible
 */
public record DistanceReport(
        MinimumDistance minimumDistance, DistanceBounds bounds, Optional<InformationWeightEnumerator> weights) {

    /** The report on a code, enumerated on all processors where that is feasible. */
    public static DistanceReport of(Code code) {
        return of(code, Runtime.getRuntime().availableProcessors(), EnumerationListener.SILENT);
    }

    /**
     * The report on a code. Its minimum distance comes from the enumerator where that is feasible; else from what the
     * code's family knows; else it is an interval.
     *
     * @param threads threads for the enumeration, at least 1
     * @param listener told of the enumeration's progress; may end it
     * @throws java.util.concurrent.CancellationException if the listener or an interrupt ends the enumeration
     */
    public static DistanceReport of(Code code, int threads, EnumerationListener listener) {
        DistanceBounds bounds = DistanceBounds.of(code.n(), code.k());
        if (WeightEnumeration.isFeasible(code)) {
            InformationWeightEnumerator weights = WeightEnumeration.withInformationWeights(code, threads, listener);
            MinimumDistance proven = MinimumDistance.exactly(
                    weights.weights().minimumDistance(), Status.PROVEN, "exact weight enumerator");
            return new DistanceReport(proven, bounds, Optional.of(weights));
        }
        return new DistanceReport(withoutEnumeration(code), bounds, Optional.empty());
    }

    /** The minimum distance from what the code's family knows, or an interval; quick for every code. */
    public static MinimumDistance withoutEnumeration(Code code) {
        if (code.knownDistance().isPresent()) {
            KnownDistance known = code.knownDistance().get();
            return MinimumDistance.exactly(known.value(), Status.PUBLISHED, known.source());
        }
        return DistanceInterval.of(code);
    }
}
