package millrace.ui.mart;

/** The mart cannot be read; the message says why and how to go on. */
public final class MartException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  MartException(String message, Throwable cause) {
    super(message, cause);
  }
}
