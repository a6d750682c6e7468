/**
 * The command {@code shortlist}: from a requirement file to a table, a results file, a CSV and a report. It shows what
 * the shortlist room found; the report is drawn from the results file by {@link dev.nearlimit.cli.report}.
 */
package dev.nearlimit.cli.shortlist;
