/**
 * The way in: the main class, the list of commands, the exit codes and the answer to an interrupt. What a command does
 * stands in {@code command}, how results are laid out in {@code output}, what went wrong in {@code failure}. Nothing is
 * computed anywhere in this room.
 */
package dev.nearlimit.cli;
