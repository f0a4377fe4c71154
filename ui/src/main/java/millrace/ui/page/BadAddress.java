package millrace.ui.page;

/** An address whose values cannot be read; the message says which and what they may be. */
public final class BadAddress extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** Says what is wrong and what to write instead. */
  public BadAddress(String message) {
    super(message);
  }
}
