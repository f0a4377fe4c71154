package millrace.ui.episodes;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.OptionalLong;

/** Units that creatinine is shown in. */
enum Creatinine {
  /** Milligrams per decilitre; 1 mg/dL is 88.4 umol/L. */
  MG("mg/dL", "88400", 2),
  /** Micromoles per litre. */
  UMOL("µmol/L", "1000", 0);

  private final String unit;
  private final BigDecimal nanomoles;
  private final int decimals;

  Creatinine(String unit, String nanomoles, int decimals) {
    this.unit = unit;
    this.nanomoles = new BigDecimal(nanomoles);
    this.decimals = decimals;
  }

  String unit() {
    return unit;
  }

  /** The value for a chart. */
  double value(double nanomolesPerLitre) {
    return BigDecimal.valueOf(nanomolesPerLitre)
        .divide(nanomoles, decimals + 2, RoundingMode.HALF_UP)
        .doubleValue();
  }

  /** The value in print, half-up. */
  String say(long nanomolesPerLitre) {
    return BigDecimal.valueOf(nanomolesPerLitre)
        .divide(nanomoles, decimals, RoundingMode.HALF_UP)
        .toPlainString();
  }

  /** The value in print, or a dash. */
  String say(OptionalLong nanomolesPerLitre) {
    return nanomolesPerLitre.isPresent() ? say(nanomolesPerLitre.getAsLong()) : "–";
  }

  /** The value with its unit. */
  String full(long nanomolesPerLitre) {
    return say(nanomolesPerLitre) + " " + unit;
  }

  /** How many times one value is another. */
  static String times(long value, long reference) {
    return BigDecimal.valueOf(value)
        .divide(BigDecimal.valueOf(reference), 2, RoundingMode.HALF_UP)
        .toPlainString();
  }

  /** A number with a sign. */
  String rise(long from, long to) {
    return String.format(Locale.ROOT, "%s%s", to < from ? "−" : "+", say(Math.abs(to - from)));
  }
}
