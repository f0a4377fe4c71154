package millrace.analytics.command;

/** A command that starts Spark, and says more when asked. */
interface SparkCommand {
  /** Whether to print stack traces and Spark's own log. */
  boolean verbose();
}
