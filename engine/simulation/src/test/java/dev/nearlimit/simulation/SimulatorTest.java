package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.DecoderSettings;
import dev.nearlimit.journal.ContentHash;
import dev.nearlimit.journal.Journal;
import dev.nearlimit.journal.MemoryJournal;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.simulation.Uncoded.Unquantised;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the simulator promises whatever the scheme: counts that depend on nothing but the job. */
class SimulatorTest {
    private static final Point POINT = Point.ofEbn0Db(3);
    private static final Scheme SCHEME = Uncoded.scheme(24, "awgn", true);
    /** At 20 dB the probability of a bit error is 2e-88. */
    private static final Scheme NEVER_FAILS = Uncoded.scheme(24, "awgn", false);

    @ParameterizedTest
    @CsvSource({"1000000, 1", "1000000, 100", "777, 100000", "1, 1", "64, 1000", "20000, 9999"})
    void countsDependOnNeitherThreadsNorBlockSize(long frames, long errors) {
        StoppingRule rule = new StoppingRule(frames, errors);
        PointCounts expected = run(1, 64, rule);
        assertTrue(expected.complete());
        for (int threads : new int[] {1, 2, 5}) {
            for (int block : new int[] {0, 64, 192, 4096}) {
                assertEquals(expected, run(threads, block, rule), threads + " threads, blocks of " + block);
            }
        }
    }

    private static PointCounts run(int threads, int block, StoppingRule rule) {
        return new Simulator(threads, new MemoryJournal(), block).run(SCHEME, POINT, 1, rule, RunControl.none());
    }

    @Test
    void everyKindOfCountIsExercised() {
        PointCounts counts = run(1, 64, new StoppingRule(10_000, 1_000_000));
        assertEquals(10_000, counts.frames());
        assertTrue(counts.undetectedErrors() > 0 && counts.undetectedErrors() < counts.frameErrors());
        assertTrue(counts.bitErrorSquares() > counts.bitErrors());
        // First two bits are random: 3 + 1/2 + 2/2 iterations on average; standard deviation of the mean 0.011.
        assertEquals(4.5, counts.iterations() / 10_000.0, 0.062);
    }

    @Test
    void aTighterRuleGoesOnFromWhatIsThere() {
        Journal journal = new MemoryJournal();
        StoppingRule loose = new StoppingRule(640, 1_000_000);
        StoppingRule tight = new StoppingRule(6400, 1_000_000);
        Simulator first = new Simulator(1, journal, 64);
        PointCounts early = first.run(SCHEME, POINT, 1, loose, RunControl.none());
        assertEquals(10, first.blocks().computed());
        assertEquals(early, first.run(SCHEME, POINT, 1, loose, RunControl.none()));
        assertEquals(10, first.blocks().computed());

        Simulator second = new Simulator(2, journal, 64);
        PointCounts late = second.run(SCHEME, POINT, 1, tight, RunControl.none());
        assertEquals(90, second.blocks().computed());
        assertEquals(new Simulator(1, new MemoryJournal()).run(SCHEME, POINT, 1, tight, RunControl.none()), late);
    }

    @Test
    void aStoppedRunIsResumed() {
        Journal journal = new MemoryJournal();
        StoppingRule rule = new StoppingRule(6400, 1_000_000);
        AtomicLong asked = new AtomicLong();
        Simulator simulator = new Simulator(1, journal, 64);
        PointCounts part = simulator.run(
                SCHEME, POINT, 1, rule, RunControl.none().withCancellation(() -> asked.incrementAndGet() > 41));
        assertFalse(part.complete());
        assertTrue(part.frames() > 0 && part.frames() < 6400 && part.frames() % 64 == 0, part.toString());
        assertEquals(
                new Simulator(1, new MemoryJournal())
                        .run(SCHEME, POINT, 1, new StoppingRule(part.frames(), 1_000_000), RunControl.none())
                        .frameErrors(),
                part.frameErrors());
        PointCounts whole = simulator.run(SCHEME, POINT, 1, rule, RunControl.none());
        assertEquals(100, simulator.blocks().computed());
        assertEquals(new Simulator(2, new MemoryJournal()).run(SCHEME, POINT, 1, rule, RunControl.none()), whole);
    }

    @Test
    void aTimeLimitEndsTheRun() {
        PointCounts counts = new Simulator(2, new MemoryJournal())
                .run(
                        NEVER_FAILS,
                        Point.ofEbn0Db(20),
                        1,
                        new StoppingRule(Long.MAX_VALUE, 1),
                        RunControl.none().withTimeLimit(Duration.ofMillis(50)));
        assertFalse(counts.complete());
        assertEquals(0, counts.frameErrors());
    }

    @Test
    void anInterruptEndsTheRunAndIsPassedOn() {
        Thread.currentThread().interrupt();
        PointCounts counts = new Simulator(2, new MemoryJournal(), 64)
                .run(NEVER_FAILS, Point.ofEbn0Db(20), 1, new StoppingRule(Long.MAX_VALUE, 1), RunControl.none());
        assertTrue(Thread.interrupted());
        assertFalse(counts.complete());
    }

    @Test
    void progressComesInFrameOrder() {
        List<Long> seen = new ArrayList<>();
        PointCounts counts = new Simulator(3, new MemoryJournal(), 64)
                .run(
                        SCHEME,
                        POINT,
                        1,
                        new StoppingRule(5000, 1_000_000),
                        RunControl.none().withProgress((frames, errors) -> seen.add(frames)));
        for (int i = 1; i < seen.size(); i++) {
            assertTrue(seen.get(i) > seen.get(i - 1));
        }
        assertEquals(counts.frames(), seen.get(seen.size() - 1));
    }

    /** Each of the things that fix a frame must change the outcome; each that does not must leave it. */
    @Test
    void seedPointAndChannelMatterModulationDoesNot() {
        StoppingRule rule = new StoppingRule(20_000, 1_000_000);
        Simulator simulator = new Simulator(1, new MemoryJournal());
        PointCounts base = simulator.run(SCHEME, POINT, 1, rule, RunControl.none());
        assertNotEquals(base, simulator.run(SCHEME, POINT, 2, rule, RunControl.none()));
        assertNotEquals(base, simulator.run(SCHEME, Point.ofEbn0Db(3.000001), 1, rule, RunControl.none()));
        Scheme qpsk =
                new Scheme(SCHEME.code(), SCHEME.decoder(), Modulation.QPSK, SCHEME.quantiser(), SCHEME.channel());
        assertEquals(base, simulator.run(qpsk, POINT, 1, rule, RunControl.none()));
        // The same noise, of which this decoder reads the signs only.
        Scheme hard = new Scheme(
                SCHEME.code(), SCHEME.decoder(), Modulation.BPSK, SCHEME.quantiser(), new Channel.HardDecisionAwgn());
        assertEquals(base, simulator.run(hard, POINT, 1, rule, RunControl.none()));
    }

    /** A decoder of another revision never finds the blocks of the old one. */
    @Test
    void revisionIsPartOfTheKey() {
        Journal journal = new MemoryJournal();
        StoppingRule rule = new StoppingRule(64, 1_000_000);
        Simulator simulator = new Simulator(1, journal, 64);
        simulator.run(SCHEME, POINT, 1, rule, RunControl.none());
        DecoderSettings revised = new Revised((Uncoded) SCHEME.decoder());
        simulator.run(
                new Scheme(SCHEME.code(), revised, Modulation.BPSK, new Unquantised(), SCHEME.channel()),
                POINT,
                1,
                rule,
                RunControl.none());
        assertEquals(2, simulator.blocks().computed());
    }

    @Test
    void whatAWorkerThrowsReachesTheCaller() {
        IllegalStateException broken = new IllegalStateException("journal is full");
        Journal journal = new Journal() {
            @Override
            public Optional<byte[]> find(ContentHash job, long piece) {
                return Optional.empty();
            }

            @Override
            public void keep(ContentHash job, long piece, byte[] content) {
                throw broken;
            }
        };
        Simulator simulator = new Simulator(2, journal, 64);
        assertSame(
                broken,
                assertThrows(
                        IllegalStateException.class,
                        () -> simulator.run(SCHEME, POINT, 1, new StoppingRule(1000, 10), RunControl.none())));
    }

    @Test
    void badRequestsAreRefusedInOneLine() {
        StoppingRule rule = new StoppingRule(1, 1);
        Simulator simulator = new Simulator(1, new MemoryJournal());
        refused(
                "channel awgn needs an Eb/N0, the point has none",
                () -> simulator.run(SCHEME, Point.ofFixedParameter(), 1, rule, RunControl.none()));
        refused(
                "channel bsc:0.01 has a fixed parameter, Eb/N0 3.0 dB means nothing to it",
                () -> simulator.run(Uncoded.scheme(8, "bsc:0.01", false), POINT, 1, rule, RunControl.none()));
        refused("Eb/N0 is NaN dB, must be a number from -100 to 100", () -> Point.ofEbn0Db(Double.NaN));
        refused("Eb/N0 is 101.0 dB, must be a number from -100 to 100", () -> Point.ofEbn0Db(101));
        refused("threads is 0, must be at least 1", () -> new Simulator(0, new MemoryJournal()));
        refused("frames per block is 100, must be a multiple of 64", () -> new Simulator(1, new MemoryJournal(), 100));
        refused("frames is 0, must be at least 1", () -> new StoppingRule(0, 1));
        refused("frame errors is 0, must be at least 1", () -> new StoppingRule(1, 0));
    }

    private static void refused(String message, Runnable request) {
        assertEquals(
                message,
                assertThrows(InvalidSimulationException.class, request::run).getMessage());
    }

    private record Revised(Uncoded decoder) implements DecoderSettings {
        @Override
        public String family() {
            return decoder.family();
        }

        @Override
        public String designator() {
            return decoder.designator();
        }

        @Override
        public int revision() {
            return 2;
        }

        @Override
        public boolean hardDecision() {
            return true;
        }

        @Override
        public dev.nearlimit.decoders.Decoder newDecoder(Code code, dev.nearlimit.decoders.Quantiser quantiser) {
            return decoder.newDecoder(code, quantiser);
        }

        @Override
        public dev.nearlimit.decoders.OperationCount operationsPerFrame(Code code, double iterations) {
            return decoder.operationsPerFrame(code, iterations);
        }

        @Override
        public int maxIterations() {
            return decoder.maxIterations();
        }
    }
}
