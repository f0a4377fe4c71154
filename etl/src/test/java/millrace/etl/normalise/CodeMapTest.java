package millrace.etl.normalise;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class CodeMapTest {
  @Test
  void eachTableHasItsOwnCodes() {
    CodeMap codes = new CodeMap(Map.of("X1", "2160-0"), Map.of("X1", "J01GB03"));

    assertEquals(Optional.of("2160-0"), codes.loinc("X1"));
    assertEquals(Optional.of("J01GB03"), codes.atc("X1"));
  }

  @Test
  void codesAreComparedExactly() {
    CodeMap codes = new CodeMap(Map.of("CREA", "2160-0"), Map.of("GENT", "J01GB03"));

    assertEquals(Optional.empty(), codes.loinc("crea"));
    assertEquals(Optional.empty(), codes.loinc("GENT"));
    assertEquals(Optional.empty(), codes.atc("CREA"));
  }

  @Test
  void aLaterChangeOfTheSourceDoesNotReachIt() {
    Map<String, String> drugs = new HashMap<>(Map.of("GENT", "J01GB03"));
    CodeMap codes = new CodeMap(Map.of(), drugs);
    drugs.clear();

    assertEquals(Optional.of("J01GB03"), codes.atc("GENT"));
  }
}
