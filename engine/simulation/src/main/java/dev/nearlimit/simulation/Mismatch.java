package dev.nearlimit.simulation;

import java.math.BigDecimal;
import java.util.List;
import java.util.regex.Pattern;

/**
 * What a receiver takes its noise and its signal for, beside what they are. Kept in whole micro-dB, so that equal
 * mismatches are equal.
 *
 * <p>The receiver divides by the noise variance that it assumes, so an estimate that is x dB too high makes its LLRs 10^(x
 * / 10) times too small; and it takes the amplitude for 1 where gain control has left it y dB too high, which makes them
 * 10^(y/20) times too large. With antipodal signals both do nothing else: a gain of y dB is an estimate of -y/2 dB. What
 * matters is what stands behind them: a quantiser whose step no longer fits, a check rule that wants true LLRs.
 *
 * @param noiseEstimateMicroDb assumed over true noise variance, millionths of a dB, -40 .. 40 dB
 * @param gainMicroDb amplitude before the demapper over the one it is made for, millionths of a dB, -40 .. 40 dB
 */
public record Mismatch(long noiseEstimateMicroDb, long gainMicroDb) {
    /** How the settings are called in a channel's designator. */
    public static final List<String> SETTINGS = List.of("noise-estimate", "gain");

    private static final Pattern NUMBER = Pattern.compile("[+-]?\\d{1,3}(\\.\\d{1,6})?");
    private static final BigDecimal MICRO = BigDecimal.valueOf(1_000_000);
    private static final long LARGEST_DB = 40;

    // After what its construction needs.
    /** A receiver that knows noise and amplitude. */
    public static final Mismatch NONE = new Mismatch(0, 0);

    public Mismatch {
        check(SETTINGS.get(0), noiseEstimateMicroDb);
        check(SETTINGS.get(1), gainMicroDb);
    }

    private static void check(String name, long microDb) {
        if (Math.abs(microDb) > LARGEST_DB * MICRO.longValue()) {
            throw new InvalidSimulationException(
                    name + " is " + plain(microDb) + " dB, must be -" + LARGEST_DB + " to " + LARGEST_DB);
        }
    }

    /**
     * Reads {@code noise-estimate=1,gain=-0.5}, either or both.
     *
     * @throws InvalidSimulationException if a part is no such setting, comes twice or is out of range
     */
    static Mismatch parse(String text) {
        Long[] microDb = new Long[SETTINGS.size()];
        for (String part : text.split(",", -1)) {
            String[] pair = part.trim().split("=", 2);
            int setting = SETTINGS.indexOf(pair[0].trim());
            if (setting < 0) {
                throw new InvalidSimulationException("unknown setting '" + pair[0].trim()
                        + "' of channel awgn; allowed are " + String.join(", ", SETTINGS));
            }
            if (pair.length < 2 || !NUMBER.matcher(pair[1].trim()).matches()) {
                throw new InvalidSimulationException(SETTINGS.get(setting) + " is '"
                        + (pair.length < 2 ? "" : pair[1].trim())
                        + "', must be a number in dB with at most six decimals");
            }
            if (microDb[setting] != null) {
                throw new InvalidSimulationException(SETTINGS.get(setting) + " of channel awgn is given twice");
            }
            microDb[setting] = new BigDecimal(pair[1].trim()).multiply(MICRO).longValueExact();
        }
        return new Mismatch(microDb[0] == null ? 0 : microDb[0], microDb[1] == null ? 0 : microDb[1]);
    }

    /** As in a channel's designator; a setting of 0 dB is left out. */
    String designator() {
        StringBuilder text = new StringBuilder();
        long[] microDb = {noiseEstimateMicroDb, gainMicroDb};
        for (int i = 0; i < microDb.length; i++) {
            if (microDb[i] != 0) {
                text.append(text.isEmpty() ? "" : ",")
                        .append(SETTINGS.get(i))
                        .append('=')
                        .append(plain(microDb[i]));
            }
        }
        return text.toString();
    }

    private static String plain(long microDb) {
        return new BigDecimal(microDb).divide(MICRO).stripTrailingZeros().toPlainString();
    }

    /**
     * What the receiver's LLRs are of the true ones, linear. StrictMath, because it enters every received value and must
     * be the same on every machine; exactly 1 without mismatch.
     */
    double llrFactor() {
        return StrictMath.pow(10, (gainMicroDb / 20.0 - noiseEstimateMicroDb / 10.0) / MICRO.doubleValue());
    }
}
