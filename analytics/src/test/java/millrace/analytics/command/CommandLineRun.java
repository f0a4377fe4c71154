package millrace.analytics.command;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * A call of the command line with what it printed.
 *
 * @param status exit status
 * @param out standard output
 * @param err standard error
 */
record CommandLineRun(int status, String out, String err) {
  static CommandLineRun of(Object... args) {
    PrintStream out = System.out;
    PrintStream err = System.err;
    ByteArrayOutputStream outBytes = new ByteArrayOutputStream();
    ByteArrayOutputStream errBytes = new ByteArrayOutputStream();
    try {
      System.setOut(new PrintStream(outBytes, true, StandardCharsets.UTF_8));
      System.setErr(new PrintStream(errBytes, true, StandardCharsets.UTF_8));
      String[] words = new String[args.length];
      for (int i = 0; i < args.length; i++) {
        words[i] = args[i].toString();
      }
      int status = Millrace.execute(words);
      return new CommandLineRun(
          status,
          outBytes.toString(StandardCharsets.UTF_8),
          errBytes.toString(StandardCharsets.UTF_8));
    } finally {
      System.setOut(out);
      System.setErr(err);
    }
  }

  /** Lines of standard error, where nothing but messages stands. */
  List<String> messages() {
    return err.lines().toList();
  }
}
