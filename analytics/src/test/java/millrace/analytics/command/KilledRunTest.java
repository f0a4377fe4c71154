package millrace.analytics.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Stream;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.Runs;
import millrace.analytics.fixture.SmallExtract;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.analytics.spark.ParquetRows;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** A run in a Java machine of its own, killed at one step or another. */
final class KilledRunTest {
  @TempDir private static Path folder;
  private static Path mart;
  private static Exports published;

  @BeforeAll
  static void publishARun() {
    mart = folder.resolve("mart");
    published = Runs.run(SmallExtract.FOLDER, mart, Optional.empty());
  }

  @ParameterizedTest
  @ValueSource(strings = {"survey", "rates"})
  void runBeforeStaysServedWhenARunIsKilled(String step) throws Exception {
    assertTrue(killAt(line -> line.contains("\"step\":\"" + step + "\"")));

    assertEquals(published.manifest().runId(), new MartFolder(mart).current().orElseThrow());
    assertEquals(List.of(published.manifest().runId()), new MartFolder(mart).published());
    assertServedRunIsWhole();
    for (ExportTable table : ExportTable.values()) {
      assertEquals(published.text(table), Exports.of(mart).text(table));
    }
  }

  /** While it publishes, the run may be served just before the kill, and then it is whole. */
  @Test
  void servedRunIsWholeWhenARunIsKilledWhilePublishing() throws Exception {
    Path own = folder.resolve("publishing");
    String first = Runs.run(SmallExtract.FOLDER, own, Optional.empty()).manifest().runId();
    killAt(own, line -> line.contains("\"step\":\"publish\""));

    MartFolder layout = new MartFolder(own);
    assertTrue(layout.published().contains(first));
    assertTrue(layout.published().contains(layout.current().orElseThrow()));
    assertEquals(published.text(ExportTable.EPISODES), Exports.of(own).text(ExportTable.EPISODES));
  }

  @Test
  void nextRunSucceedsAndClearsWhatAKilledRunLeft() throws Exception {
    Path own = folder.resolve("cleared");
    killAt(own, line -> line.contains("\"step\":\"tables\""));
    assertEquals(Optional.empty(), new MartFolder(own).current());
    assertNotEquals(List.of(), leftOver(own));

    Exports next = Runs.run(SmallExtract.FOLDER, own, Optional.empty());

    assertEquals(List.of(), leftOver(own));
    assertEquals(published.text(ExportTable.EPISODES), next.text(ExportTable.EPISODES));
  }

  private static List<String> leftOver(Path mart) throws IOException {
    try (Stream<Path> runs = Files.list(new MartFolder(mart).runs())) {
      return runs.map(r -> r.getFileName().toString()).filter(r -> r.startsWith(".")).toList();
    }
  }

  private static void assertServedRunIsWhole() throws IOException {
    MartFolder layout = new MartFolder(mart);
    for (MartTable table : MartTable.values()) {
      List<String> rows = new ArrayList<>();
      ParquetRows.forEach(
          layout.table(layout.current().orElseThrow(), table), row -> rows.add(row.toString()));
      assertEquals(
          published.manifest().tables().get(table.tableName()), rows.size(), table.tableName());
    }
  }

  private static boolean killAt(Predicate<String> when) throws Exception {
    return killAt(mart, when);
  }

  /** Starts a run and kills it at the first such line of progress; whether there was one. */
  private static boolean killAt(Path mart, Predicate<String> when) throws Exception {
    Process process =
        new ProcessBuilder(command(mart)).redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
    try (BufferedReader progress = process.errorReader()) {
      boolean met = progress.lines().anyMatch(when);
      process.destroyForcibly().waitFor();
      return met;
    }
  }

  private static List<String> command(Path mart) {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of("-Xmx1g", "-XX:TieredStopAtLevel=1", "-XX:+UseSerialGC"));
    ManagementFactory.getRuntimeMXBean().getInputArguments().stream()
        .filter(a -> a.startsWith("--add-opens"))
        .forEach(command::add);
    command.add("-cp");
    command.add(
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path")));
    command.addAll(
        List.of(
            Millrace.class.getName(),
            "run",
            "--extract",
            SmallExtract.FOLDER.toString(),
            "--mart",
            mart.toString(),
            "--master",
            "local[2]",
            "--progress",
            "json"));
    return command;
  }
}
