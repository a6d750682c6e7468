package dev.nearlimit.numerics.kernels;

/** Layered belief propagation in single precision with the Vector API. */
final class VectorFloatKernels implements LayeredFloatKernels {
    @Override
    public void sumProduct(CheckRun run, float largest, float[] posterior, float[] message, float[] scratch) {
        VectorSumProduct.update(run, largest, posterior, message, scratch);
    }

    @Override
    public void minSum(CheckRun run, FloatCorrection correction, float[] posterior, float[] message, float[] scratch) {
        VectorFloatMinSum.update(run, correction, posterior, message, scratch);
    }

    @Override
    public void addUnsatisfied(CheckRun run, float[] posterior, float[] found) {
        VectorFloatMinSum.addUnsatisfied(run, posterior, found);
    }
}
