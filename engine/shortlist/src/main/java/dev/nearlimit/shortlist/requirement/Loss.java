package dev.nearlimit.shortlist.requirement;

/**
 * A loss on the link that the simulation does not contain.
 *
 * @param name what it is
 * @param db how much it costs [dB], 0 or more
 */
public record Loss(String name, double db) {
    public Loss {
        if (!(db >= 0 && db <= 200)) {
            throw new InvalidRequirementException(
                    "link.losses", "loss '" + name + "' is " + db + " dB, must be 0 .. 200 dB");
        }
    }
}
