package dev.nearlimit.algebra.weight;

/** Is told how far an enumeration has come, and may end it. Called from the thread that asked for the enumeration. */
@FunctionalInterface
public interface EnumerationListener {
    /** Lets every enumeration run to its end. */
    EnumerationListener SILENT = (wordsDone, wordsInAll) -> true;

    /**
     * Called after each finished part of the work.
     *
     * @param wordsDone words enumerated so far
     * @param wordsInAll words to enumerate
     * @return whether to go on; false ends the enumeration with a {@link java.util.concurrent.CancellationException}
     */
    boolean proceed(long wordsDone, long wordsInAll);
}
