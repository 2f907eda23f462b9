/**
 * The command line: one class a command, options in, report out. {@link dev.holdfast.cli.Main}
 * alone ends the program, with status 0 if everything holds, 1 if something blocks, 2 if something
 * could not be checked, 3 for a fault of the program.
 *
 * <p>Nothing here computes or judges, and how a report looks is not decided here.
 */
package dev.holdfast.cli;
