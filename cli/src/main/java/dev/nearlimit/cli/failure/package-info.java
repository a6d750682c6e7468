/**
 * What went wrong, as one line for a person or one object for a program. Every exception that reaches the command line
 * is turned into a {@link dev.nearlimit.cli.failure.Failure} here, and only here. Exceptions of the other rooms are
 * thrown there and merely recognised in this package.
 */
package dev.nearlimit.cli.failure;
