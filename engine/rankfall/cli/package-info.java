/**
 * The command line: one class a verb, progress, messages and the exit status; no mathematics.
 *
 * <p>Results go to standard output, messages for people to standard error. May use every room's
 * front door; nothing may use this room, and picocli stays in it.
 */
package rankfall.cli;
