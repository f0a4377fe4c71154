package millrace.analytics.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.SmallExtract;
import millrace.analytics.mart.Cautions;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.policy.PolicyReader;
import millrace.analytics.spark.Progress;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The commands on the invented hospital's extract. */
final class GoodCallTest {
  @TempDir private static Path folder;
  private static Path mart;
  private static CommandLineRun run;

  @BeforeAll
  static void run() {
    mart = folder.resolve("mart");
    run =
        CommandLineRun.of(
            "run", "--extract", SmallExtract.FOLDER, "--mart", mart, "--master", "local[2]");
  }

  @Test
  void runEndsWellAndWritesEachStepOnALine() {
    assertEquals(0, run.status(), run::err);
    assertEquals(List.of(), run.messages());
    assertEquals(
        Progress.STEPS,
        run.out()
            .lines()
            .filter(l -> l.matches("\\[\\d/6] \\w+"))
            .map(l -> l.substring(l.indexOf(' ') + 1))
            .toList());
  }

  @Test
  void runTellsCountsFlowRatesFindingsCautionsAndWhereTheMartIs() throws IOException {
    String id = new MartFolder(mart).current().orElseThrow();

    for (String part :
        List.of(
            "Saltreach General",
            "rows of the extract",
            "published tables",
            "cohort",
            "not-assessable",
            "per 1,000 patient-days at risk",
            "whole hospital",
            "95 % limits",
            "episodes by origin",
            "findings",
            "Run " + id + " is published in " + mart)) {
      assertTrue(run.out().contains(part), () -> "lacks " + part + ": " + run.out());
    }
    Cautions.SENTENCES.forEach(s -> assertTrue(run.out().contains(s), s));
  }

  @Test
  void runsListsTheServedRunWithAStar() throws IOException {
    CommandLineRun runs = CommandLineRun.of("runs", "--mart", mart);

    assertEquals(0, runs.status());
    assertTrue(
        runs.out()
            .lines()
            .anyMatch(
                l ->
                    l.strip().startsWith("*")
                        && l.contains(martId())
                        && l.contains("Saltreach General")),
        runs::out);
  }

  private static String martId() {
    try {
      return new MartFolder(mart).current().orElseThrow();
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  @Test
  void exportWritesEveryTable() throws IOException {
    Exports exports = Exports.of(mart);
    for (ExportTable table : ExportTable.values()) {
      Path file = folder.resolve(table.table().tableName() + ".csv");
      CommandLineRun export =
          CommandLineRun.of(
              "export", "--mart", mart, "--table", table.table().tableName(), "--out", file);

      assertEquals(0, export.status(), export::err);
      assertEquals(exports.text(table), Files.readString(file));
      assertTrue(export.out().startsWith(exports.rows(table).size() + " rows"), export::out);
    }
  }

  @Test
  void exportTakesARunByItsId() throws IOException {
    Path file = folder.resolve("by-id.csv");
    CommandLineRun export =
        CommandLineRun.of(
            "export", "--mart", mart, "--table", "flow", "--out", file, "--run", martId());

    assertEquals(0, export.status(), export::err);
    assertEquals(Exports.of(mart).text(ExportTable.FLOW), Files.readString(file));
  }

  @Test
  void checkWritesTheQuarantineOfTheRunAndPublishesNothing() throws IOException {
    Path report = folder.resolve("report");
    CommandLineRun check =
        CommandLineRun.of(
            "check",
            "--extract",
            SmallExtract.FOLDER,
            "--report",
            report,
            "--master",
            "local[2]",
            "--progress",
            "json");

    assertEquals(0, check.status(), check::err);
    assertEquals(
        Exports.of(mart).text(ExportTable.QUARANTINE),
        Files.readString(report.resolve("quarantine.csv")));
    assertTrue(
        Files.readString(report.resolve("findings.csv")).startsWith("kind,table,detail,rows\n"));
    assertTrue(check.err().lines().count() >= 3, check::err);
    assertTrue(
        check.err().lines().allMatch(l -> l.matches("\\{\"step\":\"\\w+\",.*}")), check::err);
  }

  @Test
  void policyPrintsAFileThatReadsBackToTheDefaults() throws IOException {
    CommandLineRun printed = CommandLineRun.of("policy");
    Path file = Files.writeString(folder.resolve("policy.yaml"), printed.out());

    assertEquals(0, printed.status());
    assertEquals(PolicyReader.defaults(), PolicyReader.read(file));
  }

  @Test
  void helpIsGivenForEveryCommand() {
    for (String command : List.of("run", "check", "runs", "export", "policy")) {
      CommandLineRun help = CommandLineRun.of(command, "--help");

      assertEquals(0, help.status());
      assertTrue(help.out().contains("Usage: millrace " + command), help::out);
    }
  }
}
