package dev.nearlimit.testvectors.published;

import dev.nearlimit.algebra.weight.WeightEnumeration;
import dev.nearlimit.algebra.weight.WeightEnumerator;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.limits.BinaryInputAwgn;
import dev.nearlimit.limits.BinarySymmetricChannel;
import dev.nearlimit.limits.HardDecisionAwgn;
import dev.nearlimit.limits.NormalApproximation;
import dev.nearlimit.limits.ShannonLimit;
import dev.nearlimit.limits.UncodedBinary;
import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Every kind of row that this project reproduces through its API. */
final class Claims {
    /** The size comes last: {@code RM(2,6) (64,22)}. */
    private static final Pattern CODE_SIZE = Pattern.compile("[(\\[]([0-9]+),([0-9]+)[)\\]][^0-9]*$");

    private final Map<String, WeightEnumerator> enumerators = new HashMap<>();

    List<Claim> all() {
        return List.of(
                Claim.ofNumber(
                        "limits.csv",
                        "EbN0 limit",
                        "AWGN unconstrained real-dimension rate",
                        c -> ShannonLimit.leastEbn0Db(c.number("R"))),
                Claim.ofNumber(
                        "limits.csv",
                        "EbN0 limit",
                        "AWGN unconstrained",
                        c -> ShannonLimit.leastEbn0Db(c.number("eta") / 2)),
                Claim.ofNumber(
                        "limits.csv", "EbN0 limit", "BI-AWGN soft", c -> BinaryInputAwgn.leastEbn0Db(c.number("R"))),
                Claim.ofNumber(
                        "limits.csv",
                        "EbN0 limit",
                        "BI-AWGN hard decision (BSC)",
                        c -> HardDecisionAwgn.leastEbn0Db(c.number("R"))),
                Claim.ofNumber(
                        "limits.csv",
                        "sigma at capacity",
                        "BI-AWGN soft",
                        c -> Math.sqrt(0.5 / BinaryInputAwgn.leastEsn0(c.number("R")))),
                Claim.ofNumber(
                        "limits.csv",
                        "crossover at capacity",
                        "BSC",
                        c -> BinarySymmetricChannel.largestCrossover(c.number("R"))),
                Claim.ofNumber("limits.csv", "capacity", "BSC(0.11)", c -> BinarySymmetricChannel.capacity(0.11)),
                Claim.ofNumber(
                        "limits.csv",
                        "EbN0 uncoded",
                        "BPSK/QPSK coherent AWGN",
                        c -> UncodedBinary.ebn0DbForBitErrorRate(c.number("BER"))),
                Claim.ofNumber(
                        "limits.csv",
                        "Eb/N0 normal approximation",
                        "BI-AWGN",
                        c -> NormalApproximation.leastEbn0Db(c.integer("n"), c.integer("k"), c.number("FER"))),
                Claim.ofCode("weights.csv", "number of codewords of given weight", this::countOfWeight),
                Claim.ofCode("weights.csv", "number of minimum-weight codewords", this::countOfWeight),
                Claim.ofCode("mindist.csv", "minimum distance", this::minimumDistance),
                Claim.ofCode("mindist.csv", "true minimum distance", this::minimumDistance),
                Claim.ofCode("mindist.csv", "optimal minimum distance of a binary linear code", this::minimumDistance));
    }

    private BigDecimal countOfWeight(PublishedValue row) {
        return new BigDecimal(enumerator(row).count(new Conditions(row).integer("weight")));
    }

    private BigDecimal minimumDistance(PublishedValue row) {
        return BigDecimal.valueOf(enumerator(row).minimumDistance());
    }

    private WeightEnumerator enumerator(PublishedValue row) {
        WeightEnumerator enumerator = enumerators.computeIfAbsent(
                row.designator(),
                d -> WeightEnumeration.exact(Catalogue.standard().build(d)));
        Matcher size = CODE_SIZE.matcher(row.codeOrChannel());
        if (!size.find()
                || Integer.parseInt(size.group(1)) != enumerator.n()
                || Integer.parseInt(size.group(2)) != enumerator.k()) {
            throw new IllegalStateException(row + ": designator " + row.designator() + " is a " + enumerator.n() + ","
                    + enumerator.k() + " code");
        }
        return enumerator;
    }
}
