package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import java.util.List;

/** Primitive narrow-sense binary BCH codes with an overall parity bit as last position: length 2^m, m = 3 .. 8. */
public final class ExtendedBchFamily implements CodeFamily {
    @Override
    public String name() {
        return "bch-extended";
    }

    @Override
    public String form() {
        return "bch-extended:n,k";
    }

    @Override
    public String title() {
        return "BCH with an overall parity bit, n = 2^m";
    }

    @Override
    public Code build(String parameters) {
        return BchCodes.build(this, parameters, true);
    }

    @Override
    public List<String> listed() {
        return List.of(
                "bch-extended:16,7",
                "bch-extended:32,21",
                "bch-extended:32,16",
                "bch-extended:64,51",
                "bch-extended:64,45",
                "bch-extended:64,36",
                "bch-extended:128,113",
                "bch-extended:128,106",
                "bch-extended:128,64",
                "bch-extended:256,239");
    }
}
