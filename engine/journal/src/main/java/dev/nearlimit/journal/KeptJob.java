package dev.nearlimit.journal;

import java.time.Instant;

/**
 * A job that a journal holds.
 *
 * @param description what it is; without facts where nobody described it
 * @param tool name and version of the tool that kept its first piece
 * @param created when its first piece was kept, to the second
 * @param changed when its last piece was kept, to the second
 * @param pieces how many are kept
 */
public record KeptJob(
        ContentHash hash, JobDescription description, String tool, Instant created, Instant changed, long pieces) {}
