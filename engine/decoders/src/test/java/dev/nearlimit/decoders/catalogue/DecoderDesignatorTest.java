package dev.nearlimit.decoders.catalogue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.Decoder;
import dev.nearlimit.decoders.DecoderFamily;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.decoders.InvalidDecoderException;
import dev.nearlimit.decoders.RandomBatches;
import dev.nearlimit.decoders.batch.DecodedBatch;
import dev.nearlimit.decoders.batch.LlrBatch;
import dev.nearlimit.decoders.ldpc.Iterations;
import dev.nearlimit.decoders.ldpc.MagnitudeCorrection;
import dev.nearlimit.decoders.ldpc.MinSumSettings;
import dev.nearlimit.decoders.quantiser.NoQuantiser;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DecoderDesignatorTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "syndrome | syndrome",
                "bounded-distance | bounded-distance",
                "Maximum-Likelihood | maximum-likelihood",
                "maximum-likelihood:word=3 | maximum-likelihood:word=3,step=2,rise=mid-tread",
                "sum-product | sum-product:iterations=20,schedule=layered,early-stop=true",
                "sum-product:iterations=50 | sum-product:iterations=50,schedule=layered,early-stop=true",
                "sum-product: schedule=flooding, early-stop=false |"
                        + " sum-product:iterations=20,schedule=flooding,early-stop=false",
                "min-sum | min-sum:iterations=20,schedule=layered,early-stop=true,scale=6/8",
                "min-sum:offset=0.5 | min-sum:iterations=20,schedule=layered,early-stop=true,offset=0.5",
                "min-sum:iterations=20,scale=6/8,word=6 |"
                        + " min-sum:iterations=20,schedule=layered,early-stop=true,scale=6/8,message-word=6,"
                        + "posterior-word=8,word=6,step=0.25,rise=mid-tread",
                "min-sum:word=4,message-word=5,posterior-word=9,clip=7,offset=1 |"
                        + " min-sum:iterations=20,schedule=layered,early-stop=true,offset=1,message-word=5,"
                        + "posterior-word=9,word=4,step=1,rise=mid-tread",
                "min-sum:word=3,rise=mid-rise |"
                        + " min-sum:iterations=20,schedule=layered,early-stop=true,offset=1,message-word=4,"
                        + "posterior-word=6,word=3,step=2,rise=mid-rise"
            })
    void defaultsAreSpelledOutAndReadBack(String given, String expected) {
        DecoderChoice choice = DecoderDesignator.parse(given);
        assertEquals(expected, choice.designator());
        DecoderChoice again = DecoderDesignator.parse(choice.designator());
        assertEquals(choice, again);
        assertEquals(1, choice.decoder().revision());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "viterbi | unknown decoder 'viterbi'; known are syndrome, bounded-distance, maximum-likelihood,"
                        + " sum-product, min-sum",
                "'' | unknown decoder ''; known are syndrome, bounded-distance, maximum-likelihood,"
                        + " sum-product, min-sum",
                "syndrome:iterations=3 | unknown setting 'iterations' of syndrome, which takes none",
                "bounded-distance:word=3 | unknown setting 'word' of bounded-distance, which takes none",
                "sum-product:scale=6/8 | unknown setting 'scale' of sum-product; allowed are iterations, schedule,"
                        + " early-stop, word, step, clip, rise",
                "min-sum:iterations=0 | iterations of min-sum is 0, must be a whole number 1..1000",
                "min-sum:iterations=ten | iterations of min-sum is ten, must be a whole number 1..1000",
                "min-sum:iterations=5,iterations=6 | setting 'iterations' of min-sum is given twice",
                "min-sum:iterations | setting 'iterations' of min-sum must have the form key=value",
                "min-sum:,word=4 | setting '' of min-sum must have the form key=value",
                "min-sum:scale=0.75 | scale of min-sum is 0.75, must be 1/8 .. 8/8",
                "min-sum:scale=9/8 | scale of min-sum is 9/8, must be 1/8 .. 8/8",
                "min-sum:scale=6/8,offset=1 | scale and offset of min-sum exclude each other",
                "min-sum:offset=-1 | offset of min-sum is -1, must be a number 0..100",
                "min-sum:offset=NaN | offset of min-sum is nan, must be a number 0..100",
                "min-sum:word=4,offset=0.5 | offset of min-sum is 0.5, must be a whole number of levels in fixed point"
                        + " (word=)",
                "min-sum:clip=4,step=1,word=4 | clip and step of min-sum exclude each other",
                "min-sum:word=9 | word of min-sum is 9, must be a whole number 1..8",
                "min-sum:word=1 | word of a mid-tread quantiser is 1 bits, must be 2..8",
                "min-sum:word=8,rise=mid-rise | word of a mid-rise quantiser is 8 bits, must be 1..7",
                "min-sum:step=0.5 | step needs word=, the bits of the quantised LLR, beside it",
                "min-sum:word=4,step=0 | step of min-sum is 0, must be a number above 0 and at most 10000",
                "min-sum:message-word=6 | message-word of min-sum needs word=, the bits of the quantised LLR, beside it",
                "min-sum:word=6,message-word=1 | message-word of min-sum is 1, must be a whole number 2..8",
                "min-sum:word=6,message-word=4,posterior-word=5 | posterior-word of min-sum is 5, must be a whole"
                        + " number 6..15",
                "min-sum:early-stop=maybe | early-stop of min-sum is maybe, must be true or false",
                "min-sum:schedule=zigzag | schedule of min-sum is zigzag, must be layered or flooding",
                "min-sum:word=4,rise=flat | rise of min-sum is flat, must be mid-tread or mid-rise"
            })
    void wrongDesignatorsAreRefusedInOneLine(String designator, String message) {
        InvalidDecoderException refused =
                assertThrows(InvalidDecoderException.class, () -> DecoderDesignator.parse(designator));
        assertEquals(message, refused.getMessage());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "bch:127,64 | bounded-distance sum-product min-sum",
                "hamming:7,4 | syndrome bounded-distance maximum-likelihood sum-product min-sum",
                "ldpc-802.11n:648,1/2 | sum-product min-sum",
                "repetition:31 | maximum-likelihood sum-product min-sum"
            })
    void theCatalogueKnowsWhichDecodersFit(String code, String names) {
        assertEquals(
                names,
                DecoderCatalogue.standard().fitting(Catalogue.standard().build(code)).stream()
                        .map(DecoderFamily::name)
                        .collect(Collectors.joining(" ")));
    }

    /** What a family says about a code is what its decoders do. */
    @Test
    void familiesThatObjectRefuse() {
        for (String designator : new String[] {"ldpc-802.11n:648,1/2", "bch:31,16", "repetition:31"}) {
            Code code = Catalogue.standard().build(designator);
            for (DecoderFamily family : DecoderCatalogue.standard().families()) {
                DecoderSettings settings =
                        DecoderDesignator.parse(family.name()).decoder();
                if (family.fits(code)) {
                    DecodedBatch decoded = new DecodedBatch(code.n());
                    Arrays.fill(decoded.iterations(), -1);
                    decoded.setDeclaredFailures(-1L);
                    Decoder decoder = settings.newDecoder(code, new NoQuantiser());
                    decoder.decode(new LlrBatch(code.n()), decoded);
                    assertEquals(0, decoded.declaredFailures(), family.name());
                    assertTrue(Arrays.stream(decoded.iterations()).allMatch(i -> i == 0), family.name());
                    assertTrue(settings.operationsPerFrame(code, 1).total() > 0);
                } else {
                    InvalidDecoderException refused = assertThrows(
                            InvalidDecoderException.class, () -> settings.newDecoder(code, new NoQuantiser()));
                    assertEquals(
                            family.name() + " does not fit " + designator + ": "
                                    + family.objection(code).orElseThrow(),
                            refused.getMessage());
                    assertFalse(refused.getMessage().contains("\n"));
                }
            }
        }
    }

    @Test
    void fixedPointNeedsAQuantiserThatItCanHold() {
        Code code = Catalogue.standard().build("hamming:7,4");
        DecoderSettings fixedPoint = DecoderDesignator.parse("min-sum:word=4,posterior-word=4,message-word=4")
                .decoder();
        assertEquals(
                "min-sum in fixed point needs a quantiser before it, found none",
                assertThrows(InvalidDecoderException.class, () -> fixedPoint.newDecoder(code, new NoQuantiser()))
                        .getMessage());
        assertEquals(
                "posterior-word of min-sum is 4 bits, too short for levels up to 31 of the quantiser",
                assertThrows(
                                InvalidDecoderException.class,
                                () -> fixedPoint.newDecoder(
                                        code,
                                        DecoderDesignator.parse("min-sum:word=6")
                                                .quantiser()))
                        .getMessage());
    }

    /**
     * By hand for the (7,4) Hamming code, 3 rows of weight 4: an iteration of normalised min-sum takes 12 edges of 4
     * additions and 4 comparisons and 6 corrections; 2 iterations take 3 syndromes of 9 additions.
     */
    @Test
    void operationsAreCountedByTheStatedRule() {
        Code code = Catalogue.standard().build("hamming:7,4");
        MinSumSettings minSum =
                new MinSumSettings(Iterations.atMost(9), new MagnitudeCorrection.Scale(6), Optional.empty());
        assertEquals(2 * (48 + 6) + 3 * 9, minSum.operationsPerFrame(code, 2).additions());
        assertEquals(2 * 48, minSum.operationsPerFrame(code, 2).comparisons());
        DecoderSettings sumProduct = DecoderDesignator.parse("sum-product").decoder();
        // 3 rows of 3 * 2 box-plus operations of 5 additions, 3 comparisons and 2 look-ups.
        assertEquals(
                2 * (24 + 90) + 3 * 9, sumProduct.operationsPerFrame(code, 2).additions());
        assertEquals(2 * (12 + 54), sumProduct.operationsPerFrame(code, 2).comparisons());
        assertEquals(2 * 36, sumProduct.operationsPerFrame(code, 2).lookups());
        DecoderSettings syndrome = DecoderDesignator.parse("syndrome").decoder();
        assertEquals(9 + 7, syndrome.operationsPerFrame(code, 0).additions());
    }

    /**
     * What a call allocates is measured by the JVM itself; 100 calls may not add up to one object a call. The decoders on
     * vector kernels have a test of their own, since vectors are objects until the JIT has been there.
     */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hamming:15,11 | syndrome",
                "hamming:15,11 | bounded-distance",
                "bch:15,5 | bounded-distance",
                "bch:15,5 | maximum-likelihood"
            })
    void aCallAllocatesNothing(String designator, String decoderDesignator) {
        Code code = Catalogue.standard().build(designator);
        DecoderChoice choice = DecoderDesignator.parse(decoderDesignator);
        Decoder decoder = choice.decoder().newDecoder(code, choice.quantiser());
        LlrBatch received = RandomBatches.noisy(code, new Random(1), 0.8, new long[code.n()]);
        choice.quantiser().apply(received);
        DecodedBatch decoded = new DecodedBatch(code.n());
        decoder.decode(received, decoded);
        ThreadMXBean thread = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long before = thread.getThreadAllocatedBytes(Thread.currentThread().getId());
        for (int i = 0; i < 100; i++) {
            decoder.decode(received, decoded);
        }
        long allocated = thread.getThreadAllocatedBytes(Thread.currentThread().getId()) - before;
        assertTrue(allocated < 100 * 16, "100 calls allocated " + allocated + " bytes");
    }
}
