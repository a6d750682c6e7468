/**
 * The journal as a user meets it: where it is kept, the options that choose it, what is said when it fails, and the
 * command that lists and tends it. How blocks are stored is the journal room's business, what they mean the
 * simulation's. Opening a journal loads a library, so it happens only when a run is about to begin.
 */
package dev.nearlimit.cli.journal;
