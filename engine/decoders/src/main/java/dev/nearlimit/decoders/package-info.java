/**
 * Every decoder behind one interface: a batch of log-likelihood ratios in, a batch of hard bits and per-frame flags out.
 * Quantisers live here too, because a product's decoder sees their levels. Nothing here makes noise or counts errors.
 */
package dev.nearlimit.decoders;
