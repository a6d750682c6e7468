package dev.nearlimit.shortlist.result;

/**
 * Curves that charts draw beside the schemes; each point is a pair of Eb/N0 [dB] and value.
 *
 * @param uncodedBer bit error rate of uncoded BPSK or QPSK
 * @param shannonEfficiency information bits per real dimension, input unconstrained
 * @param binaryInputEfficiency the same for one bit a real dimension, soft decisions
 * @param hardDecisionEfficiency the same for one bit a real dimension, hard decisions
 */
public record ReferenceCurves(
        double[][] uncodedBer,
        double[][] shannonEfficiency,
        double[][] binaryInputEfficiency,
        double[][] hardDecisionEfficiency) {}
