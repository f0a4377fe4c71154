package millrace.etl.normalise;

import java.util.Locale;
import java.util.Optional;

/** Units of creatinine that can be converted exactly (methods 1; extract contract, row rules). */
public enum CreatinineUnit {
  /** Milligrams per decilitre; 88.4 micromoles per litre. */
  MILLIGRAMS_PER_DECILITRE("mg/dl", 88_400),
  /** Micromoles per litre. */
  MICROMOLES_PER_LITRE("umol/l", 1_000),
  /** Milligrams per litre. */
  MILLIGRAMS_PER_LITRE("mg/l", 8_840),
  /** Millimoles per litre. */
  MILLIMOLES_PER_LITRE("mmol/l", 1_000_000);

  private final String lowerCase;
  private final long nanomolesPerLitre;

  CreatinineUnit(String lowerCase, long nanomolesPerLitre) {
    this.lowerCase = lowerCase;
    this.nanomolesPerLitre = nanomolesPerLitre;
  }

  /** Nanomoles per litre in one of this unit. */
  public long nanomolesPerLitre() {
    return nanomolesPerLitre;
  }

  /** The unit of that text, letter case aside and with any of the micro signs, or empty. */
  public static Optional<CreatinineUnit> of(String text) {
    String plain = text.toLowerCase(Locale.ROOT).replace('\u00B5', 'u').replace('\u03BC', 'u');
    for (CreatinineUnit unit : values()) {
      if (unit.lowerCase.equals(plain)) {
        return Optional.of(unit);
      }
    }
    return Optional.empty();
  }
}
