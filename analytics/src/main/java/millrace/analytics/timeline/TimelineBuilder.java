package millrace.analytics.timeline;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import millrace.analytics.policy.LinePolicy;
import millrace.etl.check.CheckedPatient;
import millrace.etl.record.Administration;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.BodyHeight;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Modality;
import millrace.etl.record.ResultSetting;
import millrace.etl.record.Seconds;

/** Orders the kept rows of a patient into a timeline (methods 2). */
public final class TimelineBuilder {
  private final LinePolicy policy;
  private final long coversTo;

  /**
   * A builder.
   *
   * @param coversTo end of cover, in epoch seconds
   */
  public TimelineBuilder(LinePolicy policy, long coversTo) {
    this.policy = policy;
    this.coversTo = coversTo;
  }

  /**
   * The timeline of a patient.
   *
   * @throws java.util.NoSuchElementException if the rows have no patient
   */
  public PatientTimeline build(CheckedPatient rows) {
    Membership membership =
        Membership.of(rows.admissions(), coversTo, policy.arrivalWindowSeconds());
    List<ReplacementSpan> replacements = replacements(rows.replacements(), membership);
    List<CreatinineResult> results = sorted(rows.results(), BY_INSTANT);
    List<ResultState> states = states(results, replacements);
    return new PatientTimeline(
        rows.patient().orElseThrow(),
        membership,
        results,
        states,
        line(results, states, membership),
        replacements,
        Occupancy.of(membership, rows.stays()),
        rows.stays(),
        sorted(rows.administrations(), BY_START),
        sorted(rows.pressures(), Comparator.comparingLong(BloodPressure::measuredAt)),
        rows.conditions(),
        sorted(rows.heights(), Comparator.comparingLong(BodyHeight::measuredAt)));
  }

  /**
   * Of several values at one instant the first in this order stands only when all carry a report;
   * see {@link #standing}.
   */
  private static final Comparator<CreatinineResult> BY_INSTANT =
      Comparator.comparingLong(CreatinineResult::collectedAt)
          .thenComparingLong(CreatinineResult::nanomolesPerLitre)
          .thenComparing(CreatinineResult::source);

  private static final Comparator<Administration> BY_START =
      Comparator.comparingLong(Administration::startedAt).thenComparing(Administration::source);

  private List<ReplacementSpan> replacements(
      List<KidneyReplacement> recorded, Membership membership) {
    List<ReplacementSpan> spans = new ArrayList<>();
    for (KidneyReplacement replacement : recorded) {
      int admission = membership.belongsTo(replacement.startedAt());
      long to = end(replacement, admission, membership);
      spans.add(
          new ReplacementSpan(
              replacement,
              replacement.startedAt(),
              to,
              to + policy.replacementWashoutSeconds(),
              admission));
    }
    spans.sort(
        Comparator.comparingLong(ReplacementSpan::from).thenComparingLong(ReplacementSpan::to));
    return spans;
  }

  private static long end(KidneyReplacement replacement, int admission, Membership membership) {
    if (Seconds.given(replacement.endedAt())) {
      return replacement.endedAt();
    }
    return replacement.modality() == Modality.INTERMITTENT || admission == Membership.NONE
        ? replacement.startedAt()
        : membership.stretches().get(admission).to();
  }

  private static List<ResultState> states(
      List<CreatinineResult> results, List<ReplacementSpan> replacements) {
    List<ResultState> states = new ArrayList<>(results.size());
    for (int from = 0; from < results.size(); ) {
      long at = results.get(from).collectedAt();
      int to = from + 1;
      while (to < results.size() && results.get(to).collectedAt() == at) {
        to++;
      }
      boolean masked = false;
      for (ReplacementSpan replacement : replacements) {
        masked |= replacement.masks(at);
      }
      int standing = to == from + 1 ? from : standing(results, from, to);
      for (int i = from; i < to; i++) {
        states.add(
            masked
                ? ResultState.MASKED
                : i == standing ? ResultState.USED : ResultState.SUPERSEDED);
      }
      from = to;
    }
    return states;
  }

  /**
   * The latest report if all carry one, else or on a tie the lowest value; values come in ascending
   * order.
   */
  private static int standing(List<CreatinineResult> results, int from, int to) {
    int best = from;
    for (int i = from; i < to; i++) {
      if (!Seconds.given(results.get(i).resultedAt())) {
        return from;
      }
      if (results.get(i).resultedAt() > results.get(best).resultedAt()) {
        best = i;
      }
    }
    return best;
  }

  private static CreatinineLine line(
      List<CreatinineResult> results, List<ResultState> states, Membership membership) {
    List<CreatinineResult> used = new ArrayList<>(results.size());
    for (int i = 0; i < results.size(); i++) {
      if (states.get(i) == ResultState.USED) {
        used.add(results.get(i));
      }
    }
    return new CreatinineLine(
        used.stream().mapToLong(CreatinineResult::collectedAt).toArray(),
        used.stream().mapToLong(CreatinineResult::nanomolesPerLitre).toArray(),
        used.stream().mapToInt(r -> membership.belongsTo(r.collectedAt())).toArray(),
        used.stream().map(CreatinineResult::setting).toArray(ResultSetting[]::new));
  }

  private static <T> List<T> sorted(List<T> rows, Comparator<T> order) {
    List<T> sorted = new ArrayList<>(rows);
    sorted.sort(order);
    return sorted;
  }
}
