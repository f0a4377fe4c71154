package millrace.etl.normalise;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CreatinineCodesTest {
  /** Extract contract, row rules: LOINC codes of creatinine in serum, plasma or blood. */
  @ParameterizedTest
  @ValueSource(strings = {"2160-0", "38483-4", "14682-9", "77140-2", "21232-4", "59826-8"})
  void bloodIsCreatinine(String loinc) {
    assertTrue(CreatinineCodes.contains(loinc));
  }

  /** Domain reference 8.2: creatinine of urine; potassium; urea nitrogen. */
  @ParameterizedTest
  @ValueSource(
      strings = {"2161-8", "14683-7", "35674-1", "2823-3", "3094-0", "", "2160", "2160-0 "})
  void anythingElseIsAnotherAnalyte(String loinc) {
    assertFalse(CreatinineCodes.contains(loinc));
  }
}
