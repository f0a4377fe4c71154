package millrace.analytics.command;

import static millrace.analytics.command.OneLine.CONTRACT_BROKEN;
import static millrace.analytics.command.OneLine.SECRET;
import static millrace.analytics.command.OneLine.WRONG_CALL;
import static millrace.analytics.command.OneLine.assertOneLine;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.GZIPOutputStream;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import millrace.analytics.spark.MartLock;
import millrace.etl.contract.ContractTable;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * A bad extract or mart: one line that says what, where and the mend, and a mart that is untouched.
 */
final class BadExtractTest {
  @TempDir private static Path shared;
  private static Path mart;

  @TempDir private Path folder;
  private Path extract;
  private Map<String, String> before;

  @BeforeAll
  static void publishARun() {
    mart = shared.resolve("mart");
    Runs.run(extract().write(shared.resolve("extract")), mart, Optional.empty());
  }

  @BeforeEach
  void writeExtract() throws IOException {
    extract = extract().write(folder.resolve("extract"));
    before = tree(mart);
  }

  @AfterEach
  void martIsUntouched() throws IOException {
    assertEquals(before, tree(mart));
  }

  private static ExtractFolder extract() {
    return new ExtractFolder("UTC", "2030-01-01", "2031-01-01")
        .timetable(
            """
            patient %1$s male 1960-01-01
            admitted 2030-03-01T08:00 2030-03-09T08:00 M1
            creatinine 2030-03-01T09:00 1.0
            creatinine 2030-03-05T09:00 1.8
            """
                .formatted(SECRET));
  }

  /** Path and content of everything in a mart but its lock. */
  private static Map<String, String> tree(Path root) throws IOException {
    Map<String, String> files = new TreeMap<>();
    try (Stream<Path> paths = Files.walk(root)) {
      for (Path path : paths.filter(p -> !p.endsWith(".writing")).toList()) {
        String content =
            Files.isDirectory(path) ? "" : Files.readString(path, StandardCharsets.ISO_8859_1);
        files.put(root.relativize(path).toString(), content);
      }
    }
    return files;
  }

  private CommandLineRun run() {
    return CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--master", "local[2]");
  }

  private void replaceInDescriptor(String old, String other) throws IOException {
    Path file = extract.resolve("datapackage.json");
    String text = Files.readString(file);
    assertTrue(text.contains(old), text);
    Files.writeString(file, text.replace(old, other));
  }

  @Test
  void folderThatIsNotThere() {
    extract = folder.resolve("nowhere");

    assertOneLine(run(), CONTRACT_BROKEN, "nowhere", "no folder", "datapackage.json");
  }

  @Test
  void checkOfAFolderThatIsNotThere() {
    assertOneLine(
        CommandLineRun.of("check", "--extract", folder.resolve("nowhere")),
        CONTRACT_BROKEN,
        "nowhere",
        "no folder");
  }

  @Test
  void folderWithoutDescriptor() throws IOException {
    Files.delete(extract.resolve("datapackage.json"));

    assertOneLine(run(), CONTRACT_BROKEN, "extract", "has no datapackage.json", "described by");
  }

  @Test
  void descriptorThatIsNoJson() throws IOException {
    Files.writeString(extract.resolve("datapackage.json"), "{\n  \"resources\": [,]\n}");

    assertOneLine(run(), CONTRACT_BROKEN, "datapackage.json, line 2", "JSON", "mend");
  }

  @Test
  void descriptorWithoutARequiredTable() throws IOException {
    replaceInDescriptor("\"blood_pressures\"", "\"bloodpressures\"");

    assertOneLine(
        run(), CONTRACT_BROKEN, "datapackage.json", "no resource blood_pressures", "add it");
  }

  @Test
  void fileThatTheDescriptorNamesAndIsNotThere() throws IOException {
    Files.delete(extract.resolve("results.csv"));

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv", "no such file", "mend the path");
  }

  @ParameterizedTest
  @CsvSource({
    "Etc/Nowhere, Etc/Nowhere, Europe/Dublin",
    "'', surveillance.zone, add it",
    "local, local, IANA"
  })
  void zoneThatIsNone(String zone, String what, String mend) throws IOException {
    replaceInDescriptor("\"UTC\"", '"' + zone + '"');

    assertOneLine(run(), CONTRACT_BROKEN, "datapackage.json", what, mend);
  }

  @Test
  void tableWithoutARequiredColumn() throws IOException {
    Path file = extract.resolve("results.csv");
    Files.writeString(file, Files.readString(file).replaceFirst("collected_at", "taken_at"));

    assertOneLine(
        run(), CONTRACT_BROKEN, "results.csv, line 1", "needs the column collected_at", "add it");
  }

  @Test
  void fileThatIsNoGzip() throws IOException {
    Files.move(extract.resolve("results.csv"), extract.resolve("results.csv.gz"));
    replaceInDescriptor("results.csv", "results.csv.gz");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv.gz", "no readable gzip", "compress");
  }

  @Test
  void gzipThatEndsTooEarly() throws IOException {
    ByteArrayOutputStream whole = new ByteArrayOutputStream();
    try (OutputStream gzip = new GZIPOutputStream(whole)) {
      gzip.write(Files.readAllBytes(extract.resolve("results.csv")));
    }
    Files.write(
        extract.resolve("results.csv.gz"), Arrays.copyOf(whole.toByteArray(), whole.size() - 20));
    replaceInDescriptor("results.csv", "results.csv.gz");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv.gz", "no readable gzip", "compress");
  }

  @Test
  void tableWithAHeaderAlone() throws IOException {
    Files.writeString(
        extract.resolve("results.csv"), ExtractFolder.header(ContractTable.RESULTS) + "\n");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv", "no row", "export its rows");
  }

  @Test
  void tableThatIsEmpty() throws IOException {
    Files.writeString(extract.resolve("results.csv"), "");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv", "empty", "header");
  }

  @Test
  void tableWithoutAValidRow() throws IOException {
    Files.writeString(
        extract.resolve("results.csv"),
        ExtractFolder.header(ContractTable.RESULTS)
            + "\n"
            + SECRET
            + ",,2160-0,,2030-03-01T09:00,,much,mg/dL,,\n");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv", "no row of results is valid", "check");
  }

  @Test
  void quoteThatIsNeverClosed() throws IOException {
    Path file = extract.resolve("results.csv");
    Files.writeString(file, Files.readString(file) + SECRET + ",\"open\n");

    assertOneLine(run(), CONTRACT_BROKEN, "results.csv, line 5", "never closed", "close it");
  }

  @Test
  void martThatIsAFile() throws IOException {
    Path file = Files.writeString(folder.resolve("mart.txt"), "no folder");

    assertOneLine(
        CommandLineRun.of("run", "--extract", extract, "--mart", file, "--master", "local[2]"),
        WRONG_CALL,
        "mart.txt",
        "cannot be made",
        "--mart");
    assertEquals("no folder", Files.readString(file));
  }

  @Test
  void martThatIsInsideAFile() throws IOException {
    Path file = Files.writeString(folder.resolve("file"), "");

    assertOneLine(
        CommandLineRun.of(
            "run", "--extract", extract, "--mart", file.resolve("mart"), "--master", "local[2]"),
        WRONG_CALL,
        "mart",
        "cannot be made",
        "--mart");
  }

  @Test
  void martThatAnotherRunIsWriting() throws IOException {
    try (MartLock lock = MartLock.take(mart)) {
      assertOneLine(run(), WRONG_CALL, mart.toString(), "another run", "wait");
      assertTrue(Files.exists(mart.resolve(".writing")), lock::toString);
    }
  }
}
