package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import millrace.etl.contract.ContractException;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.TemporaryFolder;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FileSurveyorTest {
  private static final String HEADER = "patient_id,\"sex\", birth_date \n";
  private static final long WHOLE = Long.MAX_VALUE;

  @TempDir Path folder;

  @Provide
  Arbitrary<CsvText> texts() {
    return CsvText.any();
  }

  private static FileSurvey survey(Path folder, String path, long splitBytes) {
    return FileSurveyor.survey(folder, path, ContractTable.PATIENTS, splitBytes);
  }

  private String refusal(String path, byte[] bytes) throws IOException {
    Files.write(folder.resolve(path), bytes);
    return assertThrows(ContractException.class, () -> survey(folder, path, WHOLE)).getMessage();
  }

  private static List<CsvText.Written> readParts(Path folder, String path, FileSurvey survey)
      throws IOException {
    List<CsvText.Written> records = new ArrayList<>();
    for (FileSurvey.Split split : survey.splits()) {
      try (RecordReader reader = FileSurveyor.open(folder, path, split)) {
        records.addAll(Records.upTo(reader, split.to() - split.from()));
      }
    }
    return records;
  }

  @Property(tries = 150)
  void partsGiveTheRecordsAndLinesOfTheWhole(
      @ForAll("texts") CsvText rows,
      @ForAll @IntRange(min = 1, max = 60) int splitBytes,
      @ForAll boolean byteOrderMark,
      @ForAll boolean compressed)
      throws IOException {
    String path = compressed ? "patients.csv.gz" : "patients.csv";
    CsvText csv = rows.below((byteOrderMark ? "\uFEFF" : "") + HEADER);
    try (TemporaryFolder temporary = new TemporaryFolder()) {
      TemporaryFolder.write(temporary.path().resolve(path), csv.bytes());
      FileSurvey survey = survey(temporary.path(), path, splitBytes);

      assertEquals(List.of("patient_id", "sex", "birth_date"), survey.header());
      assertEquals(csv.records(), readParts(temporary.path(), path, survey));
      assertEquals(csv.records().size(), survey.records());
      assertEquals(csv.bytes().length, survey.textBytes());
      assertTrue(!compressed || survey.splits().size() <= 1);
    }
  }

  @Test
  void aPlainFileIsCutAfterTheRecordThatReachesTheSize() throws IOException {
    Files.writeString(folder.resolve("a.csv"), "h\naa\n\"b\nb\"\nc\n");

    assertEquals(
        List.of(
            new FileSurvey.Split(2, 5, 2),
            new FileSurvey.Split(5, 11, 3),
            new FileSurvey.Split(11, 13, 5)),
        survey(folder, "a.csv", 3).splits());
  }

  @Test
  void emptyLinesBeforeTheHeaderArePassedOver() throws IOException {
    Files.writeString(folder.resolve("a.csv"), "\n\r\nh\nx\n");
    FileSurvey survey = survey(folder, "a.csv", WHOLE);

    assertEquals(List.of("h"), survey.header());
    assertEquals(List.of(new CsvText.Written("x", 4)), readParts(folder, "a.csv", survey));
  }

  @Test
  void aHeaderWithoutRowsHasNoPart() throws IOException {
    Files.writeString(folder.resolve("a.csv"), "h\n\n\n");

    assertEquals(List.of(), survey(folder, "a.csv", 1).splits());
    assertEquals(0, survey(folder, "a.csv", 1).records());
  }

  /** SHA-256 of "abc" as NIST prints it (FIPS 180-4, example values). */
  @Test
  void theFingerprintIsThatOfTheFileAsItLies() throws IOException {
    Files.writeString(folder.resolve("a.csv"), "abc");
    FileSurvey survey = survey(folder, "a.csv", WHOLE);

    assertEquals(
        "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", survey.sha256());
    assertEquals(3, survey.bytes());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "\n", "\r\n\n"})
  void aFileWithoutHeaderIsRefused(String text) throws IOException {
    assertEquals(
        "a.csv is empty; the table patients needs a header line and its rows",
        refusal("a.csv", text.getBytes(StandardCharsets.UTF_8)));
  }

  @Test
  void anUnclosedQuoteIsRefusedWithItsLineAndNoTextOfTheRow() throws IOException {
    String message =
        refusal("a.csv", "h,i\n1,\"2\n\"\nsecret,\"3\n4\n".getBytes(StandardCharsets.UTF_8));

    assertTrue(message.startsWith("a.csv, line 4: a quoted field"), message);
    assertTrue(message.contains("close it"), message);
    assertTrue(!message.contains("secret"), message);
  }

  @Test
  void aTruncatedGzipFileIsRefused() throws IOException {
    byte[] whole =
        TemporaryFolder.gzip((HEADER + "p1,male,1950\n").getBytes(StandardCharsets.UTF_8));

    for (int length = 0; length < whole.length; length++) {
      assertEquals(
          "a.csv.gz is no readable gzip file; compress the table again",
          refusal("a.csv.gz", Arrays.copyOf(whole, length)));
    }
  }

  @Test
  void aPlainFileCalledGzipIsRefused() throws IOException {
    assertEquals(
        "a.csv.gz is no readable gzip file; compress the table again",
        refusal("a.csv.gz", HEADER.getBytes(StandardCharsets.UTF_8)));
  }

  @Test
  void aGzipFileOfSeveralMembersIsReadToItsEnd() throws IOException {
    byte[] first = TemporaryFolder.gzip("h\na\n".getBytes(StandardCharsets.UTF_8));
    byte[] second = TemporaryFolder.gzip("b\n".getBytes(StandardCharsets.UTF_8));
    byte[] both = Arrays.copyOf(first, first.length + second.length);
    System.arraycopy(second, 0, both, first.length, second.length);
    Files.write(folder.resolve("a.csv.gz"), both);
    FileSurvey survey = survey(folder, "a.csv.gz", 1);

    assertEquals(
        List.of(new CsvText.Written("a", 2), new CsvText.Written("b", 3)),
        readParts(folder, "a.csv.gz", survey));
  }

  @Test
  void aFileThatIsNotThereIsRefused() {
    ContractException thrown =
        assertThrows(ContractException.class, () -> survey(folder, "none.csv", WHOLE));

    assertEquals(
        "none.csv cannot be read; check the file and its permissions", thrown.getMessage());
  }
}
