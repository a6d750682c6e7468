package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.gf2.BitMatrix;
import java.util.List;

/** The (n,1) codes that send one bit n times. */
public final class RepetitionFamily implements CodeFamily {
    private static final int MAX_LENGTH = 4096;

    @Override
    public String name() {
        return "repetition";
    }

    @Override
    public String form() {
        return "repetition:n";
    }

    @Override
    public String title() {
        return "one bit sent n times";
    }

    @Override
    public Code build(String parameters) {
        int n = Parameters.integers(this, parameters, "n")[0];
        if (n < 2 || n > MAX_LENGTH) {
            throw Parameters.refuse(this, parameters, "n is " + n + ", expected 2 .. " + MAX_LENGTH);
        }
        BitMatrix generator = new BitMatrix(1, n);
        for (int position = 0; position < n; position++) {
            generator.set(0, position, true);
        }
        return Code.ofGenerator("repetition:" + n, "repetition of one bit (common practice)", generator)
                .withKnownDistance(n, "the only word that is not zero has weight n");
    }

    @Override
    public List<String> listed() {
        return List.of("repetition:3", "repetition:5", "repetition:7");
    }
}
