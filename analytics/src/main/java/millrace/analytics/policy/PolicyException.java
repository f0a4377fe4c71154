package millrace.analytics.policy;

/**
 * A policy file, watchlist or combination list that cannot be used. The message says what, where
 * and the mend.
 */
public final class PolicyException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** With the one line that is shown to the analyst. */
  public PolicyException(String message) {
    super(message);
  }

  /** With the one line that is shown to the analyst, and what caused it. */
  public PolicyException(String message, Throwable cause) {
    super(message, cause);
  }
}
