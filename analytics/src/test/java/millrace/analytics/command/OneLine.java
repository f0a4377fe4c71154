package millrace.analytics.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

/** What a call that goes wrong says: one line, and no row of the extract in it. */
final class OneLine {
  /** Stands in a row of the extracts here, and in no message. */
  static final String SECRET = "Confidential-Person-77";

  static final int WRONG_CALL = 2;
  static final int CONTRACT_BROKEN = 3;

  private OneLine() {}

  static void assertOneLine(CommandLineRun call, int status, String... words) {
    assertEquals(1, call.messages().size(), call::err);
    String line = call.messages().get(0);
    assertTrue(line.startsWith("millrace: "), line);
    for (String word : words) {
      assertTrue(line.contains(word), () -> "lacks " + word + ": " + line);
    }
    assertFalse(line.contains("Exception"), line);
    assertFalse(line.contains(SECRET), line);
    assertEquals(status, call.status(), line);
  }
}
