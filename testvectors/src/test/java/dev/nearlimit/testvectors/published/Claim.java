package dev.nearlimit.testvectors.published;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.function.Function;
import java.util.function.Predicate;

/**
 * A kind of row that this test can reproduce, and how.
 *
 * @param rows which rows
 * @param compute the value by this project's API
 */
record Claim(Predicate<PublishedValue> rows, Function<PublishedValue, BigDecimal> compute) {
    static Claim ofNumber(String file, String quantity, String channel, Function<Conditions, Double> compute) {
        return new Claim(
                row -> row.file().equals(file)
                        && row.quantity().startsWith(quantity)
                        && row.codeOrChannel().equals(channel),
                row -> new BigDecimal(compute.apply(new Conditions(row)), MathContext.DECIMAL64));
    }

    static Claim ofCode(String file, String quantity, Function<PublishedValue, BigDecimal> compute) {
        return new Claim(
                row -> row.file().equals(file)
                        && row.quantity().startsWith(quantity)
                        && !row.designator().isEmpty(),
                compute);
    }
}
