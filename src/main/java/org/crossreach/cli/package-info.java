/**
 * The commands that a person or a script types.
 *
 * <p>Comes in: the words of the command line. Goes out: results on standard output, everything else
 * on standard error, and one of the {@linkplain org.crossreach.cli.ExitCode exit codes}. Start at
 * {@link org.crossreach.cli.Crossreach}; a command parses, calls and prints, and computes nothing.
 * Nobody may call this package, and no other package prints or ends the program.
 */
package org.crossreach.cli;
