package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.numerics.noise.GaussianNoise;
import dev.nearlimit.numerics.random.FrameStreams;
import dev.nearlimit.numerics.random.Stream;
import dev.nearlimit.simulation.link.GaussianLink;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A receiver that is mistaken about noise or amplitude. */
class MismatchTest {
    private static final Code LDPC = Catalogue.standard().build("ldpc-802.11n:648,1/2");
    private static final StoppingRule RULE = new StoppingRule(2048, 1_000_000);

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "awgn | awgn",
                "awgn:noise-estimate=0 | awgn",
                "awgn:gain=-0.000,noise-estimate=+0 | awgn",
                "awgn:noise-estimate=+1 | awgn:noise-estimate=1",
                "AWGN:gain=-0.50 | awgn:gain=-0.5",
                "awgn:gain=10,noise-estimate=-2.125 | awgn:noise-estimate=-2.125,gain=10",
                "awgn:gain=0.000001 | awgn:gain=0.000001",
            })
    void designatorsRoundTrip(String given, String canonical) {
        Channel channel = Channel.of(given);
        assertEquals(canonical, channel.designator());
        assertEquals(channel, Channel.of(canonical));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "awgn: | unknown setting '' of channel awgn; allowed are noise-estimate, gain",
                "awgn:loss=1 | unknown setting 'loss' of channel awgn; allowed are noise-estimate, gain",
                "awgn:gain | gain is '', must be a number in dB with at most six decimals",
                "awgn:gain=NaN | gain is 'nan', must be a number in dB with at most six decimals",
                "awgn:gain=1,gain=1 | gain of channel awgn is given twice",
                "awgn:noise-estimate=41 | noise-estimate is 41 dB, must be -40 to 40",
            })
    void whatIsNoMismatchIsRefused(String designator, String message) {
        assertEquals(
                message,
                assertThrows(InvalidSimulationException.class, () -> Channel.of(designator))
                        .getMessage());
    }

    /** From the definitions: 10 dB of noise estimate divide by 10, 20 dB of gain multiply by 10 (common practice). */
    @Test
    void factorIsWhatTheDecibelsSay() {
        assertEquals(1.0, Mismatch.NONE.llrFactor());
        assertEquals(0.1, new Mismatch(10_000_000, 0).llrFactor(), 1e-15);
        assertEquals(10, new Mismatch(0, 20_000_000).llrFactor(), 1e-13);
        assertEquals(1, new Mismatch(-3_000_000, -6_000_000).llrFactor(), 1e-15);
    }

    /** Doubling changes exponents alone, so minima, comparisons and the factor 6/8 come out the same, bit for bit. */
    @ParameterizedTest
    @ValueSource(doubles = {2, 0.5, 16})
    void minSumInFloatingPointDoesNotKnowTheScale(double factor) {
        DecoderChoice choice = DecoderDesignator.parse("min-sum:iterations=8,scale=6/8");
        double energy = 0.5 * Math.pow(10, 0.15);
        DecodedBatch expected = decode(choice, energy, 1);
        DecodedBatch scaled = decode(choice, energy, factor);
        assertArrayEquals(expected.bits(), scaled.bits());
        assertArrayEquals(expected.iterations(), scaled.iterations());
        assertEquals(expected.declaredFailures(), scaled.declaredFailures());
        // At 1.5 dB, 8 iterations: some frames fail, some do not, or nothing would have been tested.
        assertTrue(expected.declaredFailures() != 0 && expected.declaredFailures() != -1L);
    }

    private static DecodedBatch decode(DecoderChoice choice, double energy, double factor) {
        GaussianNoise noise = new GaussianNoise(new FrameStreams(3, 4, Stream.NOISE));
        LlrBatch received = new LlrBatch(LDPC.n());
        new GaussianLink(noise, energy, factor).carry(0, new long[LDPC.n()], received);
        Decoder decoder = choice.decoder().newDecoder(LDPC, choice.quantiser());
        DecodedBatch decoded = new DecodedBatch(LDPC.n());
        decoder.decode(received, decoded);
        return decoded;
    }

    /** A decoder of signs sees no positive factor, and neither does one whose quantiser keeps the sign alone. */
    @ParameterizedTest
    @CsvSource({
        "'golay:23,12', syndrome, 3",
        "'bch:63,45', bounded-distance, 4",
        "'ldpc-802.11n:648,1/2', 'min-sum:iterations=5,word=1,rise=mid-rise,offset=0', 3.5"
    })
    void signsDoNotKnowTheScale(String code, String decoder, double ebn0Db) {
        PointCounts exact = counts(code, decoder, ebn0Db, "awgn");
        assertTrue(exact.frameErrors() > 0, exact.toString());
        for (String channel : List.of("awgn:noise-estimate=3", "awgn:gain=-7.5", "awgn:noise-estimate=-2,gain=5")) {
            assertEquals(exact, counts(code, decoder, ebn0Db, channel), channel);
        }
    }

    /**
     * Sum-product wants true LLRs. On common noise the count must rise by more than six standard deviations of the
     * count itself, which decoders that are equally good would exceed less than once in 1e8.
     */
    @ParameterizedTest
    @ValueSource(strings = {"awgn:noise-estimate=5", "awgn:noise-estimate=-5", "awgn:gain=10", "awgn:gain=-10"})
    void sumProductGetsWorse(String channel) {
        String decoder = "sum-product:iterations=10";
        PointCounts exact = counts("ldpc-802.11n:648,1/2", decoder, 1.75, "awgn");
        PointCounts mistaken = counts("ldpc-802.11n:648,1/2", decoder, 1.75, channel);
        assertTrue(
                mistaken.frameErrors() > exact.frameErrors() + 6 * Math.sqrt(exact.frameErrors()),
                exact.frameErrors() + " became " + mistaken.frameErrors());
    }

    /** Both mistakes scale antipodal signals, the one in power and the other in amplitude. */
    @Test
    void twoDecibelsOfGainAreMinusOneOfNoiseEstimate() {
        assertEquals(
                counts("ldpc-802.11n:648,1/2", "min-sum:iterations=5,word=4", 2, "awgn:gain=2"),
                counts("ldpc-802.11n:648,1/2", "min-sum:iterations=5,word=4", 2, "awgn:noise-estimate=-1"));
    }

    private static PointCounts counts(String code, String decoder, double ebn0Db, String channel) {
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        Scheme scheme = new Scheme(
                code.equals("ldpc-802.11n:648,1/2")
                        ? LDPC
                        : Catalogue.standard().build(code),
                choice.decoder(),
                Modulation.BPSK,
                choice.quantiser(),
                Channel.of(channel));
        return new Simulator(1, new MemoryJournal()).run(scheme, Point.ofEbn0Db(ebn0Db), 1, RULE, RunControl.none());
    }
}
