package dev.nearlimit.decoders.ldpc;

import dev.nearlimit.numerics.kernels.CheckRun;

/** A check rule bound to its kernel: one layered step in single precision. */
@FunctionalInterface
interface FloatChecks {
    /**
     * Does the checks of one run, each updating the posteriors of its bits and its messages to them.
     *
     * @param scratch working memory, {@link dev.nearlimit.numerics.kernels.LayeredFloatKernels#scratch} values
     */
    void update(CheckRun run, float[] posterior, float[] message, float[] scratch);
}
