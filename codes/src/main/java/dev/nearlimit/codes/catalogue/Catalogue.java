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
import dev.nearlimit.codes.matrix.MatrixFile;
import dev.nearlimit.codes.matrix.MatrixLimits;
import dev.nearlimit.codes.matrix.MatrixRole;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
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

    /**
     * Builds a code from the user's matrix file, named by its path and, if there is no file of just that name, by its path
     * followed by {@code +shorten=s}.
     *
     * @throws InvalidCodeException if the file is no matrix, the matrix makes no code, or the modification does not apply
     */
    public static Code fromFile(String text, MatrixRole role, MatrixLimits limits) {
        int plus = exists(text) ? -1 : text.lastIndexOf(Shortening.KEY);
        String path = plus < 0 ? text : text.substring(0, plus);
        Shortening shortening = Shortening.parse(plus < 0 ? "" : text.substring(plus));
        try {
            return shortening.applyTo(MatrixFile.readCode(Path.of(path), role, limits));
        } catch (InvalidPathException e) {
            throw new InvalidCodeException("'" + path + "' is no path: " + e.getReason(), e);
        }
    }

    private static boolean exists(String path) {
        try {
            return Files.exists(Path.of(path));
        } catch (InvalidPathException e) {
            return false;
        }
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
