/**
 * What one code with one decoder needs on the channel: its error curve, exact where a formula exists and simulated where
 * none does. Modulation, bandwidth and ranking come later and elsewhere.
 */
package dev.nearlimit.shortlist.evaluation;
