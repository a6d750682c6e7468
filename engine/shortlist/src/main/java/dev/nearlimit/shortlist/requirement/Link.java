package dev.nearlimit.shortlist.requirement;

import dev.nearlimit.limits.Modulation;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The link as the user states it. Exactly one of C/N0 and available Eb/N0 is given; losses are taken from either.
 *
 * @param bandwidthHz occupied bandwidth allowed [Hz]
 * @param rollOff roll-off of the pulse shaping, 0 .. 1: a symbol rate Rs occupies Rs (1 + rollOff)
 * @param bitRateBps information bits a second
 * @param cOverN0DbHz received carrier power over noise density before losses [dBHz]
 * @param availableEbn0Db Eb/N0 before losses [dB]
 * @param losses itemised losses
 * @param modulations permitted modulations, at least one
 */
public record Link(
        double bandwidthHz,
        double rollOff,
        double bitRateBps,
        OptionalDouble cOverN0DbHz,
        OptionalDouble availableEbn0Db,
        List<Loss> losses,
        List<Modulation> modulations) {
    public Link {
        losses = List.copyOf(losses);
        modulations = List.copyOf(modulations);
        requirePositive("link.bandwidthHz", bandwidthHz, "Hz");
        requirePositive("link.bitRateBps", bitRateBps, "bit/s");
        if (!(rollOff >= 0 && rollOff <= 1)) {
            throw new InvalidRequirementException("link.rollOff", "rollOff is " + rollOff + ", must be 0 .. 1");
        }
        if (cOverN0DbHz.isPresent() == availableEbn0Db.isPresent()) {
            throw new InvalidRequirementException(
                    cOverN0DbHz.isPresent() ? "link.availableEbn0Db" : "link",
                    "link needs exactly one of cOverN0DbHz and availableEbn0Db, found "
                            + (cOverN0DbHz.isPresent() ? "both" : "neither"));
        }
        requireFinite("link.cOverN0DbHz", cOverN0DbHz);
        requireFinite("link.availableEbn0Db", availableEbn0Db);
        if (modulations.isEmpty()) {
            throw new InvalidRequirementException("link.modulations", "modulations is empty, needs at least one");
        }
    }

    private static void requirePositive(String field, double value, String unit) {
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            throw new InvalidRequirementException(
                    field, field.substring(field.indexOf('.') + 1) + " is " + value + ", must be above 0 " + unit);
        }
    }

    private static void requireFinite(String field, OptionalDouble value) {
        if (value.isPresent() && !(Math.abs(value.getAsDouble()) <= 400)) {
            throw new InvalidRequirementException(
                    field,
                    field.substring(field.indexOf('.') + 1) + " is " + value.getAsDouble()
                            + ", must be a number of dB between -400 and 400");
        }
    }

    /** All losses together [dB]. */
    public double totalLossDb() {
        return losses.stream().mapToDouble(Loss::db).sum();
    }

    /** Eb/N0 that is left for the code and its decoder, after losses [dB], per information bit of the payload. */
    public double leftEbn0Db() {
        double before = availableEbn0Db.isPresent()
                ? availableEbn0Db.getAsDouble()
                : cOverN0DbHz.getAsDouble() - 10 * Math.log10(bitRateBps);
        return before - totalLossDb();
    }
}
