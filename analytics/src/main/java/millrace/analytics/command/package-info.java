/** The command line: one class per command, what it prints, and how it ends. */
package millrace.analytics.command;
