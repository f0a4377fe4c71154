package millrace.analytics.risk;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.OptionalLong;
import java.util.Set;
import java.util.TreeMap;
import millrace.analytics.criteria.Evidence;
import millrace.analytics.episode.Episode;
import millrace.analytics.episode.Origin;
import millrace.analytics.episode.Span;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.exposure.WatchedDrug;
import millrace.analytics.exposure.Watchlist;
import millrace.analytics.timeline.IntervalSet;
import millrace.analytics.timeline.IntervalSet.Interval;
import millrace.analytics.timeline.Occupancy;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Stretch;
import millrace.analytics.timeline.Timelines;
import millrace.etl.record.Administration;
import millrace.etl.record.Admission;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Route;
import millrace.etl.record.SourceLine;
import millrace.etl.record.UnitStay;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;

/** Cells of time at risk against methods 6 to 8 asked at every second. */
final class RiskCellsBySecondTest {
  /** Shortly before a midnight. */
  private static final long BASE = 20_000L * 86_400 - 150;

  private static final int DAY_BEFORE = 45;
  private static final Map<String, Integer> NUMBERS =
      Map.of(Occupancy.NOWHERE, 0, "A", 1, "B", 2, "C", 3, Occupancy.UNASSIGNED, 4);
  private static final Subjects SUBJECTS =
      new Subjects(
          new Watchlist(
              List.of(
                  drug("alpha", "A", 3, 40, true),
                  drug("beta", "B", 0, 25, true),
                  drug("gamma", "C", 7, 60, false))),
          List.of());

  private static WatchedDrug drug(String agent, String atc, long lag, long back, boolean burden) {
    return new WatchedDrug(
        agent, atc, "class of " + agent, "m", EnumSet.of(Route.IV), lag, back, burden);
  }

  /** A stay in the admission of that number, relative to its start; it may reach outside it. */
  record RawStay(int admission, String unit, int from, int length) {}

  @Provide
  Arbitrary<List<Integer>> gapsAndLengths() {
    return Arbitraries.integers().between(0, 120).list().ofMinSize(2).ofMaxSize(4);
  }

  @Provide
  Arbitrary<List<RawStay>> stays() {
    return Combinators.combine(
            Arbitraries.integers().between(0, 1),
            Arbitraries.of("A", "B", "C"),
            Arbitraries.integers().between(-30, 100),
            Arbitraries.integers().between(0, 90))
        .as(RawStay::new)
        .list()
        .ofMaxSize(6);
  }

  @Provide
  Arbitrary<List<Administration>> doses() {
    return Combinators.combine(
            Arbitraries.of("A", "B", "C"),
            Arbitraries.integers().between(0, 250),
            Arbitraries.integers().between(0, 30))
        .as(
            (atc, start, length) ->
                new Administration(
                    atc,
                    atc,
                    "",
                    Route.IV,
                    BASE + start,
                    BASE + start + length,
                    "",
                    DoseBasis.ADMINISTERED,
                    "",
                    new SourceLine(0, start + 2)))
        .list()
        .ofMaxSize(5);
  }

  @Provide
  Arbitrary<IntervalSet> recent() {
    return Combinators.combine(
            Arbitraries.integers().between(0, 250), Arbitraries.integers().between(0, 60))
        .as((from, length) -> new Interval(BASE + from, BASE + from + length))
        .list()
        .ofMaxSize(3)
        .map(IntervalSet::union);
  }

  @Property(tries = 300)
  void cellsHoldTheirSecondsAndTheCountedEpisode(
      @ForAll("gapsAndLengths") List<Integer> gapsAndLengths,
      @ForAll("stays") List<RawStay> raw,
      @ForAll("doses") List<Administration> doses,
      @ForAll("recent") IntervalSet recent,
      @ForAll @IntRange(min = 1, max = 3) int stage) {
    List<Admission> admissions = Timelines.admissions(BASE, gapsAndLengths);
    List<UnitStay> stays = new ArrayList<>();
    for (RawStay stay : raw) {
      Admission own = admissions.get(Math.min(stay.admission(), admissions.size() - 1));
      long from = own.admittedAt() + stay.from();
      stays.add(
          new UnitStay(own.admissionId(), stay.unit(), from, from + stay.length(), own.source()));
    }
    PatientTimeline timeline = Timelines.of(admissions, stays, List.of(), Long.MAX_VALUE);
    Exposure exposure = Exposure.of(doses, SUBJECTS, false);
    Stretch last = timeline.membership().stretches().get(admissions.size() - 1);
    long from = Math.min(last.to(), last.from() + 10);
    RiskTime risk = new RiskTime(admissions.size() - 1, from, last.to(), OptionalInt.of(0));
    Episode episode = episode(last.to(), stage);

    CellTable table = new CellTable();
    new RiskCells(new LocalDays(ZoneOffset.UTC), NUMBERS, DAY_BEFORE, table)
        .add(risk, new RiskCells.Strata(timeline.occupancy(), exposure, recent), List.of(episode));

    Map<RiskCell, List<Long>> expected = new TreeMap<>(BY_TEXT);
    for (long t = from; t < last.to(); t++) {
      for (RiskCell cell : cells(t, timeline, stays, exposure, recent)) {
        add(expected, cell, 1, 0, 0);
      }
    }
    for (RiskCell cell : cells(last.to(), timeline, stays, exposure, recent)) {
      add(expected, cell, 0, 1, stage >= 2 ? 1 : 0);
    }
    Map<RiskCell, List<Long>> actual = new TreeMap<>(BY_TEXT);
    table.forEach((cell, s, e, s2) -> add(actual, RiskCell.of(cell), s, e, s2));
    assertEquals(expected, actual);
  }

  private static final Comparator<RiskCell> BY_TEXT = Comparator.comparing(RiskCell::toString);

  private static void add(
      Map<RiskCell, List<Long>> sums, RiskCell cell, long seconds, long episodes, long stage2) {
    sums.merge(
        cell,
        List.of(seconds, episodes, stage2),
        (a, b) -> List.of(a.get(0) + b.get(0), a.get(1) + b.get(1), a.get(2) + b.get(2)));
  }

  private static Episode episode(long onset, int stage) {
    Span span = new Span(onset, 0, Set.of(Evidence.RISE_48H), OptionalLong.of(1), 0, onset + 1);
    return new Episode(
        span, Origin.HOSPITAL, stage, OptionalInt.of(0), true, false, Optional.empty());
  }

  /** The cells of one second: for both attributions the whole and each exposing subject. */
  private static List<RiskCell> cells(
      long t,
      PatientTimeline timeline,
      List<UnitStay> stays,
      Exposure exposure,
      IntervalSet recent) {
    List<RiskCell> cells = new ArrayList<>();
    for (Attribution attribution : Attribution.values()) {
      long seen = attribution == Attribution.DAY_BEFORE ? t - DAY_BEFORE : t;
      int unit = NUMBERS.get(unit(seen, timeline, stays));
      List<Integer> subjects = new ArrayList<>(List.of(RiskCell.ALL));
      exposure
          .sets()
          .forEach((number, set) -> subjects.addAll(set.contains(t) ? List.of(number) : List.of()));
      for (int subject : subjects) {
        cells.add(
            new RiskCell(
                Math.floorDiv(t, 86_400),
                unit,
                attribution,
                subject,
                recent.contains(t),
                exposure.burdenAt(t)));
      }
    }
    return cells;
  }

  /** The later-entered stay of the admission at that second, then the greater id. */
  private static String unit(long t, PatientTimeline timeline, List<UnitStay> stays) {
    Optional<String> admission =
        timeline.membership().stretches().stream()
            .filter(s -> s.from() <= t && t < s.to())
            .map(s -> s.admission().admissionId())
            .findFirst();
    Optional<UnitStay> best =
        stays.stream()
            .filter(s -> s.enteredAt() <= t && t < s.leftAt())
            .filter(s -> admission.isEmpty() || admission.get().equals(s.admissionId()))
            .max(Comparator.comparingLong(UnitStay::enteredAt).thenComparing(UnitStay::unitId));
    return best.map(UnitStay::unitId)
        .orElse(admission.isPresent() ? Occupancy.UNASSIGNED : Occupancy.NOWHERE);
  }
}
