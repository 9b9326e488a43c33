/**
 * The command line: arguments to a command and its exit code. Data goes to standard output,
 * everything else to standard error, in fixed English. May use {@code store}, {@code sheets} and
 * {@code logbook}; the command-line library stays inside.
 */
@NullMarked
package sillet.command;

import org.jspecify.annotations.NullMarked;
