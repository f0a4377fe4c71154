package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PersonTimeTableTest {
  @ParameterizedTest
  @CsvSource({
    "-1, 1, 1, 1, exposed events",
    "1, 1, -1, 1, unexposed events",
    "1, 1, 1000000001, 1, unexposed events",
    "1, -1, 1, 1, exposed time",
    "1, NaN, 1, 1, exposed time",
    "1, 1, 1, Infinity, unexposed time",
    "1, 1, 1, 1e-101, unexposed time"
  })
  void refusesWhatIsNoCountOrTimeAndNamesIt(
      long exposed, double exposedTime, long unexposed, double unexposedTime, String named) {
    String message =
        assertThrows(
                IllegalArgumentException.class,
                () -> new PersonTimeTable(exposed, exposedTime, unexposed, unexposedTime))
            .getMessage();

    assertTrue(message.startsWith(named), message);
  }

  @Test
  void swappingChangesTheSides() {
    assertEquals(new PersonTimeTable(3, 4, 1, 2), new PersonTimeTable(1, 2, 3, 4).swapped());
  }
}
