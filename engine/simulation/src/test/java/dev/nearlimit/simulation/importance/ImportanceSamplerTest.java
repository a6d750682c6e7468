package dev.nearlimit.simulation.importance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.codes.gf2.BitMatrix;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.GaussianTail;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Channel;
import dev.nearlimit.simulation.InvalidSimulationException;
import dev.nearlimit.simulation.Point;
import dev.nearlimit.simulation.PointCounts;
import dev.nearlimit.simulation.RunControl;
import dev.nearlimit.simulation.Scheme;
import dev.nearlimit.simulation.Simulator;
import dev.nearlimit.simulation.StoppingRule;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.distribution.BinomialDistribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ImportanceSamplerTest {
    /** Two-sided 3.8e-8 for a normal mean. */
    private static final double SIGMAS = 5.5;

    private static final int EVERY_WEIGHT = Integer.MAX_VALUE;

    /**
     * Short codes with exact maximum likelihood at a FER of 1e-9: the estimate from the words of least weight against the
     * union bound over them. What the bound counts twice and what heavier words add is below the stated part of it:
     * common events of two words by a Chernoff bound, heavier words by their own union bound.
     */
    @ParameterizedTest
    @CsvSource({
        "'hamming:7,4', 10.6, 0.003",
        "'hamming:15,11', 9.8, 0.02",
        "'hamming-extended:8,4', 10.2, 0.01",
        "'golay:24,12', 8.1, 0.02",
        "'reed-muller:1,4', 9.3, 0.01",
    })
    void atLowRatesAgreesWithTheUnionBound(String designator, double ebn0Db, double slack) {
        Code code = Catalogue.standard().build(designator);
        List<ErrorSet> lightest = words(code, lightest(code));
        ImportanceSampler sampler = sampler(code, "maximum-likelihood", lightest);
        Point point = Point.ofEbn0Db(ebn0Db);
        RareErrorEstimate estimate = sampler.run(point, 1, 40_000, 2, RunControl.none());
        double bound = sampler.unionBound(point);
        assertTrue(bound > 2e-10 && bound < 5e-9, "union bound is " + bound);
        double error = Math.sqrt(estimate.variance());
        assertTrue(error < 0.03 * bound, "relative error " + error / bound);
        assertEquals(bound, estimate.frameErrorRatePart(), SIGMAS * error + slack * bound, estimate.toString());
        // The seed is fixed; of 20 seeds one is expected to miss.
        assertTrue(
                estimate.interval().low() <= bound
                        && bound * (1 - slack) <= estimate.interval().high(),
                bound + " outside of " + estimate);
        assertEquals(lightest.size(), sampler.codewords());
    }

    /**
     * With all words as sets, maximum likelihood has no other errors, so that the estimate is the FER itself: exact for
     * first-order Reed-Muller codes, which are biorthogonal signals (common practice), at any FER.
     */
    @ParameterizedTest
    @CsvSource({"2, 4", "3, 2", "3, 9", "4, 3", "4, 10", "5, 9.5"})
    void allWordsGiveTheErrorRateOfBiorthogonalSignals(int m, double ebn0Db) {
        Code code = Catalogue.standard().build("reed-muller:1," + m);
        double signal = Math.sqrt(2 * code.k() * Math.pow(10, ebn0Db / 10));
        int others = (1 << m) - 1;
        double wrongAxis = new IterativeLegendreGaussIntegrator(16, 1e-10, 1e-30)
                .integrate(
                        1_000_000,
                        x -> Math.exp(-(x - signal) * (x - signal) / 2)
                                / Math.sqrt(2 * Math.PI)
                                * -Math.expm1(others * Math.log1p(-2 * GaussianTail.q(x))),
                        1e-12,
                        signal + 12);
        double exact = wrongAxis + GaussianTail.q(signal);
        RareErrorEstimate estimate = sampler(code, "maximum-likelihood", words(code, EVERY_WEIGHT))
                .run(Point.ofEbn0Db(ebn0Db), 3, 40_000, 2, RunControl.none());
        assertEquals(
                exact, estimate.frameErrorRatePart(), SIGMAS * Math.sqrt(estimate.variance()), estimate.toString());
        assertTrue(Math.sqrt(estimate.variance()) < 0.05 * exact, estimate.toString());
    }

    /** The same against plain simulation, where that is feasible. */
    @ParameterizedTest
    @CsvSource({"'hamming:7,4', 4, 60000", "'reed-muller:1,5', 3, 60000", "'bch:15,7', 4, 60000"})
    void allWordsAgreeWithPlainSimulation(String designator, double ebn0Db, long frames) {
        Code code = Catalogue.standard().build(designator);
        PointCounts plain = plain(scheme(code, "maximum-likelihood"), ebn0Db, frames);
        RareErrorEstimate estimate = sampler(code, "maximum-likelihood", words(code, EVERY_WEIGHT))
                .run(Point.ofEbn0Db(ebn0Db), 8, 20_000, 2, RunControl.none());
        double fer = (double) plain.frameErrors() / frames;
        assertTrue(plain.frameErrors() > 100 && fer < 2e-2, plain.toString());
        double deviation = Math.sqrt(fer / frames + estimate.variance());
        assertEquals(fer, estimate.frameErrorRatePart(), SIGMAS * deviation, estimate.toString());
    }

    /** The words of least weight alone give a part of the whole, and where errors are rare most of it. */
    @ParameterizedTest
    @CsvSource({"'hamming:7,4', 5", "'golay:23,12', 3.5", "'bch:15,7', 4.5"})
    void lightestWordsGiveAPart(String designator, double ebn0Db) {
        Code code = Catalogue.standard().build(designator);
        long frames = 40_000;
        PointCounts plain = plain(scheme(code, "maximum-likelihood"), ebn0Db, frames);
        RareErrorEstimate estimate = sampler(code, "maximum-likelihood", words(code, lightest(code)))
                .run(Point.ofEbn0Db(ebn0Db), 8, 20_000, 2, RunControl.none());
        double fer = (double) plain.frameErrors() / frames;
        double deviation = Math.sqrt(fer / frames + estimate.variance());
        assertTrue(estimate.frameErrorRatePart() < fer + SIGMAS * deviation, fer + " " + estimate);
        assertTrue(estimate.frameErrorRatePart() > 0.6 * fer - SIGMAS * deviation, fer + " " + estimate);
    }

    /**
     * Without any shift the frames are those of a plain simulation, one by one, and with all words as sets every error of
     * maximum likelihood counts. Behind a coarse quantiser a few errors come of noise that leans less than half way. To
     * overlook the receiver's mistake about the gain would miss a third of them: it makes 810 errors of 499.
     */
    @ParameterizedTest
    @CsvSource({
        "'hamming:7,4', 'maximum-likelihood', 'awgn', 1",
        "'bch:15,7', 'maximum-likelihood', 'awgn:gain=3', 1",
        "'bch:15,7', 'maximum-likelihood:word=3,step=1.5', 'awgn:gain=12', 0.95"
    })
    void withoutShiftsFramesAreThoseOfPlainSimulation(String designator, String decoder, String channel, double least) {
        Code code = Catalogue.standard().build(designator);
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        Scheme scheme = new Scheme(code, choice.decoder(), Modulation.BPSK, choice.quantiser(), Channel.of(channel));
        NoiseBias bias = NoiseBias.towards(words(code, EVERY_WEIGHT));
        WeightTally tally = unshifted(scheme, bias, BiasedPoint.of(scheme, bias, Point.ofEbn0Db(2), 77), 6_400);
        PointCounts plain = plain(scheme, 2, 6_400);
        assertTrue(plain.frameErrors() > 100, plain.toString());
        assertTrue(tally.errors() <= plain.frameErrors(), tally + " of " + plain);
        assertTrue(tally.errors() >= least * plain.frameErrors(), tally + " of " + plain);
    }

    /** No shift at all is plain simulation: every weight is 1. */
    private static WeightTally unshifted(Scheme scheme, NoiseBias bias, BiasedPoint point, long frames) {
        int[] weights = bias.sets().stream().mapToInt(ErrorSet::weight).toArray();
        WeightTally tally = new BiasedRun(
                        () -> new BiasedFrameWorker(
                                scheme, bias.sets(), new BiasMixture(weights, new double[] {0}, point.sigma()), point),
                        frames,
                        RunControl.none())
                .onThreads(2);
        assertEquals(tally.errors(), tally.sum(), 1e-6 * tally.errors());
        return tally;
    }

    /** Whatever the decoder does, the weighted count estimates the probability that a plain count estimates. */
    @ParameterizedTest
    @CsvSource({
        "'hamming:7,4', 'syndrome', 5",
        "'golay:23,12', 'bounded-distance', 4",
        "'bch:15,7', 'sum-product:iterations=20', 3",
        "'hamming:15,11', 'min-sum:iterations=10,word=4', 4",
        "'reed-muller:1,4', 'maximum-likelihood:word=3,step=1.5', 3",
    })
    void biasedAndPlainCountsOfTheSameEventsAgree(String designator, String decoder, double ebn0Db) {
        Code code = Catalogue.standard().build(designator);
        Scheme scheme = scheme(code, decoder);
        NoiseBias bias = NoiseBias.towards(words(code, lightest(code)));
        BiasedPoint point = BiasedPoint.of(scheme, bias, Point.ofEbn0Db(ebn0Db), 5);
        WeightTally plain = unshifted(scheme, bias, point, 40_000);
        assertTrue(plain.errors() > 50, plain.toString());
        RareErrorEstimate estimate =
                new ImportanceSampler(scheme, bias).run(Point.ofEbn0Db(ebn0Db), 6, 20_000, 2, RunControl.none());
        double rate = (double) plain.errors() / plain.frames();
        double deviation = Math.sqrt(rate / plain.frames() + estimate.variance());
        assertEquals(rate, estimate.frameErrorRatePart(), SIGMAS * deviation, estimate.toString());
    }

    /**
     * Hard decisions: two of seven bits wrong are put down to the one word of weight 3 that has both, unless the third
     * bit holds against it. So the estimate is below the exact FER, the binomial tail beyond one error, and close to it.
     */
    @Test
    void hardDecisionErrorsAreMostlyDueToTheLightestWords() {
        Code code = Catalogue.standard().build("hamming:7,4");
        double ebn0Db = 12;
        double p = GaussianTail.q(Math.sqrt(2 * 4 / 7.0 * Math.pow(10, ebn0Db / 10)));
        double exact = 21 * p * p;
        double more = 1 - new BinomialDistribution(7, p).cumulativeProbability(1);
        assertEquals(1, more / exact, 1e-2, "leading term");
        RareErrorEstimate estimate =
                sampler(code, "syndrome", words(code, 3)).run(Point.ofEbn0Db(ebn0Db), 2, 100_000, 2, RunControl.none());
        double error = Math.sqrt(estimate.variance());
        assertTrue(estimate.frameErrorRatePart() < exact + SIGMAS * error, exact + " " + estimate);
        assertTrue(estimate.frameErrorRatePart() > 0.9 * exact - SIGMAS * error, exact + " " + estimate);
    }

    @Test
    void doesNotDependOnThreads() {
        Code code = Catalogue.standard().build("golay:23,12");
        ImportanceSampler sampler = sampler(code, "syndrome", words(code, 7));
        RareErrorEstimate one = sampler.run(Point.ofEbn0Db(6), 4, 3_000, 1, RunControl.none());
        assertEquals(one, sampler.run(Point.ofEbn0Db(6), 4, 3_000, 2, RunControl.none()));
        assertEquals(3_000, one.frames());
        assertTrue(one.complete());
    }

    @Test
    void endsEarlyWithWhatItHas() {
        Code code = Catalogue.standard().build("hamming:7,4");
        ImportanceSampler sampler = sampler(code, "syndrome", words(code, 3));
        long[] seen = {0};
        RunControl control = RunControl.none()
                .withProgress((frames, errors) -> seen[0] = frames)
                .withCancellation(() -> seen[0] >= 2_000);
        RareErrorEstimate part = sampler.run(Point.ofEbn0Db(8), 4, 1_000_000, 1, control);
        assertFalse(part.complete());
        assertEquals(seen[0], part.frames());
        RareErrorEstimate again = sampler.run(Point.ofEbn0Db(8), 4, part.frames(), 2, RunControl.none());
        assertEquals(again.frameErrorRatePart(), part.frameErrorRatePart());
        RareErrorEstimate nothing =
                sampler.run(Point.ofEbn0Db(8), 4, 1_000, 2, RunControl.none().withCancellation(() -> true));
        assertEquals(0, nothing.frames());
    }

    @Test
    void noErrorSeenIsNoRateOfZero() {
        // A repetition code decoded by majority forgives what one position alone can do.
        Code code = Catalogue.standard().build("repetition:5");
        RareErrorEstimate estimate = new ImportanceSampler(
                        scheme(code, "syndrome"), new NoiseBias(List.of(ErrorSet.of(0)), List.of(1.0)))
                .run(Point.ofEbn0Db(14), 1, 1_000, 1, RunControl.none());
        assertEquals(0, estimate.errors());
        assertEquals(0, estimate.interval().low());
        assertTrue(estimate.interval().high() > 0);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -1, 2.5, Double.NaN})
    void refusesShiftsOutOfRange(double shift) {
        assertThrows(
                InvalidSimulationException.class, () -> new NoiseBias(List.of(ErrorSet.of(1)), List.of(0.5, shift)));
    }

    @Test
    void refusesWhatCannotBe() {
        Code code = Catalogue.standard().build("hamming:7,4");
        List<ErrorSet> sets = words(code, 3);
        assertEquals("a set of positions is empty, needs at least one", message(() -> ErrorSet.of()));
        assertEquals("position 4 is twice in a set", message(() -> ErrorSet.of(4, 2, 4)));
        assertEquals("position is -1, must be at least 0", message(() -> ErrorSet.of(3, -1)));
        assertEquals(
                "set [1, 2] is given twice",
                message(() -> NoiseBias.towards(List.of(ErrorSet.of(1, 2), ErrorSet.of(2, 1)))));
        assertEquals("number of sets is 0, must be 1 to 65536", message(() -> NoiseBias.towards(List.of())));
        assertEquals(
                "shifts are [1.5], at least one must be 1 or less: errors half way to a set would get weights without"
                        + " bound",
                message(() -> new NoiseBias(sets, List.of(1.5))));
        assertEquals(
                "position 7 is in a set, the code's positions are 0 to 6",
                message(() -> sampler(code, "syndrome", List.of(ErrorSet.of(2, 7)))));
        ImportanceSampler sampler = sampler(code, "syndrome", sets);
        assertEquals(
                "frames is 0, must be at least 1",
                message(() -> sampler.run(Point.ofEbn0Db(1), 1, 0, 1, RunControl.none())));
        assertEquals(
                "at Eb/N0 30.0 dB sets of weight 3 cause errors at rates below 1e-130; importance sampling ends there",
                message(() -> sampler.run(Point.ofEbn0Db(30), 1, 10, 1, RunControl.none())));
        Scheme hard = new Scheme(
                code,
                DecoderDesignator.parse("syndrome").decoder(),
                Modulation.BPSK,
                DecoderDesignator.parse("syndrome").quantiser(),
                Channel.of("bsc"));
        assertEquals(
                "channel is bsc, importance sampling is for awgn (on which hard-decision decoders see signs alone)",
                message(() -> new ImportanceSampler(hard, NoiseBias.towards(sets))));
        Code large = Catalogue.standard().build("bch:127,64");
        ImportanceSampler misfit = sampler(large, "maximum-likelihood", List.of(ErrorSet.of(0)));
        assertThrows(InvalidDecoderException.class, () -> misfit.run(Point.ofEbn0Db(1), 1, 10, 2, RunControl.none()));
    }

    private static String message(org.junit.jupiter.api.function.Executable refused) {
        return assertThrows(InvalidSimulationException.class, refused).getMessage();
    }

    private static PointCounts plain(Scheme scheme, double ebn0Db, long frames) {
        return new Simulator(2, new MemoryJournal())
                .run(scheme, Point.ofEbn0Db(ebn0Db), 77, new StoppingRule(frames, Long.MAX_VALUE), RunControl.none());
    }

    private static ImportanceSampler sampler(Code code, String decoder, List<ErrorSet> sets) {
        return new ImportanceSampler(scheme(code, decoder), NoiseBias.towards(sets));
    }

    private static Scheme scheme(Code code, String decoder) {
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        return new Scheme(code, choice.decoder(), Modulation.BPSK, choice.quantiser(), new Channel.Awgn());
    }

    private static int lightest(Code code) {
        return words(code, EVERY_WEIGHT).stream()
                .mapToInt(ErrorSet::weight)
                .min()
                .orElseThrow();
    }

    /** The ones of every word up to a weight, by trying all messages. */
    private static List<ErrorSet> words(Code code, int heaviest) {
        BitMatrix generator = code.generator();
        List<ErrorSet> words = new ArrayList<>();
        for (int message = 1; message < 1 << code.k(); message++) {
            BitMatrix word = new BitMatrix(1, code.n());
            long[] sum = new long[word.wordsPerRow()];
            for (int i = 0; i < code.k(); i++) {
                if ((message >> i & 1) != 0) {
                    generator.xorRowInto(i, sum);
                }
            }
            int[] ones = java.util.stream.IntStream.range(0, code.n())
                    .filter(i -> (sum[i >> 6] >>> (i & 63) & 1) != 0)
                    .toArray();
            if (ones.length <= heaviest) {
                words.add(ErrorSet.of(ones));
            }
        }
        return words;
    }
}
