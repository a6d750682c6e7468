package dev.nearlimit.shortlist;

/** Follows a shortlist while it works. Called from one thread; must return quickly. */
public interface ShortlistObserver {
    /**
     * Work went on.
     *
     * @param stage what is being done, in a few words
     * @param fraction share of the expected work that is done, 0 .. 1; never falls
     */
    void progress(String stage, double fraction);
}
