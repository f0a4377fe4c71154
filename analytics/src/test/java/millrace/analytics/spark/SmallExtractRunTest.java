package millrace.analytics.spark;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractCopy;
import millrace.analytics.fixture.Runs;
import millrace.analytics.fixture.SharedSpark;
import millrace.analytics.fixture.SilentProgress;
import millrace.analytics.fixture.SmallExtract;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.etl.spark.CutSizes;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The invented hospital's extract, run in many forms: how it is written and cut changes nothing.
 */
final class SmallExtractRunTest {
  /** In these the first row of a key stands, so their order matters. */
  private static final Set<String> KEYED = Set.of("patients", "admissions", "units", "code_map");

  private static final ExtractCopy COPY = ExtractCopy.of(SmallExtract.FOLDER);

  @TempDir private static Path folder;
  private static Exports reference;

  @BeforeAll
  static void run() {
    reference = Runs.run(SmallExtract.FOLDER, folder.resolve("reference"), Optional.empty());
  }

  @Test
  void orderOfRowsChangesNothing() {
    assertSameButForPlaces(run("shuffled", COPY.shuffled(new Random(7), KEYED)));
  }

  @Test
  void splittingAndCompressingFilesChangesNothing() {
    assertSameButForPlaces(run("split", COPY.split().gzipped()));
  }

  @Test
  void plainFilesWithCarriageReturnsChangeNothing() {
    assertSameButForPlaces(run("crlf", COPY.withCarriageReturns()));
  }

  @Test
  void rowsThatStandTwiceAreMergedAndChangeNothing() {
    Exports twice = run("twice", COPY.withRowsTwice());

    assertSameButForPlaces(twice);
    long merged = twice.manifest().accounting().stream().mapToLong(a -> a.merged()).sum();
    assertTrue(merged > COPY.records("results") / 3, () -> "merged " + merged);
  }

  @Test
  void otherCutsOfFilesAndPatientsChangeNothing() throws IOException {
    Path mart = folder.resolve("cut");
    new MartRun(
            SharedSpark.session(),
            RunPlan.of(COPY.write(folder.resolve("cut-extract")), Optional.empty()),
            new SilentProgress(),
            new CutSizes(20_000, 60_000))
        .run(mart);

    assertTrue(files(mart, MartTable.EPISODES).size() > 5);
    assertSameButForPlaces(Exports.of(mart));
  }

  @Test
  void twoRunsAndAnotherNumberOfCoresGiveTheSameBytesInEveryTable() throws IOException {
    Runs.run(SmallExtract.FOLDER, folder.resolve("again"), Optional.empty());
    SharedSpark.session("local[1]");
    new MartRun(
            SharedSpark.session("local[1]"),
            RunPlan.of(SmallExtract.FOLDER, Optional.empty()),
            new SilentProgress())
        .run(folder.resolve("one-core"));

    for (MartTable table : MartTable.values()) {
      Map<String, String> first = files(folder.resolve("reference"), table);
      assertTrue(!first.isEmpty(), table::tableName);
      assertEquals(first, files(folder.resolve("again"), table), table.tableName());
      assertEquals(first, files(folder.resolve("one-core"), table), table.tableName());
    }
  }

  private static Exports run(String name, ExtractCopy copy) {
    return Runs.run(
        copy.write(folder.resolve(name + "-extract")), folder.resolve(name), Optional.empty());
  }

  /** The files of a table in the served run, by name, as their bytes in Latin letters. */
  private static Map<String, String> files(Path mart, MartTable table) throws IOException {
    MartFolder layout = new MartFolder(mart);
    Map<String, String> files = new TreeMap<>();
    try (Stream<Path> list = Files.list(layout.table(layout.current().orElseThrow(), table))) {
      for (Path file : list.toList()) {
        files.put(
            file.getFileName().toString(),
            Files.readString(file, java.nio.charset.StandardCharsets.ISO_8859_1));
      }
    }
    return files;
  }

  private static void assertSameButForPlaces(Exports other) {
    assertAll(
        Stream.of(ExportTable.values())
            .map(t -> () -> assertEquals(withoutPlaces(reference, t), withoutPlaces(other, t))));
  }

  /** Rows of an export; of the quarantine without file and line, in an order of their own. */
  private static List<String> withoutPlaces(Exports exports, ExportTable table) {
    if (table != ExportTable.QUARANTINE) {
      return exports.text(table).lines().toList();
    }
    List<String> rows = new ArrayList<>();
    exports.rows(table).forEach(r -> rows.add(Exports.brief(r, "table", "rule", "column", "raw")));
    rows.sort(null);
    return rows;
  }
}
