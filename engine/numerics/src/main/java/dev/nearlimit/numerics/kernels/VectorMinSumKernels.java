package dev.nearlimit.numerics.kernels;

/** Layered min-sum with the Vector API. */
final class VectorMinSumKernels implements LayeredMinSumKernels {
    @Override
    public void update(CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch) {
        ByteMinSum.update(run, arithmetic, posterior, message, scratch);
    }

    @Override
    public void update(CheckRun run, MinSumArithmetic arithmetic, short[] posterior, short[] message, short[] scratch) {
        ShortMinSum.update(run, arithmetic, posterior, message, scratch);
    }

    @Override
    public void updateStarting(
            CheckRun run, MinSumArithmetic arithmetic, byte[] posterior, byte[] message, byte[] scratch, byte[] keep) {
        ByteMinSum.updateStarting(run, arithmetic, posterior, message, scratch, keep);
    }

    @Override
    public void addUnsatisfied(CheckRun run, byte[] posterior, byte[] found) {
        ByteMinSum.addUnsatisfied(run, posterior, found);
    }

    @Override
    public void updateStarting(
            CheckRun run,
            MinSumArithmetic arithmetic,
            short[] posterior,
            short[] message,
            short[] scratch,
            short[] keep) {
        ShortMinSum.updateStarting(run, arithmetic, posterior, message, scratch, keep);
    }

    @Override
    public void addUnsatisfied(CheckRun run, short[] posterior, short[] found) {
        ShortMinSum.addUnsatisfied(run, posterior, found);
    }

    @Override
    public void start(byte[] posterior, byte[] received, byte[] keep) {
        ByteMinSum.start(posterior, received, keep);
    }
}
