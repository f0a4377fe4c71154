package millrace.sampledata;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.Callable;
import millrace.sampledata.write.Packing;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/**
 * The command line: makes an invented hospital's extract and, beside it, the truth planted in it.
 */
@Command(
    name = "sample-data",
    sortOptions = false,
    usageHelpAutoWidth = true,
    description =
        "Makes an invented hospital's extract (DIR/extract) and what was planted in it (DIR/truth).")
public final class SampleDataMain implements Callable<Integer> {
  private static final int DONE = 0;
  private static final int FAILED = 1;
  private static final int WRONG_CALL = 2;
  private static final long MIXED_BELOW = 100_000;

  @Option(
      names = "--out",
      required = true,
      paramLabel = "DIR",
      description = "Folder to fill: new, empty, or an earlier output.")
  private Path out;

  @Option(
      names = "--admissions",
      paramLabel = "N",
      defaultValue = "12000",
      description = "Admissions, 200 to 5000000 (default: ${DEFAULT-VALUE}).")
  private long admissions;

  @Option(
      names = "--seed",
      paramLabel = "N",
      defaultValue = "20310401",
      description = "Same seed and size, same bytes (default: ${DEFAULT-VALUE}).")
  private long seed;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "Workers (default: one for each processor).")
  private int threads = Math.min(64, Runtime.getRuntime().availableProcessors());

  @Option(
      names = "--gz",
      description =
          "Compress all files but one; else some below 100000 admissions, none from there on.")
  private boolean gz;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Print this help.")
  private boolean help;

  /**
   * Starts the program.
   *
   * @param arguments the command line
   */
  public static void main(String[] arguments) {
    System.exit(run(arguments));
  }

  /**
   * Runs the program without ending the virtual machine.
   *
   * @param arguments the command line
   * @return exit status: 0 done, 1 a file could not be written, 2 wrong call
   */
  static int run(String... arguments) {
    return new CommandLine(new SampleDataMain())
        .setParameterExceptionHandler(SampleDataMain::explain)
        .execute(arguments);
  }

  @Override
  public Integer call() {
    Packing packing = gz ? Packing.GZIP : admissions < MIXED_BELOW ? Packing.MIXED : Packing.PLAIN;
    try {
      GenerationOptions options = new GenerationOptions(out, admissions, seed, threads, packing);
      ExtractGenerator generator = new ExtractGenerator(options);
      long startedAt = System.nanoTime();
      long rows = generator.generate(done -> progress(done, generator.parts()));
      double seconds = (System.nanoTime() - startedAt) / 1e9;
      System.err.println();
      System.err.println(
          String.format(
              Locale.ROOT,
              "%,d rows in %.1f s: %s and %s",
              rows,
              seconds,
              out.resolve("extract"),
              out.resolve("truth")));
      return DONE;
    } catch (IllegalArgumentException wrong) {
      System.err.println("sample-data: " + wrong.getMessage());
      return WRONG_CALL;
    } catch (IOException failure) {
      System.err.println("sample-data: cannot write: " + failure);
      return FAILED;
    }
  }

  private static void progress(int done, int parts) {
    System.err.print("\rpart " + done + " of " + parts);
  }

  private static int explain(CommandLine.ParameterException wrong, String[] arguments) {
    System.err.println(
        "sample-data: "
            + wrong.getMessage().lines().findFirst().orElse("wrong call")
            + " (--help lists the options)");
    return WRONG_CALL;
  }
}
