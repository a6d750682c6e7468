package dev.nearlimit.journal;

/**
 * Pieces of a job that one run has under way, so that another run of the same job takes others.
 *
 * @param job the job
 * @param first first piece
 * @param end piece after the last
 */
public record Claim(ContentHash job, long first, long end) {}
