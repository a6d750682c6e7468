package dev.nearlimit.journal;

/**
 * What a merge brought.
 *
 * @param added pieces that were new
 * @param known pieces that both journals had, with equal contents
 */
public record MergedPieces(long added, long known) {}
