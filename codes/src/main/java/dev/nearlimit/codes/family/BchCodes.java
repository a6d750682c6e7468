package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.KnownDistance;
import dev.nearlimit.codes.structure.BchStructure;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** Finds and builds primitive narrow-sense BCH codes, plain and extended by an overall parity bit. */
final class BchCodes {
    static final int MIN_DEGREE = 3;
    static final int MAX_DEGREE = 8;
    private static final String SOURCE =
            "A. Hocquenghem, Chiffres 2 (1959); R. C. Bose and D. K. Ray-Chaudhuri, Inform. and Control 3 (1960)";

    private BchCodes() {}

    static Code build(CodeFamily family, String parameters, boolean extended) {
        int[] values = Parameters.integers(family, parameters, "n", "k");
        int n = values[0];
        int k = values[1];
        int cyclicLength = extended ? n - 1 : n;
        int m = Integer.bitCount(cyclicLength);
        if (m < MIN_DEGREE || m > MAX_DEGREE || cyclicLength != (1 << m) - 1) {
            throw Parameters.refuse(
                    family,
                    parameters,
                    "n is " + n + ", expected 2^m" + (extended ? "" : "-1") + " with m = " + MIN_DEGREE + " .. "
                            + MAX_DEGREE + "; shorter codes by +shorten=s");
        }
        List<BchGenerator> all = BchGenerator.allOfDegree(m);
        BchGenerator code = all.stream()
                .filter(candidate -> candidate.k() == k)
                .findFirst()
                .orElseThrow(() -> Parameters.refuse(
                        family, parameters, "k is " + k + ", expected one of " + dimensions(all) + " for n = " + n));
        Code built = Code.ofGenerator(
                        family.name() + ":" + n + "," + k,
                        SOURCE,
                        SystematicCyclic.generatorMatrix(code.generator(), cyclicLength, extended))
                .withStructure(new BchStructure(m, code.fieldPolynomial(), code.t(), extended, 0));
        Optional<KnownDistance> distance = BchDistance.of(code);
        if (distance.isEmpty()) {
            return built;
        }
        return extended
                ? built.withKnownDistance(
                        distance.get().value() + 1, distance.get().source() + "; overall parity adds 1")
                : built.withKnownDistance(distance.get().value(), distance.get().source());
    }

    private static String dimensions(List<BchGenerator> codes) {
        return codes.stream().map(code -> Integer.toString(code.k())).collect(Collectors.joining(", "));
    }
}
