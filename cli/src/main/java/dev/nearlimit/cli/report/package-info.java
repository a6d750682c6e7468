/**
 * The HTML report: one self-contained page drawn from a shortlist results file, which opens offline and prints. Words,
 * numbers and charts are laid out here from what the results hold. Nothing is computed here: a figure that the results
 * do not carry is not on the page.
 */
package dev.nearlimit.cli.report;
