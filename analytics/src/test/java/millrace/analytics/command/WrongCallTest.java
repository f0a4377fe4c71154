package millrace.analytics.command;

import static millrace.analytics.command.OneLine.CONTRACT_BROKEN;
import static millrace.analytics.command.OneLine.WRONG_CALL;
import static millrace.analytics.command.OneLine.assertOneLine;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import millrace.analytics.fixture.ExtractFolder;
import millrace.analytics.fixture.Runs;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Wrong calls: one line that says what, where and the mend. */
final class WrongCallTest {
  @TempDir private static Path shared;
  private static Path extract;
  private static Path mart;

  @TempDir private Path folder;

  @BeforeAll
  static void publishARun() {
    mart = shared.resolve("mart");
    extract = new ExtractFolder("UTC", "2030-01-01", "2031-01-01").write(shared.resolve("extract"));
    Runs.run(extract, mart, Optional.empty());
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

  @Test
  void formOfProgressThatDoesNotExist() {
    assertOneLine(
        CommandLineRun.of("run", "--extract", extract, "--mart", mart, "--progress", "xml"),
        WRONG_CALL,
        "--progress",
        "xml",
        "millrace run --help");
  }

  @Test
  void noCommandAtAll() {
    assertOneLine(CommandLineRun.of(), WRONG_CALL, "subcommand", "millrace --help");
  }

  @Test
  void stackTraceIsPrintedOnRequestAlone() {
    CommandLineRun verbose =
        CommandLineRun.of("check", "--extract", folder.resolve("nowhere"), "--verbose");

    assertEquals(CONTRACT_BROKEN, verbose.status());
    assertTrue(verbose.messages().get(0).startsWith("millrace: "), verbose::err);
    assertTrue(verbose.err().contains("\tat millrace.etl.contract."), verbose::err);
  }

  @ParameterizedTest
  @ValueSource(strings = {"rum", "analyse"})
  void commandThatDoesNotExist(String command) {
    assertOneLine(CommandLineRun.of(command), WRONG_CALL, command, "millrace --help");
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
