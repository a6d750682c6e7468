package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Decoders that iterate, in the whole chain: iterations too are counted to the exact frame. */
class IterativeSchemeTest {
    private static final Code CODE = Catalogue.standard().build("ldpc-802.11n:648,1/2");

    @ParameterizedTest
    @ValueSource(strings = {"min-sum:iterations=10,scale=6/8,word=6", "sum-product:iterations=10"})
    void countsDependOnNeitherThreadsNorBlockSize(String decoder) {
        DecoderChoice choice = DecoderDesignator.parse(decoder);
        Scheme scheme = new Scheme(CODE, choice.decoder(), Modulation.QPSK, choice.quantiser(), new Channel.Awgn());
        StoppingRule rule = new StoppingRule(100_000, 20);
        PointCounts one = run(scheme, 1, 64, rule);
        assertEquals(one, run(scheme, 2, 192, rule));
        assertEquals(20, one.frameErrors());
        assertTrue(one.iterations() > one.frames() && one.iterations() < 10 * one.frames(), one.toString());
        assertTrue(one.bitErrors() > one.frameErrors(), one.toString());
    }

    private static PointCounts run(Scheme scheme, int threads, int block, StoppingRule rule) {
        return new Simulator(threads, new MemoryJournal(), block)
                .run(scheme, Point.ofEbn0Db(1.5), 1, rule, RunControl.none());
    }
}
