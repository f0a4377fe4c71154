package millrace.analytics.command;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import millrace.analytics.policy.PolicyException;
import millrace.analytics.spark.RunException;
import millrace.etl.ExitStatus;
import millrace.etl.contract.ContractException;
import picocli.CommandLine;

/**
 * Turns what went wrong into one line on standard error and an exit status; the stack trace only
 * with --verbose.
 */
final class Failures {
  private Failures() {}

  static int wrongCall(CommandLine.ParameterException e, String[] args) {
    PrintWriter err = e.getCommandLine().getErr();
    StringBuilder line = new StringBuilder("millrace: ").append(oneLine(e.getMessage()));
    if (e instanceof CommandLine.UnmatchedArgumentException unmatched
        && !unmatched.getSuggestions().isEmpty()) {
      line.append("; did you mean ").append(unmatched.getSuggestions().get(0)).append('?');
    }
    err.println(
        line.append("; see ")
            .append(e.getCommandLine().getCommandSpec().qualifiedName())
            .append(" --help"));
    return ExitStatus.WRONG_CALL.code();
  }

  static int failed(Exception thrown, CommandLine command, CommandLine.ParseResult parsed) {
    Throwable cause = cause(thrown);
    command.getErr().println("millrace: " + oneLine(message(cause)));
    if (verbose(command)) {
      thrown.printStackTrace(command.getErr());
    }
    return status(cause).code();
  }

  /** The first cause that tells the analyst something: Spark wraps what its tasks throw. */
  private static Throwable cause(Throwable thrown) {
    for (Throwable at = thrown; at != null; at = at.getCause()) {
      if (at instanceof RunException
          || at instanceof ContractException
          || at instanceof PolicyException) {
        return at;
      }
    }
    for (Throwable at = thrown; at != null; at = at.getCause()) {
      if (at instanceof IOException
          || at instanceof UncheckedIOException
          || at instanceof OutOfMemoryError) {
        return at;
      }
    }
    return thrown;
  }

  private static String message(Throwable cause) {
    if (cause instanceof OutOfMemoryError) {
      return "the run needs more memory than it has; give Java more with -Xmx, as in java -Xmx4g -jar";
    }
    String text = String.valueOf(cause.getMessage());
    if (text.contains("No space left on device")) {
      return "the disk is full; free some space and run again. The run before is still served";
    }
    if (cause instanceof RunException
        || cause instanceof ContractException
        || cause instanceof PolicyException) {
      return text;
    }
    if (cause instanceof IOException || cause instanceof UncheckedIOException) {
      return "a file could not be read or written: " + text + "; the run before is still served";
    }
    return "the run failed ("
        + cause.getClass().getSimpleName()
        + "); the run before is still served. Run again with --verbose and report what it prints";
  }

  private static ExitStatus status(Throwable cause) {
    if (cause instanceof RunException run) {
      return run.status();
    }
    if (cause instanceof ContractException) {
      return ExitStatus.CONTRACT_BROKEN;
    }
    return cause instanceof PolicyException ? ExitStatus.WRONG_CALL : ExitStatus.RUN_FAILED;
  }

  private static boolean verbose(CommandLine command) {
    return command.getCommand() instanceof SparkCommand spark && spark.verbose();
  }

  private static String oneLine(String message) {
    return message.strip().replaceAll("\\s*\\R\\s*", "; ");
  }
}
