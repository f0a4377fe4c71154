package millrace.etl.normalise;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class CreatinineUnitTest {
  /** Extract contract: units of creatinine; factors: methods 1 and domain reference 8.3. */
  @ParameterizedTest
  @CsvSource({
    "mg/dL, 88400",
    "mg/dl, 88400",
    "MG/DL, 88400",
    "umol/L, 1000",
    "UMOL/L, 1000",
    "uMol/l, 1000",
    "\u00B5mol/L, 1000",
    "\u00B5MOL/l, 1000",
    "\u03BCmol/L, 1000",
    "\u03BCMOL/L, 1000",
    "mg/L, 8840",
    "MG/l, 8840",
    "mmol/L, 1000000",
    "MMOL/L, 1000000"
  })
  void isSoManyNanomolesPerLitre(String text, long nanomolesPerLitre) {
    assertEquals(
        Optional.of(nanomolesPerLitre),
        CreatinineUnit.of(text).map(CreatinineUnit::nanomolesPerLitre));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "mg",
        "g/L",
        "mg/100mL",
        "mol/L",
        "nmol/L",
        "ug/dL",
        "\u00B5g/dL",
        "mg/dLL",
        "mg /dL",
        "mg\\dL",
        "mmol/24h",
        "mL/min",
        "umol",
        "\u00B5\u00B5mol/L"
      })
  void cannotConvert(String text) {
    assertEquals(Optional.empty(), CreatinineUnit.of(text));
  }
}
