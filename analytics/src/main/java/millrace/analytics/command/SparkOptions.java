package millrace.analytics.command;

import java.util.Optional;
import millrace.analytics.spark.Progress;
import millrace.analytics.spark.RunSession;
import org.apache.spark.sql.SparkSession;
import picocli.CommandLine.Option;

/** Options of the commands that start Spark. */
final class SparkOptions {
  private static final String LOG_LEVEL = "millrace.log";

  @Option(
      names = "--master",
      paramLabel = "MASTER",
      description =
          "Spark master, as local[2]; default: that of spark-submit, else all local cores")
  private Optional<String> master = Optional.empty();

  @Option(
      names = "--progress",
      paramLabel = "plain|json",
      description =
          "how progress is written: a bar or a line a step, or JSON lines on standard error; default: plain")
  private ProgressForm progress = ProgressForm.PLAIN;

  @Option(names = "--verbose", description = "stack traces and Spark's own log")
  private boolean verbose;

  /** How progress is written. */
  enum ProgressForm {
    /** For people: a bar on a terminal, a line a step elsewhere. */
    PLAIN,
    /** For programs: one JSON object a line. */
    JSON
  }

  boolean verbose() {
    return verbose;
  }

  Progress progress() {
    return progress == ProgressForm.JSON
        ? new JsonProgress(System.err)
        : new PlainProgress(System.console() != null);
  }

  SparkSession start() {
    if (verbose) {
      System.setProperty(LOG_LEVEL, "info");
    }
    return RunSession.start(master);
  }
}
