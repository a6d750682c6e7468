package dev.nearlimit.codes.family;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import java.util.List;

/** A family of codes that designators of the form {@code name:parameters} name. Immutable; construction builds no code. */
public interface CodeFamily {
    /** The name before the colon, lower case: {@code hamming}. */
    String name();

    /** The designator with its parameters by name: {@code hamming:n,k}. */
    String form();

    /** A few words that say what the family is, for a list. */
    String title();

    /**
     * Builds a code.
     *
     * @param parameters what follows the colon, in lower case
     * @return the code, whose designator is the canonical spelling
     * @throws InvalidCodeException if the family has no such code; the message says what it has
     */
    Code build(String parameters);

    /** Designators of some members worth listing; each builds. */
    List<String> listed();
}
