package dev.nearlimit.codes.catalogue;

import java.util.Locale;

/**
 * The parts of {@code family:parameters+suffixes}, lower case and without blanks; nothing is checked yet.
 *
 * @param family what stands before the first colon; all up to the suffixes where there is none
 * @param parameters what stands between the colon and the suffixes
 * @param suffixes from the first plus sign on, or empty
 */
record Designator(String family, String parameters, String suffixes) {
    static Designator of(String text) {
        String plain = text.toLowerCase(Locale.ROOT).replaceAll("\\s+", "");
        int plus = plain.indexOf('+');
        String mother = plus < 0 ? plain : plain.substring(0, plus);
        String suffixes = plus < 0 ? "" : plain.substring(plus);
        int colon = mother.indexOf(':');
        return colon < 0
                ? new Designator(mother, "", suffixes)
                : new Designator(mother.substring(0, colon), mother.substring(colon + 1), suffixes);
    }
}
