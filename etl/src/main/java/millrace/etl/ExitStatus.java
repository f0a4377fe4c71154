package millrace.etl;

/** Exit statuses of the command line. */
public enum ExitStatus {
  /** Done. */
  DONE(0),
  /** The call is wrong. */
  WRONG_CALL(2),
  /** The extract breaks the contract. */
  CONTRACT_BROKEN(3),
  /** The run failed, and the mart is untouched. */
  RUN_FAILED(4);

  private final int code;

  ExitStatus(int code) {
    this.code = code;
  }

  /** The number that the process ends with. */
  public int code() {
    return code;
  }
}
