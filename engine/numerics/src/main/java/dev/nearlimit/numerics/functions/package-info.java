/**
 * Functions of a real variable built of operations that IEEE 754 rounds exactly, in a stated order, so that every
 * platform and every kernel computes the same bits. Each states its error against the mathematical function. Nothing
 * here may call a transcendental of the library or a fused multiply-add.
 */
package dev.nearlimit.numerics.functions;
