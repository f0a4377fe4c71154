package millrace.analytics.export;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** How exports are printed (methods 12). */
final class FormatTest {
  /** 88,400 nmol/L are 1 mg/dL; 8.84 nmol/L are one in the fourth decimal. */
  @ParameterizedTest
  @CsvSource({
    "88400, 1.0000",
    "176800, 2.0000",
    "26500, 0.2998",
    "8840, 0.1000",
    "3536000, 40.0000",
    "442, 0.0050",
    "0, 0.0000",
    "221, 0.0025",
    "4, 0.0000",
    "5, 0.0001"
  })
  void creatinineHasFourDecimals(long nanomolesPerLitre, String printed) {
    assertEquals(printed, Format.MILLIGRAMS_PER_DECILITRE.print(nanomolesPerLitre));
  }

  @ParameterizedTest
  @CsvSource({
    "86400, 1.000000",
    "43200, 0.500000",
    "0, 0.000000",
    "1, 0.000012",
    "2, 0.000023",
    "27, 0.000313",
    "8640000000, 100000.000000"
  })
  void daysHaveSixDecimalsRoundedHalfUp(long seconds, String printed) {
    assertEquals(printed, Format.DAYS.print(seconds));
  }

  @ParameterizedTest
  @CsvSource({
    "78.43137254901960, 78.4314",
    "1, 1.00000",
    "0.000123456789, 0.000123457",
    "999999.5, 1000000",
    "12345678, 12345700",
    "0.1, 0.100000",
    "9.999999, 10.0000",
    "1234565, 1234570",
    "0, 0"
  })
  void ratesHaveSixSignificantDigits(double number, String printed) {
    assertEquals(printed, Format.SIX_DIGITS.print(number));
  }

  @ParameterizedTest
  @CsvSource({"120, 120.0000", "63.33333333333, 63.3333", "0.00005, 0.0001", "0.03125, 0.0313"})
  void measuresHaveFourDecimalsRoundedHalfUp(double number, String printed) {
    assertEquals(printed, Format.FOUR_DECIMALS.print(number));
  }

  @Test
  void flagsTimesAndTextsAreWrittenPlainly() {
    assertEquals("true", Format.PLAIN.print(true));
    assertEquals("false", Format.PLAIN.print(false));
    assertEquals("2030-03-01T09:00:00Z", Format.PLAIN.print(Instant.parse("2030-03-01T09:00:00Z")));
    assertEquals("2030-03-01T09:00:07Z", Format.PLAIN.print(Instant.parse("2030-03-01T09:00:07Z")));
    assertEquals("3+", Format.PLAIN.print("3+"));
  }

  @ParameterizedTest
  @EnumSource(Format.class)
  void absentValuesAreEmpty(Format format) {
    assertEquals("", format.print(null));
  }
}
