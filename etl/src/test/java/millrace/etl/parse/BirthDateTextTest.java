package millrace.etl.parse;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.LocalDate;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Extract contract, common rules: a month is its 15th, a year is 1 July. */
class BirthDateTextTest {
  @ParameterizedTest
  @CsvSource({
    "1950-03-09, 1950-03-09",
    "1950-03, 1950-03-15",
    "1950, 1950-07-01",
    "2024-02-29, 2024-02-29",
    "1899-12-31, 1899-12-31"
  })
  void reads(String text, LocalDate date) {
    assertEquals(Optional.of(date), BirthDateText.read(text));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "50",
        "195",
        "19500309",
        "1950-3",
        "1950-3-9",
        "1950-13",
        "1950-00",
        "1950-02-30",
        "2023-02-29",
        "1950-01-00",
        "1950-",
        "1950-03-",
        "1950-03-09T00:00",
        "09/03/1950",
        "1950/03/09",
        "-1950",
        "unknown",
        "\u0661\u0669\u0665\u0660"
      })
  void refuses(String text) {
    assertEquals(Optional.empty(), BirthDateText.read(text));
  }
}
