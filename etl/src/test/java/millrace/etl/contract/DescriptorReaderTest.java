package millrace.etl.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class DescriptorReaderTest {
  private static final String DESCRIPTOR =
      """
      {
        "name": "invented", "title": "Invented extract", "description": "For tests",
        "surveillance": {
          "site": " Invented ", "zone": "Europe/Dublin",
          "covers_from": "2031-01-01", "covers_to": "2031-07-01"
        },
        "resources": [
          {"name": "patients", "path": "patients.csv"},
          {"name": "admissions", "path": ["admissions.csv"]},
          {"name": "unit_stays", "path": "unit_stays.csv"},
          {"name": "units", "path": "units.csv"},
          {"name": "results", "path": ["results-1.csv", "sub/results-2.csv.gz"]},
          {"name": "administrations", "path": "administrations.csv"},
          {"name": "blood_pressures", "path": "blood_pressures.csv"}
        ]
      }
      """;

  @TempDir Path folder;

  @BeforeEach
  void writeTables() throws IOException {
    Files.createDirectory(folder.resolve("sub"));
    for (ContractTable table : ContractTable.values()) {
      Files.writeString(folder.resolve(table.tableName() + ".csv"), "x\n");
    }
    Files.writeString(folder.resolve("results-1.csv"), "x\n");
    Files.writeString(folder.resolve("sub/results-2.csv.gz"), "x\n");
  }

  private ExtractDescriptor read(String descriptor) throws IOException {
    Files.writeString(folder.resolve("datapackage.json"), descriptor);
    return DescriptorReader.read(folder);
  }

  /** The message, which is one line and names the file. */
  private String refusal(String descriptor) {
    String message = assertThrows(ContractException.class, () -> read(descriptor)).getMessage();
    assertFalse(message.contains("\n"), message);
    assertTrue(message.startsWith(folder.resolve("datapackage.json").toString()), message);
    return message.substring(folder.resolve("datapackage.json").toString().length());
  }

  @Test
  void readsWhatTheDescriptorSays() throws IOException {
    ExtractDescriptor descriptor = read(DESCRIPTOR);

    assertEquals("Invented", descriptor.site());
    assertEquals("Invented extract", descriptor.title());
    assertEquals("For tests", descriptor.description());
    assertEquals(
        new Cover(ZoneId.of("Europe/Dublin"), LocalDate.of(2031, 1, 1), LocalDate.of(2031, 7, 1)),
        descriptor.cover());
    assertEquals(List.of(), descriptor.unknownResources());
  }

  @Test
  void aTableMayBeSeveralFilesInOrder() throws IOException {
    List<ExtractDescriptor.Resource> resources = read(DESCRIPTOR).resources();

    assertEquals(
        new ExtractDescriptor.Resource(
            ContractTable.RESULTS, List.of("results-1.csv", "sub/results-2.csv.gz")),
        resources.get(4));
    assertEquals(
        new ExtractDescriptor.Resource(ContractTable.PATIENTS, List.of("patients.csv")),
        resources.get(0));
  }

  @Test
  void anUnknownResourceIsPassedOverAndNoted() throws IOException {
    ExtractDescriptor descriptor =
        read(
            DESCRIPTOR.replace(
                "\"resources\": [", "\"resources\": [{\"name\": \"allergies\", \"path\": \"a\"},"));

    assertEquals(List.of("allergies"), descriptor.unknownResources());
    assertEquals(7, descriptor.resources().size());
  }

  @Test
  void anOptionalTableIsReadWhenItIsThere() throws IOException {
    ExtractDescriptor descriptor =
        read(
            DESCRIPTOR.replace(
                "\"resources\": [",
                "\"resources\": [{\"name\": \"code_map\", \"path\": \"code_map.csv\"},"));

    assertEquals(ContractTable.CODE_MAP, descriptor.resources().get(0).table());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          "site": " Invented ", |                        | has no surveillance.site; add it
          "site": " Invented "  | "site": "  "           | has no surveillance.site; add it
          "zone": "Europe/Dublin", |                     | has no surveillance.zone; add it
          "covers_from": "2031-01-01", |                 | has no surveillance.covers_from; add it
          , "covers_to": "2031-07-01" |                  | has no surveillance.covers_to; add it
          surveillance          | own                    | has no surveillance.site; add it
          Europe/Dublin         | Mars/Olympus           | surveillance.zone is Mars/Olympus, which is no IANA zone; write one such as Europe/Dublin or UTC
          Europe/Dublin         | Dublin time            | surveillance.zone is Dublin time, which is no IANA zone; write one
          2031-01-01            | 01/01/2031             | surveillance.covers_from is 01/01/2031, which is no date; write it as YYYY-MM-DD
          2031-07-01            | 2031-06-31             | surveillance.covers_to is 2031-06-31, which is no date; write it as YYYY-MM-DD
          2031-07-01            | 2031-01-01             | covers_from 2031-01-01 is not before covers_to 2031-01-01; covers_to is the day after the last one
          2031-07-01            | 2030-07-01             | covers_from 2031-01-01 is not before covers_to 2030-07-01
          "path": "units.csv"   | "paths": "units.csv"   | the resource units has no path; name its file or files
          "path": "units.csv"   | "path": []             | the resource units has no path; name its file or files
          "path": "units.csv"   | "path": "none.csv"     | names none.csv for units, and there is no such file; add it or mend the path
          "path": "units.csv"   | "path": "sub"          | names sub for units, and there is no such file; add it or mend the path
          "path": "units.csv"   | "path": ""             | names  for units, and there is no such file; add it or mend the path
          "path": "units.csv"   | "path": "../units.csv" | the path ../units.csv of units leads out of the extract; put the file inside it
          "path": "units.csv"   | "path": "sub/../../units.csv" | leads out of the extract; put the file inside it
          "path": "units.csv"   | "path": "/etc/hostname" | the path /etc/hostname of units leads out of the extract; put the file inside it
          "path": "units.csv"   | "path": "https://example.org/units.csv" | leads out of the extract; put the file inside it
          sub/results-2.csv.gz  | results-3.csv          | names results-3.csv for results, and there is no such file; add it or mend the path
          "path": "units.csv"   | "path": "units.csv", "encoding": "ISO-8859-1" | the encoding of units is iso-8859-1; export the table as UTF-8
          "path": "units.csv"   | "path": "units.csv", "dialect": {"delimiter": ";"} | the delimiter of units is not a comma; export the table with commas
          "name": "units"       | "name": "patients"     | describes patients twice; list all its files in one resource's path
          """)
  void refusesInOneLineThatNamesTheMend(String part, String instead, String expected) {
    assertTrue(DESCRIPTOR.contains(part), part);
    String message = refusal(DESCRIPTOR.replace(part, instead == null ? "" : instead));

    assertTrue(message.contains(expected), message);
  }

  @ParameterizedTest
  @EnumSource(ContractTable.class)
  void onlyARequiredTableIsMissed(ContractTable table) throws IOException {
    String without = DESCRIPTOR.replace("\"" + table.tableName() + "\"", "\"notes\"");

    if (table.required()) {
      assertEquals(
          " has no resource "
              + table.tableName()
              + "; the contract requires that table: add it to the extract",
          refusal(without));
    } else {
      assertEquals(7, read(without).resources().size());
    }
  }

  @ParameterizedTest
  @CsvSource({"UTF-8", "utf8", "us-ascii"})
  void theseEncodingsAreUtf8(String encoding) throws IOException {
    ExtractDescriptor descriptor =
        read(
            DESCRIPTOR.replace(
                "\"path\": \"units.csv\"",
                "\"path\": \"units.csv\", \"encoding\": \"" + encoding + "\""));

    assertEquals(7, descriptor.resources().size());
  }

  @Test
  void textThatIsNoJsonIsRefusedWithItsPlace() {
    assertEquals(
        ", line 2, column 3 is no readable JSON; mend the descriptor",
        refusal("{\n  surveillance\n}").replaceAll("column \\d+", "column 3"));
  }

  @ParameterizedTest
  @CsvSource({"[]", "1", "''", "null"})
  void jsonThatIsNoObjectIsRefused(String text) {
    assertEquals(" is no JSON object; write it as a Frictionless Data Package", refusal(text));
  }

  @Test
  void aFolderWithoutDescriptorIsRefused() {
    assertEquals(
        folder
            + " has no datapackage.json; an extract is a folder of CSV tables described by that"
            + " file",
        assertThrows(ContractException.class, () -> DescriptorReader.read(folder)).getMessage());
  }

  @Test
  void aFolderThatIsNotThereIsRefused() {
    Path none = folder.resolve("none");

    assertEquals(
        none
            + " is no folder; name the folder that holds datapackage.json and the tables of the"
            + " extract",
        assertThrows(ContractException.class, () -> DescriptorReader.read(none)).getMessage());
  }
}
