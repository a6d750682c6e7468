/**
 * What the numbers and decoders of this project are held to, and the means of holding them to it. Each kind of evidence
 * has a package of its own. Nothing here computes a result for a user.
 */
package dev.nearlimit.testvectors;
