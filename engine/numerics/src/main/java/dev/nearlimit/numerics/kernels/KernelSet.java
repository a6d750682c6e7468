package dev.nearlimit.numerics.kernels;

import java.util.Optional;

/**
 * Kernels that are chosen together.
 *
 * @param layeredMinSum empty where decoders do better with loops of their own
 */
record KernelSet(NoiseKernels noise, ReceptionKernels reception, Optional<LayeredMinSumKernels> layeredMinSum) {}
