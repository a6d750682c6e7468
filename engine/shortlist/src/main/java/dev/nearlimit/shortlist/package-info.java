/**
 * The job itself: a {@link dev.nearlimit.shortlist.requirement.Requirement} in, ranked schemes with their gaps and the
 * reasons for each rejection out. It puts together what algebra and simulation find and computes nothing of theirs
 * anew. How results are shown is the command line's business.
 */
package dev.nearlimit.shortlist;
