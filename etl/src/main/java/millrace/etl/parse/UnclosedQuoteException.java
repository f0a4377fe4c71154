package millrace.etl.parse;

import java.io.IOException;

/** A quoted field that the text ends in. */
public final class UnclosedQuoteException extends IOException {
  private static final long serialVersionUID = 1L;
  private final long line;

  UnclosedQuoteException(long line) {
    super("a quoted field of the record on line " + line + " is never closed");
    this.line = line;
  }

  /** Line on which the record starts. */
  public long line() {
    return line;
  }
}
