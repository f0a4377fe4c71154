package millrace.etl.contract;

/**
 * The extract as a whole breaks its contract: the run stops before any work. The message says what,
 * where and the mend.
 */
public final class ContractException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** With the one line that is shown to the analyst. It holds no row of the extract. */
  public ContractException(String message) {
    super(message);
  }

  /** With the one line that is shown to the analyst, and what caused it. */
  public ContractException(String message, Throwable cause) {
    super(message, cause);
  }
}
