package dev.nearlimit.numerics.kernels;

import java.util.Optional;

/** The kernels that use the Vector API, in the width that this processor prefers. */
final class VectorKernels {
    private VectorKernels() {}

    static KernelSet all() {
        return new KernelSet(
                new VectorNoiseKernels(), new VectorReceptionKernels(), Optional.of(new VectorMinSumKernels()));
    }
}
