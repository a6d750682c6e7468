package dev.nearlimit.testvectors.published;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;

/**
 * One published value: what it says, who says it, and where this project must reproduce it.
 *
 * @param file name of the file that it stands in
 * @param line line of its row, from 1
 * @param id stable name of the value
 * @param quantity what is given
 * @param codeOrChannel of which code or channel
 * @param conditions under which conditions, as {@code name=value} pairs where they are numbers; may be empty
 * @param designator the code as this project names it; empty where no code is concerned
 * @param command arguments of the public command that yields the value; empty where the reach is the API
 * @param pointer where the value stands in the JSON that the command prints, see {@link ValuePointer}; empty likewise
 * @param value the value
 * @param unit its unit; empty for pure numbers
 * @param toleranceKind what the tolerance is measured against
 * @param tolerance greatest allowed difference, at least 0
 * @param source where the value, or the definition that it was computed from, is published
 * @param basis how it was obtained
 * @param note whatever a reader should know; may be empty
 * @param reach where it can be checked
 */
public record PublishedValue(
        String file,
        long line,
        String id,
        String quantity,
        String codeOrChannel,
        String conditions,
        String designator,
        List<String> command,
        String pointer,
        BigDecimal value,
        String unit,
        ToleranceKind toleranceKind,
        BigDecimal tolerance,
        String source,
        Basis basis,
        String note,
        Reach reach) {
    public PublishedValue {
        command = List.copyOf(command);
    }

    /** Compares with a computed value, without rounding either. */
    public Agreement compare(BigDecimal computed) {
        BigDecimal difference = computed.subtract(value).abs();
        BigDecimal allowed = toleranceKind == ToleranceKind.RELATIVE ? tolerance.multiply(value.abs()) : tolerance;
        boolean holds = difference.compareTo(allowed) <= 0;
        return new Agreement(
                holds,
                id + " (" + file + " line " + line + "), " + quantity + " of " + codeOrChannel
                        + (conditions.isEmpty() ? "" : ", " + conditions) + ": computed " + computed + ", published "
                        + value.toPlainString() + (unit.isEmpty() ? "" : " " + unit) + " (" + source + "; "
                        + basis.label() + "), difference " + difference.round(MathContext.DECIMAL32)
                        + ", allowed " + toleranceKind.label() + " " + tolerance.toPlainString());
    }

    /** As {@link #compare(BigDecimal)}; a value that is not finite never agrees. */
    public Agreement compare(double computed) {
        if (!Double.isFinite(computed)) {
            return new Agreement(
                    false,
                    id + " (" + file + " line " + line + "): computed " + computed + ", published "
                            + value.toPlainString());
        }
        return compare(new BigDecimal(computed, MathContext.DECIMAL64));
    }

    /** The id with what it is about, as tests list it. */
    @Override
    public String toString() {
        return id + " " + quantity + ", " + codeOrChannel + (conditions.isEmpty() ? "" : ", " + conditions);
    }
}
