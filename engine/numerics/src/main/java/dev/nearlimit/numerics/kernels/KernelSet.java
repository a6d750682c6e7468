package dev.nearlimit.numerics.kernels;

/** Kernels that are chosen together. */
record KernelSet(NoiseKernels noise) {}
