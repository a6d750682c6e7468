package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.GaussianTail;
import dev.nearlimit.limits.Modulation;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The whole chain against frame error rates that are known exactly. Every count is binomial. */
class ExactErrorRateTest {
    /** Two-sided 3.8e-8 for a normal count; expected counts are held above 200, where that is right within a factor. */
    private static final double SIGMAS = 5.5;

    /** A t-error-correcting bounded-distance decoder succeeds exactly when at most t of n bits are wrong. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "hamming:7,4; syndrome; 1; 3; 20000",
                "hamming:15,11; bounded-distance; 1; 5; 40000",
                "hamming:31,26; bounded-distance; 1; 6; 100000",
                "golay:23,12; syndrome; 3; 3; 20000",
                "golay:23,12; bounded-distance; 3; 4; 40000",
                "golay:24,12; bounded-distance; 3; 3; 20000",
                "bch:15,7; bounded-distance; 2; 3; 20000",
                "bch:31,16; bounded-distance; 3; 4; 30000",
                "bch:63,45; bounded-distance; 3; 4.5; 30000",
                "bch:127,64; bounded-distance; 10; 4; 20000",
                "bch-extended:128,64; bounded-distance; 10; 4; 20000",
                "bch:63,45+shorten=13; bounded-distance; 3; 4.5; 30000"
            })
    void boundedDistanceDecodingFailsBeyondT(String row) {
        String[] cell = row.split("; *");
        Code code = Catalogue.standard().build(cell[0]);
        int t = Integer.parseInt(cell[2]);
        double ebn0Db = Double.parseDouble(cell[3]);
        double p = crossover(code, ebn0Db);
        double fer = 1 - new BinomialDistribution(code.n(), p).cumulativeProbability(t);
        check(code, cell[1], "bsc", ebn0Db, fer, Long.parseLong(cell[4]));
    }

    /**
     * Complete decoding succeeds exactly on the coset leaders. Two-error-correcting primitive BCH codes are quasi-perfect
     * (Gorenstein, Peterson, Zierler 1960): all other leaders have weight 3.
     */
    @ParameterizedTest
    @CsvSource({"'bch:15,7', 2, 20000", "'bch:31,21', 4, 30000", "'bch:63,51', 5, 50000"})
    void completeDecodingFailsOffTheCosetLeaders(String designator, double ebn0Db, long frames) {
        Code code = Catalogue.standard().build(designator);
        int n = code.n();
        double p = crossover(code, ebn0Db);
        double third = (1 << (n - code.k())) - 1 - n - n * (n - 1) / 2.0;
        double success = Math.pow(1 - p, n)
                + n * p * Math.pow(1 - p, n - 1)
                + n * (n - 1) / 2.0 * p * p * Math.pow(1 - p, n - 2)
                + third * p * p * p * Math.pow(1 - p, n - 3);
        PointCounts counts = check(code, "syndrome", "bsc", ebn0Db, 1 - success, frames);
        assertEquals(counts.frameErrors(), counts.undetectedErrors(), "a complete decoder never declares failure");
    }

    /** The same at a crossover probability that the channel itself fixes. */
    @ParameterizedTest
    @CsvSource({"'hamming:7,4', 1, 0.05", "'golay:23,12', 3, 0.08"})
    void fixedCrossover(String designator, int t, double p) {
        Code code = Catalogue.standard().build(designator);
        double fer = 1 - new BinomialDistribution(code.n(), p).cumulativeProbability(t);
        check(scheme(code, "syndrome", "bsc:" + p), Point.ofFixedParameter(), fer, 30_000);
    }

    /** A repetition code with soft decisions gains nothing: FER = Q(sqrt(2 Eb/N0)) whatever its length. */
    @ParameterizedTest
    @CsvSource({"repetition:2, 2", "repetition:3, 0", "repetition:5, 3", "repetition:16, 4"})
    void softRepetitionIsUncoded(String designator, double ebn0Db) {
        Code code = Catalogue.standard().build(designator);
        double fer = GaussianTail.q(Math.sqrt(2 * Math.pow(10, ebn0Db / 10)));
        check(code, "maximum-likelihood", "awgn", ebn0Db, fer, 100_000);
    }

    /**
     * First-order Reed-Muller codes are biorthogonal signals of M = 2^(m+1) words, whose maximum-likelihood word error
     * rate is the integral over x > 0 of phi(x - sqrt(2 k Eb/N0)) [1 - (1 - 2 Q(x))^(M/2-1)], plus Q(sqrt(2 k Eb/N0))
     * (common practice; textbooks on digital communication derive it under biorthogonal signalling).
     */
    @ParameterizedTest
    @CsvSource({"1, 2, 1", "1, 3, 0", "1, 3, 3", "1, 4, 2", "1, 5, 3"})
    void softReedMullerOfFirstOrderIsBiorthogonal(int order, int m, double ebn0Db) {
        Code code = Catalogue.standard().build("reed-muller:" + order + "," + m);
        double signal = Math.sqrt(2 * code.k() * Math.pow(10, ebn0Db / 10));
        int others = (1 << m) - 1;
        double wrongAxis = new IterativeLegendreGaussIntegrator(16, 1e-12, 1e-14)
                .integrate(
                        1_000_000,
                        x -> Math.exp(-(x - signal) * (x - signal) / 2)
                                / Math.sqrt(2 * Math.PI)
                                * -Math.expm1(others * Math.log1p(-2 * GaussianTail.q(x))),
                        1e-12,
                        signal + 12);
        check(code, "maximum-likelihood", "awgn", ebn0Db, wrongAxis + GaussianTail.q(signal), 100_000);
    }

    /** (8,4) extended Hamming is equivalent to the first-order Reed-Muller code of length 8: same rate, another matrix. */
    @ParameterizedTest
    @CsvSource({"QPSK", "BPSK"})
    void equivalentCodesFailEquallyOften(Modulation modulation) {
        DecoderChoice choice = DecoderDesignator.parse("maximum-likelihood");
        PointCounts[] counts = new PointCounts[2];
        String[] designators = {"hamming-extended:8,4", "reed-muller:1,3"};
        for (int i = 0; i < 2; i++) {
            Scheme scheme = new Scheme(
                    Catalogue.standard().build(designators[i]),
                    choice.decoder(),
                    modulation,
                    choice.quantiser(),
                    new Channel.Awgn());
            counts[i] = new Simulator(2, new MemoryJournal())
                    .run(scheme, Point.ofEbn0Db(2), 4 + i, new StoppingRule(100_000, 1_000_000), RunControl.none());
        }
        double sum = counts[0].frameErrors() + counts[1].frameErrors();
        assertEquals(counts[0].frameErrors(), counts[1].frameErrors(), SIGMAS * Math.sqrt(sum));
    }

    private static PointCounts check(
            Code code, String decoder, String channel, double ebn0Db, double fer, long frames) {
        return check(scheme(code, decoder, channel), Point.ofEbn0Db(ebn0Db), fer, frames);
    }

    private static PointCounts check(Scheme scheme, Point point, double fer, long frames) {
        PointCounts counts = new Simulator(2, new MemoryJournal())
                .run(scheme, point, 1, new StoppingRule(frames, Long.MAX_VALUE), RunControl.none());
        assertTrue(fer * frames > 200, "only " + fer * frames + " frame errors expected");
        assertEquals(
                fer * frames,
                counts.frameErrors(),
                SIGMAS * Math.sqrt(frames * fer * (1 - fer)),
                scheme.code().designator());
        return counts;
    }

    private static Scheme scheme(Code code, String decoder, String channel) {
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        return new Scheme(code, choice.decoder(), Modulation.BPSK, choice.quantiser(), Channel.of(channel));
    }

    private static double crossover(Code code, double ebn0Db) {
        return GaussianTail.q(Math.sqrt(2 * code.rate().value() * Math.pow(10, ebn0Db / 10)));
    }
}
