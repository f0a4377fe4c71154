package millrace.sampledata;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import millrace.sampledata.course.Analyte;
import millrace.sampledata.course.Chart;
import millrace.sampledata.course.InjuryNote;
import millrace.sampledata.course.LabResult;
import millrace.sampledata.course.RiskTally;
import millrace.sampledata.person.Admission;
import org.junit.jupiter.api.Test;

/** What was planted shows in the creatinine, and little shows that was not planted. */
final class InjuriesAreSeenTest {
  private static final long DAY = 86_400;
  private static final long RISE_NANOMOLES_PER_LITRE = 26_500;
  private static final List<Chart> CHARTS = Charts.of(7, 6_000, new RiskTally());

  @Test
  void countedInjuriesAreOverTheThresholdAtTheFirstResult() {
    int seen = 0;
    int all = 0;
    for (Chart chart : CHARTS) {
      for (InjuryNote note : chart.injuries()) {
        if (note.counted()) {
          all++;
          seen +=
              chart.results().stream()
                      .anyMatch(
                          result ->
                              result.collectedAt() == note.firstResultAt() && risen(chart, result))
                  ? 1
                  : 0;
        }
      }
    }
    assertTrue(all > 100, "injuries: " + all);
    assertTrue(seen > 0.9 * all, seen + " of " + all);
  }

  @Test
  void withoutAnInjuryFewResultsAreOverTheThreshold() {
    int risen = 0;
    int all = 0;
    for (Chart chart : CHARTS) {
      if (chart.injuries().isEmpty() && chart.person().inRates()) {
        for (LabResult result : chart.results()) {
          boolean creatinine = result.analyte() == Analyte.CREATININE;
          all += creatinine ? 1 : 0;
          risen += creatinine && risen(chart, result) ? 1 : 0;
        }
      }
    }
    assertTrue(all > 10_000, "results: " + all);
    assertTrue(risen < all / 500, risen + " of " + all);
  }

  @Test
  void twoThirdsOfAdultsWereTestedOutsideHospital() {
    long adults = CHARTS.stream().filter(chart -> chart.person().inRates()).count();
    long tested =
        CHARTS.stream()
            .filter(chart -> chart.person().inRates())
            .filter(chart -> chart.results().stream().anyMatch(result -> before(chart, result)))
            .count();
    assertEquals(0.65, tested / (double) adults, 0.06);
  }

  private static boolean before(Chart chart, LabResult result) {
    Admission first = chart.admissions().get(0);
    return result.collectedAt() < first.admittedAt() - 7 * DAY
        && result.collectedAt() >= first.admittedAt() - 365 * DAY;
  }

  private static boolean risen(Chart chart, LabResult result) {
    if (result.analyte() != Analyte.CREATININE) {
      return false;
    }
    long value = nanomolesPerLitre(result);
    for (LabResult earlier : chart.results()) {
      long age = result.collectedAt() - earlier.collectedAt();
      if (earlier.analyte() == Analyte.CREATININE && age > 0 && age <= 7 * DAY) {
        long low = nanomolesPerLitre(earlier);
        if (2 * value >= 3 * low || age <= 2 * DAY && value - low >= RISE_NANOMOLES_PER_LITRE) {
          return true;
        }
      }
    }
    return false;
  }

  private static long nanomolesPerLitre(LabResult result) {
    return result.value() * (result.analyser().mgDl() ? 884L : 1000L);
  }
}
