package dev.nearlimit.simulation;

/**
 * Where the blocks of all runs of a simulator came from.
 *
 * @param computed blocks that it computed
 * @param found blocks that the journal had from an earlier run or another process, each counted once
 * @param framesComputed frames in the blocks that it computed, counted in a result or not
 */
public record BlockOrigins(long computed, long found, long framesComputed) {}
