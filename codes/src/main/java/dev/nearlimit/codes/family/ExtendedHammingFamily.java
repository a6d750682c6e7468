package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import java.util.List;

/** Hamming codes, full-length or shortened, with an overall parity bit as last position. */
public final class ExtendedHammingFamily implements CodeFamily {
    @Override
    public String name() {
        return "hamming-extended";
    }

    @Override
    public String form() {
        return "hamming-extended:n,k";
    }

    @Override
    public String title() {
        return "corrects one error, detects two";
    }

    @Override
    public Code build(String parameters) {
        int[] values = Parameters.integers(this, parameters, "n", "k");
        int n = values[0];
        int k = values[1];
        String objection = HammingCodes.objection(n - 1, k);
        if (objection != null) {
            throw Parameters.refuse(this, parameters, "without the overall parity bit, " + objection);
        }
        return Code.ofParityCheck(
                        "hamming-extended:" + n + "," + k,
                        HammingCodes.SOURCE,
                        HammingCodes.parityCheck(n - 1, k, true))
                .withKnownDistance(4, "a Hamming code of distance 3 and overall parity");
    }

    @Override
    public List<String> listed() {
        return List.of(
                "hamming-extended:8,4",
                "hamming-extended:16,11",
                "hamming-extended:32,26",
                "hamming-extended:39,32",
                "hamming-extended:64,57",
                "hamming-extended:72,64",
                "hamming-extended:128,120");
    }
}
