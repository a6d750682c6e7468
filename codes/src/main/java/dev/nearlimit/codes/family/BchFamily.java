package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import java.util.List;

/** Primitive narrow-sense binary BCH codes of length 2^m - 1, m = 3 .. 8. */
public final class BchFamily implements CodeFamily {
    @Override
    public String name() {
        return "bch";
    }

    @Override
    public String form() {
        return "bch:n,k";
    }

    @Override
    public String title() {
        return "primitive narrow-sense BCH, n = 2^m-1";
    }

    @Override
    public Code build(String parameters) {
        return BchCodes.build(this, parameters, false);
    }

    @Override
    public List<String> listed() {
        return List.of(
                "bch:15,7",
                "bch:15,5",
                "bch:31,21",
                "bch:31,16",
                "bch:31,11",
                "bch:63,51",
                "bch:63,45",
                "bch:63,36",
                "bch:63,30",
                "bch:127,113",
                "bch:127,106",
                "bch:127,92",
                "bch:127,64",
                "bch:255,239",
                "bch:255,223",
                "bch:255,191",
                "bch:255,131");
    }
}
