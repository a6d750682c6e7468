package dev.nearlimit.codes.catalogue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.InvalidCodeException;
import dev.nearlimit.codes.family.BchFamily;
import dev.nearlimit.codes.family.CodeFamily;
import dev.nearlimit.codes.family.ExtendedBchFamily;
import dev.nearlimit.codes.family.ExtendedHammingFamily;
import dev.nearlimit.codes.family.GolayFamily;
import dev.nearlimit.codes.family.HammingFamily;
import dev.nearlimit.codes.family.Ieee80211nLdpcFamily;
import dev.nearlimit.codes.family.ParityCheckFamily;
import dev.nearlimit.codes.family.ReedMullerFamily;
import dev.nearlimit.codes.family.RepetitionFamily;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * Code families by name, and codes by designator: {@code family:parameters}, followed by {@code +shorten=s} where a code
 * is shortened. Designators are read without regard to case and blanks; the built code carries the canonical spelling,
 * which builds the same code again. Immutable; nothing is built before it is asked for.
 */
public final class Catalogue {
    private static final Catalogue STANDARD = new Catalogue(List.of(
            new RepetitionFamily(),
            new ParityCheckFamily(),
            new HammingFamily(),
            new ExtendedHammingFamily(),
            new GolayFamily(),
            new ReedMullerFamily(),
            new BchFamily(),
            new ExtendedBchFamily(),
            new Ieee80211nLdpcFamily()));

    private final List<CodeFamily> families;

    private Catalogue(List<CodeFamily> families) {
        this.families = families;
    }

    /** Every family that the project knows. */
    public static Catalogue standard() {
        return STANDARD;
    }

    public List<CodeFamily> families() {
        return families;
    }

    /** Designators worth listing, family by family. Each builds; building all takes well under a second. */
    public List<String> listed() {
        return families.stream().flatMap(family -> family.listed().stream()).toList();
    }

    /** Whether what stands before the first colon names a family, so that the designator is not meant as a path. */
    public boolean isKnownFamily(String designator) {
        return family(Designator.of(designator).family()).isPresent();
    }

    /**
     * Builds the code that a designator names.
     *
     * @throws InvalidCodeException if the family is unknown, has no such code, or a modification does not apply
     */
    public Code build(String text) {
        Designator designator = Designator.of(text);
        CodeFamily family = family(designator.family()).orElseThrow(() -> unknown(designator));
        if (designator.parameters().isEmpty()) {
            throw new InvalidCodeException(
                    "code family '" + family.name() + "' needs parameters: expected " + family.form());
        }
        Shortening shortening = Shortening.parse(designator.suffixes());
        return shortening.applyTo(family.build(designator.parameters()));
    }

    private Optional<CodeFamily> family(String name) {
        return families.stream().filter(family -> family.name().equals(name)).findFirst();
    }

    private InvalidCodeException unknown(Designator designator) {
        List<String> names = families.stream().map(CodeFamily::name).toList();
        String suggestion = NearMiss.nearest(designator.family(), names)
                .map(name -> "; did you mean '" + name + "'?")
                .orElse("");
        return new InvalidCodeException("unknown code family '" + designator.family() + "'" + suggestion
                + " (families: " + names.stream().collect(Collectors.joining(", ")) + ")");
    }
}
