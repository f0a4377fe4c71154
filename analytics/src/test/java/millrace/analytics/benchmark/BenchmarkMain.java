package millrace.analytics.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.List;
import java.util.Locale;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import millrace.analytics.mart.ManifestFile;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.RunManifest;

/**
 * Makes the invented hospital at a size, computes it with the program as an analyst would, and does
 * the same work by a DuckDB script over the same files; prints both as Markdown.
 */
public final class BenchmarkMain {
  private static final int CORES = 2;
  private static final String HEAP = "-Xmx4g";
  private static final double NANOS = 1e9;
  private static final Pattern USED_BEFORE = Pattern.compile("(\\d+)M->");
  private static final Pattern PEAK_RESIDENT = Pattern.compile("VmHWM:\\s+(\\d+) kB");

  private BenchmarkMain() {}

  /**
   * Runs the benchmark.
   *
   * @param args number of admissions, folder to work in, jar of the sample hospital, jar of the
   *     program
   */
  public static void main(String[] args) throws IOException, InterruptedException, SQLException {
    int admissions = Integer.parseInt(args[0]);
    Path work = Path.of(args[1]).toAbsolutePath();
    Path hospital = work.resolve("hospital-" + admissions);
    if (!Files.exists(hospital.resolve("truth"))) {
      child(
          List.of("-Xmx2g", "-jar", args[2], "--out", hospital.toString(), "--admissions", args[0]),
          work.resolve("hospital.log"));
    }
    Path extract = hospital.resolve("extract");
    Path mart = work.resolve("mart");
    Path gc = work.resolve("gc.log");
    long start = System.nanoTime();
    long resident =
        child(
            List.of(
                HEAP,
                "-XX:ActiveProcessorCount=" + CORES,
                "-Xlog:gc:file=" + gc,
                "-jar",
                args[3],
                "run",
                "--extract",
                extract.toString(),
                "--mart",
                mart.toString(),
                "--master",
                "local[" + CORES + "]"),
            work.resolve("run.log"));
    double wall = (System.nanoTime() - start) / NANOS;
    MartFolder folder = new MartFolder(mart);
    RunManifest run = ManifestFile.read(folder.run(folder.current().orElseThrow()));
    SqlWork.Outcome sql = SqlWork.run(extract, work.resolve("sql"), CORES);
    print(admissions, run, wall, peakHeap(gc), resident, sql);
  }

  private static void print(
      int admissions,
      RunManifest run,
      double wall,
      long peakHeap,
      long resident,
      SqlWork.Outcome sql) {
    long rows = run.accounting().stream().mapToLong(RunManifest.TableAccount::read).sum();
    long bytes = run.extract().files().stream().mapToLong(RunManifest.SourceFile::bytes).sum();
    System.out.printf(
        Locale.ROOT,
        "%,d admissions, %,d rows, %.1f GB of CSV; JDK %s, %d cores%n%n",
        admissions,
        rows,
        bytes / 1e9,
        System.getProperty("java.version"),
        CORES);
    System.out.println("| stage of the run | seconds | rows per second |\n| --- | ---: | ---: |");
    for (RunManifest.StageTime stage : run.stages()) {
      System.out.printf(
          Locale.ROOT,
          "| %s | %.1f | %,.0f |%n",
          stage.name(),
          stage.seconds(),
          rows / stage.seconds());
    }
    System.out.printf(
        Locale.ROOT,
        "| whole, with the start of Java and Spark | %.1f | %,.0f |%n%n",
        wall,
        rows / wall);
    System.out.printf(
        Locale.ROOT, "Peak heap %,d MiB, peak resident %,d MiB.%n%n", peakHeap, resident / 1024);
    System.out.println("| part of the DuckDB script | seconds |\n| --- | ---: |");
    sql.parts()
        .forEach(p -> System.out.printf(Locale.ROOT, "| %s | %.1f |%n", p.name(), p.seconds()));
    System.out.printf(Locale.ROOT, "| whole | %.1f |%n%n", sql.seconds());
    System.out.println("Rows of its tables: " + sql.rows());
    System.out.printf(
        Locale.ROOT, "%nThe run takes %.2f times as long as the script.%n", wall / sql.seconds());
  }

  /** Runs a Java child to its end; its peak resident memory in kB. */
  private static long child(List<String> arguments, Path log)
      throws IOException, InterruptedException {
    Files.createDirectories(log.getParent());
    List<String> command =
        Stream.concat(
                Stream.of(ProcessHandle.current().info().command().orElse("java")),
                arguments.stream())
            .toList();
    Process process =
        new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(log.toFile()).start();
    long peak = 0;
    Path status = Path.of("/proc/" + process.pid() + "/status");
    while (!process.waitFor(500, java.util.concurrent.TimeUnit.MILLISECONDS)) {
      peak = Math.max(peak, peakResident(status));
    }
    if (process.exitValue() != 0) {
      throw new IOException(
          "a process of the benchmark ended with status " + process.exitValue() + "; see " + log);
    }
    return peak;
  }

  private static long peakResident(Path status) {
    try {
      return PEAK_RESIDENT
          .matcher(Files.readString(status))
          .results()
          .mapToLong(m -> Long.parseLong(m.group(1)))
          .findFirst()
          .orElse(0);
    } catch (IOException e) {
      // The process has just ended, or the system has no /proc.
      return 0;
    }
  }

  /** Peak heap in MiB: the most that was used before a collection. */
  private static long peakHeap(Path gcLog) throws IOException {
    return USED_BEFORE
        .matcher(Files.readString(gcLog))
        .results()
        .map(MatchResult::group)
        .mapToLong(t -> Long.parseLong(t.replaceAll("\\D", "")))
        .max()
        .orElse(0);
  }
}
