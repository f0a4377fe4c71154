package millrace.etl.check;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Stream;
import millrace.etl.contract.Column;
import millrace.etl.contract.ColumnKind;
import millrace.etl.contract.ContractTable;
import millrace.etl.fixture.Checked;
import millrace.etl.fixture.RowsInMemory;
import millrace.etl.record.Word;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Extract contract, row rules: missing, unreadable, unknown-word; in every column of every table.
 */
class FieldRulesTest {
  /** Extract contract, common rules: the columns in which a bare date is accepted. */
  private static final Set<String> BARE_DATES =
      Set.of(
          "patients.died_at",
          "administrations.started_at",
          "kidney_replacements.started_at",
          "conditions.recorded_at");

  private static Stream<Arguments> columns() {
    return Arrays.stream(ContractTable.values())
        .flatMap(t -> t.columns().stream().map(c -> Arguments.of(t, c)));
  }

  private static Stream<Arguments> requiredColumns() {
    return columns().filter(a -> ((Column) a.get()[1]).required());
  }

  private static Stream<Arguments> optionalColumns() {
    return columns().filter(a -> !((Column) a.get()[1]).required());
  }

  private static Stream<Arguments> codedColumns() {
    return columns().filter(a -> ((Column) a.get()[1]).kind() == ColumnKind.WORD);
  }

  private static Stream<Arguments> timeColumns() {
    return columns().filter(a -> ((Column) a.get()[1]).name().endsWith("_at"));
  }

  private static Stream<Arguments> unreadable() {
    return columns()
        .flatMap(
            a ->
                badTexts(((Column) a.get()[1]).kind())
                    .map(text -> Arguments.of(a.get()[0], a.get()[1], text)));
  }

  private static Stream<String> badTexts(ColumnKind kind) {
    return switch (kind) {
      case TEXT, WORD -> Stream.of();
      case TIME, TIME_OR_NOON, TIME_OR_END_OF_DAY ->
          Stream.of(
              "yesterday", "08:00", "2031-02-29T08:00", "2031-02-29", "2031", "2031-03-02T25:00");
      case BIRTH_DATE -> Stream.of("60", "1960-02-30", "1960-01-01T08:00", "in 1960");
      case NUMBER -> Stream.of("high", "1,5", "1.2.3", "<5", ">5", "5 mmHg");
      case MEASURED_NUMBER -> Stream.of("high", "1,5", "<", "> ", "<<5", "=5", "5<", "<x");
    };
  }

  private static Checked with(ContractTable table, Column column, String value) {
    return RowsInMemory.besides(table).add(table, column.name() + "=" + value).check();
  }

  @ParameterizedTest
  @MethodSource("requiredColumns")
  void anEmptyRequiredFieldIsMissing(ContractTable table, Column column) {
    List<String> expected = List.of("2 missing " + column.name());

    assertEquals(expected, with(table, column, "").broken(table));
    assertEquals(expected, with(table, column, " \t ").broken(table));
    assertEquals(expected, with(table, column, "\r\n").broken(table));
  }

  @ParameterizedTest
  @MethodSource("optionalColumns")
  void anEmptyOptionalFieldIsAbsent(ContractTable table, Column column) {
    Checked checked = with(table, column, "");

    assertEquals(List.of(), checked.broken(table));
    assertEquals(1, checked.account(table).kept());
  }

  @ParameterizedTest
  @MethodSource("unreadable")
  void aTextThatDoesNotParseIsUnreadable(ContractTable table, Column column, String text) {
    assertEquals(List.of("2 unreadable " + column.name()), with(table, column, text).broken(table));
  }

  @ParameterizedTest
  @MethodSource("timeColumns")
  void aBareDateIsReadOnlyWhereTheContractAllowsIt(ContractTable table, Column column) {
    Checked checked = with(table, column, "2031-03-05");

    if (BARE_DATES.contains(table.tableName() + "." + column.name())) {
      assertEquals(List.of(), checked.broken(table));
      assertEquals(List.of("bare-date " + column.name() + " 1"), checked.findings(table));
    } else {
      assertEquals(List.of("2 unreadable " + column.name()), checked.broken(table));
    }
  }

  @Test
  void theColumnsOfBareDatesAreTimes() {
    assertEquals(
        BARE_DATES.size(),
        timeColumns()
            .filter(
                a ->
                    BARE_DATES.contains(
                        ((ContractTable) a.get()[0]).tableName()
                            + "."
                            + ((Column) a.get()[1]).name()))
            .count());
  }

  @ParameterizedTest
  @MethodSource("codedColumns")
  void aValueOutsideItsListIsAnUnknownWord(ContractTable table, Column column) {
    List<String> expected = List.of("2 unknown-word " + column.name());
    String first = column.words().get(0).word();

    assertEquals(expected, with(table, column, "nonsense").broken(table));
    assertEquals(expected, with(table, column, first.toUpperCase(Locale.ROOT)).broken(table));
    assertEquals(expected, with(table, column, first + "s").broken(table));
    assertEquals(expected, with(table, column, first.substring(1)).broken(table));
  }

  @ParameterizedTest
  @MethodSource("codedColumns")
  void everyWordOfTheListIsKnown(ContractTable table, Column column) {
    for (Word word : column.words()) {
      List<String> broken = with(table, column, " " + word.word() + " ").broken(table);
      boolean setApart = table == ContractTable.RESULTS || table == ContractTable.ADMINISTRATIONS;

      assertEquals(
          List.of(),
          broken.stream()
              .filter(b -> !setApart || !b.matches("2 not-(final status|given action)"))
              .toList());
    }
  }

  @Test
  void anIdentifierIsAnyText() {
    Checked checked =
        RowsInMemory.empty()
            .add(ContractTable.UNITS)
            .add(ContractTable.PATIENTS, "patient_id=00\"7, b\u00E9")
            .add(ContractTable.ADMISSIONS, "patient_id=00\"7, b\u00E9", "admission_id= 1e3 ")
            .add(ContractTable.UNIT_STAYS, "admission_id=1e3")
            .check();

    assertEquals(List.of(), checked.quarantine());
    assertEquals("1e3", checked.only(CheckedPatient::stays).admissionId());
  }
}
