package dev.nearlimit.simulation;

/** Counts blocks in frame order and stops at the exact frame at which the stopping rule is met. Not shared by threads. */
final class PrefixCounter {
    private final StoppingRule rule;
    private long frames;
    private long frameErrors;
    private long bitErrors;
    private long bitErrorSquares;
    private long undetectedErrors;
    private long iterations;
    private final Histogram.Counter iterationsOfFrames = new Histogram.Counter();
    private final Histogram.Counter bitErrorsOfFailures = new Histogram.Counter();
    private final FailedFrames.Recorder failedFrames = new FailedFrames.Recorder();

    PrefixCounter(StoppingRule rule) {
        this.rule = rule;
    }

    /** Counts the next block, as far as the rule lets it. */
    void add(Block block) {
        int end = (int) Math.min(block.frames(), rule.maxFrames() - frames);
        int failures = block.failedBefore(end);
        long wanted = rule.frameErrors() - frameErrors;
        if (failures >= wanted) {
            failures = (int) wanted;
            end = failures == 0 ? 0 : block.failed()[failures - 1] + 1;
        }
        for (int i = 0; i < failures; i++) {
            long wrong = block.bitErrors()[i];
            bitErrors += wrong;
            bitErrorSquares += wrong * wrong;
            undetectedErrors += block.undetected()[i] ? 1 : 0;
            bitErrorsOfFailures.add(block.bitErrors()[i]);
            failedFrames.add(frames + block.failed()[i]);
        }
        for (int f = 0; f < Math.min(end, block.iterations().length); f++) {
            iterations += block.iterations()[f];
            iterationsOfFrames.add(block.iterations()[f]);
        }
        frames += end;
        frameErrors += failures;
    }

    boolean met() {
        return frames >= rule.maxFrames() || frameErrors >= rule.frameErrors();
    }

    PointCounts counts() {
        return new PointCounts(frames, frameErrors, bitErrors, bitErrorSquares, undetectedErrors, iterations, met());
    }

    PointOutcome outcome() {
        return new PointOutcome(
                counts(),
                iterationsOfFrames.toHistogram(),
                bitErrorsOfFailures.toHistogram(),
                failedFrames.toFailedFrames(frames));
    }
}
