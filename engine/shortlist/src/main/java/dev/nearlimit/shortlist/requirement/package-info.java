/**
 * What the user's link demands, as immutable records that refuse impossible values. Which file it came from and how that
 * file is written belongs to the command line.
 */
package dev.nearlimit.shortlist.requirement;
