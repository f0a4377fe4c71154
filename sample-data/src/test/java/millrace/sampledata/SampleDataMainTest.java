package millrace.sampledata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Words and exit statuses of the command line. */
final class SampleDataMainTest {
  @TempDir private Path temporary;

  private String said = "";

  @ParameterizedTest
  @CsvSource({
    "--admissions, 199, --admissions is 199; give a number from 200 to 5000000",
    "--admissions, 5000001, --admissions is 5000001; give a number from 200 to 5000000",
    "--admissions, many, Invalid value for option '--admissions': 'many' is not a long",
    "--threads, 0, --threads is 0; give a number from 1 to 64",
    "--size, 300, 'Unknown options: ''--size'', ''300'''"
  })
  void wrongInputIsAnsweredInOneLine(String option, String value, String message)
      throws IOException {
    Path out = temporary.resolve("out");
    assertEquals(2, run("--out", out.toString(), option, value));
    assertTrue(said.startsWith("sample-data: " + message), said);
    assertEquals(1, said.lines().count());
    assertTrue(Files.notExists(out));
  }

  @Test
  void folderIsAskedFor() throws IOException {
    assertEquals(2, run());
    assertTrue(said.startsWith("sample-data: Missing required option: '--out=DIR'"), said);
  }

  @Test
  void strangeFolderIsLeftAlone() throws IOException {
    Path mine = Files.writeString(temporary.resolve("mine.csv"), "keep");
    assertEquals(2, run("--out", temporary.toString(), "--admissions", "200"));
    assertTrue(
        said.contains("is not empty and no earlier output of this program; name another folder"),
        said);
    assertEquals("keep", Files.readString(mine));
    assertEquals(1, Folders.bytes(temporary).size());
  }

  @Test
  void fileIsNoFolder() throws IOException {
    Path file = Files.writeString(temporary.resolve("file"), "keep");
    assertEquals(2, run("--out", file.toString(), "--admissions", "200"));
    assertTrue(said.contains("is a file; name a folder"), said);
  }

  @Test
  void earlierOutputIsReplacedAndProgressIsTold() throws IOException {
    String[] call = {
      "--out", temporary.resolve("new").toString(), "--admissions", "200", "--threads", "1"
    };
    assertEquals(0, run(call));
    assertTrue(said.contains("part 2 of 2"), said);
    assertEquals(0, run(call));
  }

  private int run(String... arguments) throws IOException {
    PrintStream before = System.err;
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (PrintStream now = new PrintStream(bytes, true, StandardCharsets.UTF_8)) {
      System.setErr(now);
      return SampleDataMain.run(arguments);
    } finally {
      System.setErr(before);
      said = bytes.toString(StandardCharsets.UTF_8);
    }
  }
}
