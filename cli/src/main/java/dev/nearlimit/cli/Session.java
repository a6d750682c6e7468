package dev.nearlimit.cli;

/**
 * What the surroundings give to a command: whether somebody watches standard error, and the wish to stop.
 *
 * @param terminal whether standard error is a terminal, so that progress may be drawn in place
 * @param interruption asked by long commands
 */
public record Session(boolean terminal, Interruption interruption) {}
