package millrace.analytics.pressure;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import millrace.analytics.policy.PressurePolicy;
import millrace.analytics.timeline.Membership;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Timelines;
import millrace.etl.record.Admission;
import millrace.etl.record.BloodPressure;
import millrace.etl.record.PressureMethod;
import millrace.etl.record.SourceLine;
import millrace.etl.record.Unit;
import millrace.etl.record.UnitKind;
import millrace.etl.record.UnitStay;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Readings, spells and measures against methods 8 asked at every second. */
final class PressureBySecondTest {
  private static final int LAST = 400;
  private static final int HOLD_CRITICAL = 8;
  private static final int HOLD_ELSEWHERE = 20;
  private static final int GAP = 15;
  private static final int LEAST = 10;
  private static final int WINDOW = 60;
  private static final int RECENT = 30;
  private static final int LINE_REACH = 4;
  private static final PressurePolicy POLICY =
      new PressurePolicy(
          65, 90, LINE_REACH, HOLD_CRITICAL, HOLD_ELSEWHERE, GAP, LEAST, WINDOW, RECENT, List.of());
  private static final Map<String, Unit> UNITS =
      Map.of(
          "ICU", new Unit("ICU", "ICU", UnitKind.CRITICAL_CARE),
          "M1", new Unit("M1", "M1", UnitKind.MEDICAL));

  @Provide
  Arbitrary<List<Admission>> admissions() {
    return Arbitraries.integers()
        .between(0, 130)
        .list()
        .ofMinSize(2)
        .ofMaxSize(4)
        .map(numbers -> Timelines.admissions(0, numbers));
  }

  @Provide
  Arbitrary<List<BloodPressure>> pressures() {
    Arbitrary<Integer> systolic = Arbitraries.of(-1, 80, 89, 90, 100, 120);
    Arbitrary<Integer> mean = Arbitraries.of(-1, -1, 50, 64, 65, 70);
    return Combinators.combine(
            Arbitraries.integers().between(0, LAST - 100),
            systolic,
            Arbitraries.of(-1, 40, 55, 60),
            mean,
            Arbitraries.of(PressureMethod.values()),
            Arbitraries.integers().between(1, 1_000_000))
        .as(
            (at, s, d, m, method, line) ->
                new BloodPressure(
                    at, nano(s), nano(d), nano(m), method, "", new SourceLine(2, line)))
        .list()
        .ofMaxSize(25);
  }

  private static long nano(int mmHg) {
    return mmHg < 0 ? BloodPressure.NONE : mmHg * BloodPressure.NANOS;
  }

  @Property(tries = 400)
  void spellsAndMeasuresAreThoseOfTheSeconds(
      @ForAll("admissions") List<Admission> admissions,
      @ForAll("pressures") List<BloodPressure> pressures,
      @ForAll boolean critical) {
    List<UnitStay> stays =
        admissions.stream()
            .map(
                a ->
                    new UnitStay(
                        a.admissionId(),
                        critical ? "ICU" : "M1",
                        a.admittedAt(),
                        a.dischargedAt(),
                        a.source()))
            .toList();
    PatientTimeline timeline = Timelines.of(admissions, stays, pressures, 10_000);
    PressureSeries series = new PressureReader(POLICY, UNITS).read(timeline);
    Oracle oracle = new Oracle(timeline, critical);

    assertEquals(oracle.spells(), series.spells());
    for (int t = 0; t < LAST; t++) {
      assertEquals(oracle.recent(t), series.recent().contains(t), "recent at " + t);
    }
    for (int onset = 0; onset < LAST; onset += 7) {
      assertEquals(
          oracle.before(onset), PressureMeasures.before(onset, series, POLICY), "onset " + onset);
    }
  }

  /** The used reading that stands at each second, found by looking at all readings each time. */
  private static final class Oracle {
    private final PatientTimeline timeline;
    private final boolean critical;
    private final List<BloodPressure> used = new ArrayList<>();
    private final BloodPressure[] standing = new BloodPressure[LAST];

    Oracle(PatientTimeline timeline, boolean critical) {
      this.timeline = timeline;
      this.critical = critical;
      for (int t = 0; t < LAST; t++) {
        int now = t;
        timeline.pressures().stream()
            .filter(p -> p.measuredAt() == now && isUsed(p))
            .min(
                Comparator.comparing(BloodPressure::hasMap)
                    .reversed()
                    .thenComparing(p -> p.hasMap() ? p.mapThirdsNanoMmHg() : p.systolicNanoMmHg()))
            .ifPresent(used::add);
        standing[t] = used.stream().filter(p -> holds(p, now)).reduce((a, b) -> b).orElse(null);
        if (standing[t] != null && standing[t] != used.get(used.size() - 1)) {
          standing[t] = null;
        }
      }
    }

    private boolean usable(BloodPressure p) {
      return p.hasMap() || p.systolicNanoMmHg() != BloodPressure.NONE;
    }

    private boolean isUsed(BloodPressure p) {
      return usable(p)
          && (p.method() == PressureMethod.ARTERIAL_LINE
              || timeline.pressures().stream()
                  .noneMatch(
                      o ->
                          usable(o)
                              && o.method() == PressureMethod.ARTERIAL_LINE
                              && Math.abs(o.measuredAt() - p.measuredAt()) <= LINE_REACH));
    }

    private boolean holds(BloodPressure p, int t) {
      long at = p.measuredAt();
      int own = timeline.membership().belongsTo(at);
      boolean inUnit = timeline.membership().holder(at) != Membership.NONE;
      long most = at + (inUnit && critical ? HOLD_CRITICAL : HOLD_ELSEWHERE);
      long until =
          own == Membership.NONE
              ? most
              : Math.min(most, timeline.membership().stretches().get(own).to());
      return at <= t && t < until;
    }

    private static boolean low(BloodPressure p) {
      return p.hasMap()
          ? p.mapThirdsNanoMmHg() < 3 * 65 * BloodPressure.NANOS
          : p.systolicNanoMmHg() < 90 * BloodPressure.NANOS;
    }

    List<Spell> spells() {
      List<Spell> spells = new ArrayList<>();
      List<BloodPressure> run = new ArrayList<>();
      for (BloodPressure next : used) {
        if (!run.isEmpty() && !continues(run.get(run.size() - 1), next)) {
          finish(run, spells);
          run.clear();
        }
        if (low(next) && timeline.membership().belongsTo(next.measuredAt()) != Membership.NONE) {
          run.add(next);
        }
      }
      finish(run, spells);
      return spells;
    }

    private boolean continues(BloodPressure last, BloodPressure next) {
      int unobserved = 0;
      for (int t = (int) last.measuredAt(); t < next.measuredAt(); t++) {
        unobserved += standing[t] == null ? 1 : 0;
      }
      return low(next)
          && unobserved <= GAP
          && timeline.membership().belongsTo(last.measuredAt())
              == timeline.membership().belongsTo(next.measuredAt());
    }

    private void finish(List<BloodPressure> run, List<Spell> spells) {
      if (run.isEmpty()) {
        return;
      }
      int held = 0;
      int end = (int) run.get(run.size() - 1).measuredAt();
      for (int t = 0; t < LAST; t++) {
        if (standing[t] != null && run.contains(standing[t])) {
          held++;
          end = Math.max(end, t + 1);
        }
      }
      if (held >= LEAST) {
        spells.add(new Spell(run.get(0).measuredAt(), end));
      }
    }

    boolean recent(int t) {
      return spells().stream().anyMatch(s -> s.from() <= t && t < s.to() + RECENT);
    }

    PressureMeasures before(int onset) {
      BloodPressure[] window =
          Arrays.stream(standing, Math.max(0, onset - WINDOW), onset)
              .filter(p -> p != null)
              .toArray(BloodPressure[]::new);
      BigInteger area = BigInteger.ZERO;
      long lowest = Long.MAX_VALUE;
      long seconds = 0;
      for (BloodPressure p : window) {
        seconds += low(p) ? 1 : 0;
        if (p.hasMap()) {
          lowest = Math.min(lowest, p.mapThirdsNanoMmHg());
          long depth = Math.max(0, 3 * 65 * BloodPressure.NANOS - p.mapThirdsNanoMmHg());
          area = area.add(BigInteger.valueOf(depth));
        }
      }
      int meeting =
          (int) spells().stream().filter(s -> s.from() < onset && s.to() > onset - WINDOW).count();
      return new PressureMeasures(
          window.length,
          seconds,
          lowest == Long.MAX_VALUE ? OptionalLong.empty() : OptionalLong.of(lowest),
          area,
          meeting);
    }
  }
}
