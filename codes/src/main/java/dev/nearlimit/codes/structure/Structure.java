package dev.nearlimit.codes.structure;

/** Something known about a code beyond its matrices; see the package's description. */
public sealed interface Structure permits BchStructure, GuaranteedDistance, QuasiCyclicStructure {}
