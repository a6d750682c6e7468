package dev.nearlimit.simulation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class PrefixCounterTest {
    static long[] seeds() {
        long[] seeds = new long[60];
        Arrays.setAll(seeds, i -> i);
        return seeds;
    }

    /** Against a walk over single frames that asks after each whether the rule is met. */
    @ParameterizedTest
    @MethodSource("seeds")
    void stopsAtTheExactFrame(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        List<Block> blocks = new ArrayList<>();
        for (int b = 0; b < 4; b++) {
            blocks.add(Blocks.random(random, 64));
        }
        StoppingRule rule = new StoppingRule(1 + random.nextInt(300), 1 + random.nextInt(80));
        PrefixCounter counter = new PrefixCounter(rule);
        for (Block block : blocks) {
            if (!counter.met()) {
                counter.add(block);
            }
        }
        assertEquals(walk(blocks, rule), counter.outcome(), "seed " + seed);
        assertEquals(counter.outcome().counts(), counter.counts(), "seed " + seed);
    }

    private static PointOutcome walk(List<Block> blocks, StoppingRule rule) {
        long[] iterationsOfFrames = new long[1000];
        long[] bitErrorsOfFailures = new long[1000];
        List<Long> failures = new ArrayList<>();
        PointCounts counts = walk(blocks, rule, iterationsOfFrames, bitErrorsOfFailures, failures);
        return new PointOutcome(
                counts,
                Histogram.of(iterationsOfFrames),
                Histogram.of(bitErrorsOfFailures),
                FailedFrames.of(
                        counts.frames(),
                        failures.stream().mapToLong(Long::longValue).toArray()));
    }

    private static PointCounts walk(
            List<Block> blocks,
            StoppingRule rule,
            long[] iterationsOfFrames,
            long[] bitErrorsOfFailures,
            List<Long> failures) {
        long frames = 0;
        long errors = 0;
        long bits = 0;
        long squares = 0;
        long undetected = 0;
        long iterations = 0;
        for (Block block : blocks) {
            for (int f = 0; f < 64; f++) {
                if (frames == rule.maxFrames() || errors == rule.frameErrors()) {
                    return new PointCounts(frames, errors, bits, squares, undetected, iterations, true);
                }
                frames++;
                if (block.iterations().length > 0) {
                    iterations += block.iterations()[f];
                    iterationsOfFrames[block.iterations()[f]]++;
                }
                for (int i = 0; i < block.failed().length; i++) {
                    if (block.failed()[i] == f) {
                        errors++;
                        bits += block.bitErrors()[i];
                        squares += (long) block.bitErrors()[i] * block.bitErrors()[i];
                        undetected += block.undetected()[i] ? 1 : 0;
                        bitErrorsOfFailures[block.bitErrors()[i]]++;
                        failures.add(frames - 1);
                    }
                }
            }
        }
        boolean met = frames == rule.maxFrames() || errors == rule.frameErrors();
        return new PointCounts(frames, errors, bits, squares, undetected, iterations, met);
    }
}
