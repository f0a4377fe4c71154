package millrace.analytics.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
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
import org.junit.jupiter.params.provider.ValueSource;

/** Bad input: one line that says what, where and the mend, and a mart that is untouched. */
final class BadInputTest {
  /** Stands in a row of every extract here, and in no message. */
  private static final String SECRET = "Confidential-Person-77";

  private static final int WRONG_CALL = 2;
  private static final int CONTRACT_BROKEN = 3;

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

  private static void assertOneLine(CommandLineRun call, int status, String... words) {
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

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "min_agee: 18 | no setting min_agee; did you mean min_age?",
        "something_else_entirely: 1 | the command policy prints all settings",
        "min_age: eighteen | min_age is eighteen; write a whole number",
        "min_age: -1 | min_age is -1; write a whole number, 0 or more",
        "lapse: 90 | lapse is 90; write a whole number and a unit",
        "lapse: 90 weeks | lapse is 90 weeks",
        "baseline: lowest | baseline is lowest; write one of outpatient-median",
        "ordered_doses: yes | write one of ignore, count",
        "stratify_by_month: 1 | write true or false",
        "vasopressors: C01CA03 | write a list",
        "hold: 15 min | write a map with critical-care",
        "watchlist: missing.csv | missing.csv cannot be read",
        "'[1, 2]' | no list of settings",
        "'min_age: [18' | line 1",
        "'{min_age: 18, min_age: 19}' | min_age"
      })
  void policyThatCannotBeUsed(String text, String message) throws IOException {
    Path policy = Files.writeString(folder.resolve("policy.yaml"), text);

    assertOneLine(
        CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--policy", policy),
        WRONG_CALL,
        text.contains("watchlist") ? "missing.csv" : "policy.yaml",
        message);
  }

  @Test
  void policyThatIsNotThere() {
    assertOneLine(
        CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--policy", "none.yaml"),
        WRONG_CALL,
        "none.yaml cannot be read",
        "check its name");
  }

  @Test
  void optionThatDoesNotExist() {
    assertOneLine(
        CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--polcy", "p.yaml"),
        WRONG_CALL,
        "--polcy",
        "did you mean --policy?",
        "millrace run --help");
  }

  @Test
  void optionThatIsMissing() {
    assertOneLine(
        CommandLineRun.of("run", "--mart", mart), WRONG_CALL, "--extract", "millrace run --help");
  }

  @ParameterizedTest
  @ValueSource(strings = {"rum", "analyse"})
  void commandThatDoesNotExist(String command) {
    assertOneLine(CommandLineRun.of(command), WRONG_CALL, command, "millrace --help");
  }

  @Test
  void masterThatDoesNotExist() {
    CommandLineRun call =
        CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--master", "nowhere:1");

    assertEquals(1, call.messages().size(), call::err);
    assertTrue(call.status() == 2 || call.status() == 4, call::err);
    assertFalse(call.err().contains("\tat "), call::err);
  }

  @Test
  void exportOfATableThatDoesNotExist() {
    assertOneLine(
        CommandLineRun.of(
            "export", "--mart", mart, "--table", "episode", "--out", folder.resolve("e.csv")),
        WRONG_CALL,
        "no table episode",
        "the tables are",
        "episodes");
  }

  @Test
  void exportOfAMartWithoutARun() {
    assertOneLine(
        CommandLineRun.of(
            "export", "--mart", folder, "--table", "flow", "--out", folder.resolve("f.csv")),
        WRONG_CALL,
        folder.toString(),
        "serves no run",
        "command run");
  }

  @Test
  void exportOfARunThatDoesNotExist() {
    assertOneLine(
        CommandLineRun.of(
            "export",
            "--mart",
            mart,
            "--table",
            "flow",
            "--out",
            folder.resolve("f.csv"),
            "--run",
            "r-1"),
        WRONG_CALL,
        "no published run r-1",
        "command runs");
  }

  @Test
  void exportIntoAFolderThatIsNotThere() {
    assertOneLine(
        CommandLineRun.of(
            "export", "--mart", mart, "--table", "flow", "--out", folder.resolve("no/f.csv")),
        WRONG_CALL,
        "f.csv",
        "cannot be written",
        "--out");
  }

  @Test
  void runsOfAMartThatIsNotThere() {
    assertOneLine(
        CommandLineRun.of("runs", "--mart", folder.resolve("none")),
        WRONG_CALL,
        "none",
        "no folder",
        "mart");
  }
}
