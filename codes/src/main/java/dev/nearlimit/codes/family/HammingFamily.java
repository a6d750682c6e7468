package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import java.util.List;

/** Hamming codes: n = 2^m - 1 with m = n-k checks, or shortened to fewer information bits. */
public final class HammingFamily implements CodeFamily {
    @Override
    public String name() {
        return "hamming";
    }

    @Override
    public String form() {
        return "hamming:n,k";
    }

    @Override
    public String title() {
        return "corrects one error; shortened where n is not 2^(n-k)-1";
    }

    @Override
    public Code build(String parameters) {
        int[] values = Parameters.integers(this, parameters, "n", "k");
        int n = values[0];
        int k = values[1];
        String objection = HammingCodes.objection(n, k);
        if (objection != null) {
            throw Parameters.refuse(this, parameters, objection);
        }
        return Code.ofParityCheck("hamming:" + n + "," + k, HammingCodes.SOURCE, HammingCodes.parityCheck(n, k, false))
                .withKnownDistance(3, "columns of H differ and are not zero; three of them sum to zero");
    }

    @Override
    public List<String> listed() {
        return List.of(
                "hamming:7,4",
                "hamming:15,11",
                "hamming:31,26",
                "hamming:38,32",
                "hamming:63,57",
                "hamming:71,64",
                "hamming:127,120",
                "hamming:255,247");
    }
}
