package millrace.analytics.spark;

import millrace.etl.ExitStatus;

/**
 * A run that cannot go on, with the line shown to the analyst and the exit status. The mart is
 * untouched.
 */
public final class RunException extends RuntimeException {
  private static final long serialVersionUID = 1L;
  private final ExitStatus status;

  private RunException(ExitStatus status, String message, Throwable cause) {
    super(message, cause);
    this.status = status;
  }

  /** The call is wrong: a folder, a file or an option. */
  public static RunException wrongCall(String message, Throwable cause) {
    return new RunException(ExitStatus.WRONG_CALL, message, cause);
  }

  /** The extract as a whole breaks its contract. */
  public static RunException contract(String message) {
    return new RunException(ExitStatus.CONTRACT_BROKEN, message, null);
  }

  /** The run failed. */
  public static RunException failed(String message, Throwable cause) {
    return new RunException(ExitStatus.RUN_FAILED, message, cause);
  }

  /** The exit status. */
  public ExitStatus status() {
    return status;
  }
}
