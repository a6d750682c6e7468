/**
 * How far long work has come, on standard error: drawn in place where somebody watches a terminal, in sparse lines
 * otherwise, not at all where the work is short. The work itself reports fractions. Results never pass through here.
 */
package dev.nearlimit.cli.progress;
