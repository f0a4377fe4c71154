package millrace.etl.contract;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.junit.jupiter.api.Test;

class FileLayoutTest {
  private static FileLayout of(ContractTable table, String... header) {
    return FileLayout.of(table, List.of(header), "part-2.csv");
  }

  private static String refusal(ContractTable table, String... header) {
    return assertThrows(ContractException.class, () -> of(table, header)).getMessage();
  }

  @Property(tries = 200)
  void columnsAreFoundInAnyOrder(@ForAll ContractTable table, @ForAll Random random) {
    List<String> header = new ArrayList<>(table.columns().stream().map(Column::name).toList());
    Collections.shuffle(header, random);
    FileLayout layout = FileLayout.of(table, header, "a.csv");

    for (int f = 0; f < header.size(); f++) {
      assertEquals(header.get(f), table.columns().get(layout.columnOfField()[f]).name());
    }
    assertEquals(List.of(), layout.unknownColumns());
  }

  @Test
  void anUnknownColumnIsPassedOverAndNoted() {
    FileLayout layout =
        of(ContractTable.PATIENTS, "ward", "birth_date", " sex ", "patient_id", "Died_At");

    assertArrayEquals(new int[] {-1, 2, 1, 0, -1}, layout.columnOfField());
    assertEquals(List.of("ward", "Died_At"), layout.unknownColumns());
  }

  @Test
  void anOptionalColumnMayBeAbsent() {
    assertArrayEquals(
        new int[] {0, 1, 2},
        of(ContractTable.PATIENTS, "patient_id", "sex", "birth_date").columnOfField());
  }

  @Test
  void aMissingRequiredColumnNamesFileTableColumnAndMend() {
    assertEquals(
        "part-2.csv, line 1: the table patients needs the column sex; add it to the header and to"
            + " every row",
        refusal(ContractTable.PATIENTS, "patient_id", "birth_date"));
  }

  @Test
  void aColumnInOtherLetterCaseIsHintedAt() {
    assertEquals(
        "part-2.csv, line 1: the table patients needs the column sex; rename SEX (letter case"
            + " counts)",
        refusal(ContractTable.PATIENTS, "patient_id", " SEX", "birth_date"));
  }

  @Test
  void aColumnThatStandsTwiceIsRefused() {
    assertEquals(
        "part-2.csv, line 1: the column sex stands twice in the header; keep one of them",
        refusal(ContractTable.PATIENTS, "patient_id", "sex", "sex", "birth_date"));
  }

  @Property(tries = 200)
  void everyRequiredColumnIsMissed(@ForAll ContractTable table) {
    for (Column missing : table.columns()) {
      List<String> header =
          table.columns().stream()
              .map(Column::name)
              .filter(n -> !n.equals(missing.name()))
              .toList();
      if (missing.required()) {
        String message =
            assertThrows(ContractException.class, () -> FileLayout.of(table, header, "a.csv"))
                .getMessage();
        assertEquals(true, message.contains("needs the column " + missing.name() + ";"), message);
      } else {
        assertEquals(header.size(), FileLayout.of(table, header, "a.csv").columnOfField().length);
      }
    }
  }
}
