package dev.nearlimit.limits;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;

/**
 * The limits that concern one link, in a fixed order: Shannon, modulation, hard decision, then uncoded transmission
 * where a BER is given and the finite-length estimate where n, k and a FER are.
 */
public final class LimitTable {
    public static final String SHANNON = "shannon";
    public static final String MODULATION = "modulation";
    public static final String HARD_DECISION = "hardDecision";
    public static final String UNCODED = "uncoded";
    public static final String NORMAL_APPROXIMATION = "normalApproximation";

    private static final double RATE_ERROR = 1e-9;

    private LimitTable() {}

    /** The limits at a rate, without uncoded transmission. */
    public static List<Limit> atRate(
            double rate, Modulation modulation, OptionalInt n, OptionalInt k, OptionalDouble fer) {
        return atRate(rate, modulation, n, k, fer, OptionalDouble.empty());
    }

    /**
     * The limits at a rate.
     *
     * @param rate information bits per real dimension, in (0, 1)
     * @param n channel uses (real dimensions) of the finite-length estimate; given together with k and fer, or not at all
     * @param k information bits in them; k/n must be the rate
     * @param fer frame error rate, in (0, 1)
     * @param ber bit error rate for the row of uncoded transmission, in (0, 1/2)
     * @throws InvalidLimitException if a value is out of range, or n, k and fer neither all given nor all absent, or the
     *     estimate says nothing there ({@link NormalApproximation#covers})
     */
    public static List<Limit> atRate(
            double rate, Modulation modulation, OptionalInt n, OptionalInt k, OptionalDouble fer, OptionalDouble ber) {
        Checks.insideUnitInterval(rate, "rate");
        List<Limit> rows = new ArrayList<>();
        rows.add(Limit.of(
                SHANNON,
                "least Eb/N0 of any code and any input at this rate, AWGN, unlimited length",
                "exact: closed form (Shannon 1948)",
                ShannonLimit.leastEbn0Db(rate),
                rate,
                modulation));
        rows.add(Limit.of(
                MODULATION,
                "least Eb/N0 of any code at this rate with " + modulation.designator()
                        + " and unquantised output, AWGN, unlimited length",
                "exact: BI-AWGN capacity by quadrature, error below 1e-9 bit",
                BinaryInputAwgn.leastEbn0Db(rate),
                rate,
                modulation));
        rows.add(Limit.of(
                HARD_DECISION,
                "least Eb/N0 of any code at this rate with " + modulation.designator()
                        + " whose decoder sees hard decisions, AWGN, unlimited length",
                "exact: closed form, binary symmetric channel with p = Q(sqrt(2 R Eb/N0))",
                HardDecisionAwgn.leastEbn0Db(rate),
                rate,
                modulation));
        if (ber.isPresent()) {
            rows.add(Limit.of(
                    UNCODED,
                    "Eb/N0 of uncoded " + modulation.designator() + " at BER " + probability(ber.getAsDouble())
                            + ", AWGN",
                    "exact: closed form, BER = Q(sqrt(2 Eb/N0))",
                    UncodedBinary.ebn0DbForBitErrorRate(ber.getAsDouble()),
                    1,
                    modulation));
        }
        finiteLength(rate, modulation, n, k, fer).ifPresent(rows::add);
        return List.copyOf(rows);
    }

    private static Optional<Limit> finiteLength(
            double rate, Modulation modulation, OptionalInt n, OptionalInt k, OptionalDouble fer) {
        if (n.isEmpty() && k.isEmpty() && fer.isEmpty()) {
            return Optional.empty();
        }
        if (n.isEmpty() || k.isEmpty() || fer.isEmpty()) {
            throw new InvalidLimitException("a finite-length limit needs length, information bits and FER together; "
                    + (n.isEmpty() ? "the length" : k.isEmpty() ? "the number of information bits" : "the FER")
                    + " is missing");
        }
        int uses = n.getAsInt();
        int bits = k.getAsInt();
        Checks.block(uses, bits);
        if (Math.abs((double) bits / uses - rate) > RATE_ERROR) {
            throw new InvalidLimitException("rate is " + rate + " but " + bits + " information bits in " + uses
                    + " channel uses are " + (double) bits / uses);
        }
        return Optional.of(Limit.of(
                NORMAL_APPROXIMATION,
                "Eb/N0 of the best code of " + uses + " channel uses and " + bits + " information bits at FER "
                        + probability(fer.getAsDouble()) + " with " + modulation.designator() + ", AWGN",
                "estimated: normal approximation for BI-AWGN with third-order term 1/2 log2 n (Polyanskiy, Poor and"
                        + " Verdu 2010); not a bound",
                NormalApproximation.leastEbn0Db(uses, bits, fer.getAsDouble()),
                (double) bits / uses,
                modulation));
    }

    /** A probability as people write it: 1e-6 rather than 1.0E-6. */
    private static String probability(double p) {
        return Double.toString(p).replace(".0E", "E").replace('E', 'e');
    }
}
