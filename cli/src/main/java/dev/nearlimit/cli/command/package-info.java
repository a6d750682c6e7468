/**
 * One class a command: what it takes, which room it asks, and the record of what came out. Results show themselves in
 * every format through {@link dev.nearlimit.cli.output.Presentation}. Facts are computed in the rooms below, never here.
 */
package dev.nearlimit.cli.command;
