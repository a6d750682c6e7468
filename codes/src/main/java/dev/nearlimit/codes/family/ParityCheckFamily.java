package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.SparseBitMatrix;
import java.util.List;
import java.util.stream.IntStream;

/** The (n,n-1) codes with one parity bit over all information bits: the words of even weight. */
public final class ParityCheckFamily implements CodeFamily {
    private static final int MAX_LENGTH = 4096;

    @Override
    public String name() {
        return "parity-check";
    }

    @Override
    public String form() {
        return "parity-check:n";
    }

    @Override
    public String title() {
        return "n-1 bits and their parity";
    }

    @Override
    public Code build(String parameters) {
        int n = Parameters.integers(this, parameters, "n")[0];
        if (n < 2 || n > MAX_LENGTH) {
            throw Parameters.refuse(this, parameters, "n is " + n + ", expected 2 .. " + MAX_LENGTH);
        }
        int[] everyPosition = IntStream.range(0, n).toArray();
        SparseBitMatrix check = SparseBitMatrix.ofRows(n, new int[][] {everyPosition});
        return Code.ofParityCheck("parity-check:" + n, "single parity check (common practice)", check)
                .withKnownDistance(2, "words of even weight, two ones among them");
    }

    @Override
    public List<String> listed() {
        return List.of("parity-check:4", "parity-check:8", "parity-check:16");
    }
}
