package dev.nearlimit.shortlist.result;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What was found for one scheme. All Eb/N0 count the energy of everything sent for a payload against its information
 * bits: filler bits and a last word that is not full are charged.
 *
 * @param rank place among the schemes that meet every demand, from 1; null for the others
 * @param code designator of the code as sent, shortened to the payload where it is longer
 * @param family family of the code
 * @param decoder designator of the decoder with all settings
 * @param modulation designator
 * @param quantiser designator
 * @param channel designator
 * @param n bits sent a codeword
 * @param k information bits a codeword
 * @param rate k/n
 * @param codewordsPerPayload codewords that carry one payload
 * @param payloadRate payload bits over all bits sent for them
 * @param codewordFerTarget FER that a codeword may have for the payload to meet its target
 * @param neededEbn0Db Eb/N0 at which the payload meets its target [dB]; null if it was not sought or not found
 * @param neededEbn0DbLow lower end of its 95 % interval
 * @param neededEbn0DbHigh upper end
 * @param neededMethod exact, simulated, or none
 * @param neededHow how it was found, in words
 * @param marginDb available minus needed Eb/N0 [dB]
 * @param codingGainDb Eb/N0 that uncoded transmission needs at the same BER, minus the scheme's [dB]
 * @param codingGainDbLow lower end of what the 95 % interval of the BER leaves of it
 * @param codingGainDbHigh upper end
 * @param codingGainMethod how: simulated or none
 * @param berAtNeeded information-bit error rate at the needed Eb/N0
 * @param gapToShannonDb needed Eb/N0 minus the Shannon limit at the payload's rate [dB]
 * @param gapToModulationLimitDb minus the limit of the modulation
 * @param gapToHardDecisionLimitDb minus the limit of hard decisions; null where the decoder is soft
 * @param gapToFiniteLengthDb minus the finite-length limit for the whole payload with all its channel uses
 * @param gapToFiniteLengthMethod how that limit was obtained
 * @param limits the limits themselves
 * @param uerUpper upper end of the undetected codeword error rate near the needed Eb/N0 (95 %)
 * @param latencyS parts of the latency
 * @param symbolRateBaud symbols a second that carry the bit rate
 * @param occupiedBandwidthHz symbol rate times (1 + roll-off)
 * @param efficiencyBitsPerRealDimension payload bits per real dimension in use
 * @param efficiencyBitsPerSymbol payload bits a symbol
 * @param operationsPerBit decoder operations per payload bit
 * @param averageIterations iterations a codeword near the needed Eb/N0; null for decoders that do not iterate
 * @param minimumDistance of the code as sent, where it is known
 * @param meets whether every demand is met
 * @param fails the demands that are not met, each with what is missing
 * @param tiedWithBest whether its interval overlaps the best scheme's
 * @param pareto whether no scheme that meets every demand is at least as good in Eb/N0, bandwidth, latency and
 *     operations and better in one
 * @param stage how far the search went: exact, refined, coarse, dropped, or unfinished where the run was cut short
 * @param note why it was not taken further, for the reader
 * @param points simulated points, by ascending Eb/N0
 * @param exactCurve exact FER at some Eb/N0, null where none is known
 */
public record SchemeResult(
        Integer rank,
        String code,
        String family,
        String decoder,
        String modulation,
        String quantiser,
        String channel,
        int n,
        int k,
        String rate,
        int codewordsPerPayload,
        String payloadRate,
        double codewordFerTarget,
        Double neededEbn0Db,
        Double neededEbn0DbLow,
        Double neededEbn0DbHigh,
        String neededMethod,
        String neededHow,
        Double marginDb,
        Double codingGainDb,
        Double codingGainDbLow,
        Double codingGainDbHigh,
        String codingGainMethod,
        Double berAtNeeded,
        Double gapToShannonDb,
        Double gapToModulationLimitDb,
        Double gapToHardDecisionLimitDb,
        Double gapToFiniteLengthDb,
        String gapToFiniteLengthMethod,
        Limits limits,
        Double uerUpper,
        Latency latencyS,
        double symbolRateBaud,
        double occupiedBandwidthHz,
        double efficiencyBitsPerRealDimension,
        double efficiencyBitsPerSymbol,
        Operations operationsPerBit,
        Double averageIterations,
        Integer minimumDistance,
        boolean meets,
        List<Failure> fails,
        boolean tiedWithBest,
        boolean pareto,
        String stage,
        String note,
        List<Point> points,
        List<ExactPoint> exactCurve) {
    private static final Pattern WORD = Pattern.compile("word=(\\d+)");

    public SchemeResult {
        fails = List.copyOf(fails);
        points = List.copyOf(points);
        exactCurve = exactCurve == null ? null : List.copyOf(exactCurve);
    }

    /**
     * The decoder in a word or two: its family, and the bits of its LLRs where they are quantised. The whole of its
     * settings stands in {@link #decoder()}.
     */
    public String shortDecoder() {
        String name = decoder.split(":", 2)[0];
        Matcher word = WORD.matcher(quantiser);
        return word.find() ? name + " (" + word.group(1) + "-bit)" : name;
    }

    /** This scheme with its place among those that meet every demand. */
    public SchemeResult ranked(int place, boolean tied, boolean onFront) {
        return new SchemeResult(
                place,
                code,
                family,
                decoder,
                modulation,
                quantiser,
                channel,
                n,
                k,
                rate,
                codewordsPerPayload,
                payloadRate,
                codewordFerTarget,
                neededEbn0Db,
                neededEbn0DbLow,
                neededEbn0DbHigh,
                neededMethod,
                neededHow,
                marginDb,
                codingGainDb,
                codingGainDbLow,
                codingGainDbHigh,
                codingGainMethod,
                berAtNeeded,
                gapToShannonDb,
                gapToModulationLimitDb,
                gapToHardDecisionLimitDb,
                gapToFiniteLengthDb,
                gapToFiniteLengthMethod,
                limits,
                uerUpper,
                latencyS,
                symbolRateBaud,
                occupiedBandwidthHz,
                efficiencyBitsPerRealDimension,
                efficiencyBitsPerSymbol,
                operationsPerBit,
                averageIterations,
                minimumDistance,
                meets,
                fails,
                tied,
                onFront,
                stage,
                note,
                points,
                exactCurve);
    }

    /**
     * Limits at the payload's rate [dB Eb/N0].
     *
     * @param shannonDb input free
     * @param modulationDb points of the modulation fixed, soft decisions
     * @param hardDecisionDb hard decisions
     * @param normalApproximationDb normal approximation for the whole payload; null where it does not exist
     */
    public record Limits(double shannonDb, double modulationDb, double hardDecisionDb, Double normalApproximationDb) {}

    /**
     * Latency [s]; parts that nothing is known about are null.
     *
     * @param fill waiting for the payload's bits
     * @param air first symbol to last
     * @param interleaver interleaving
     * @param decode decoding
     * @param total the parts that are known
     */
    public record Latency(Double fill, double air, Double interleaver, Double decode, double total) {}

    /**
     * Operations per payload bit by kind, with average iterations near the needed Eb/N0; null parts where that is
     * unknown.
     *
     * @param worstCase all kinds together at the most iterations
     */
    public record Operations(Double additions, Double comparisons, Double lookups, Double total, double worstCase) {}

    /**
     * A demand that is not met.
     *
     * @param demand the demand, with its value and unit
     * @param by what is missing, with its unit
     */
    public record Failure(String demand, String by) {}

    /** A simulated point; rates are per codeword, Eb/N0 is the payload's [dB], intervals are 95 %. */
    public record Point(
            double ebn0Db,
            long frames,
            long frameErrors,
            long bitErrors,
            long undetectedErrors,
            double fer,
            double ferLow,
            double ferHigh,
            double ber,
            double berLow,
            double berHigh,
            double averageIterations,
            boolean complete) {}

    /** An exact codeword FER at an Eb/N0 of the payload [dB]. */
    public record ExactPoint(double ebn0Db, double fer) {}
}
