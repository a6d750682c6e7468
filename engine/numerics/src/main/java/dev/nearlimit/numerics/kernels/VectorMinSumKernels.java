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
}
