package millrace.analytics.exposure;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import millrace.analytics.timeline.IntervalSet;
import millrace.etl.record.Administration;
import millrace.etl.record.DoseBasis;
import millrace.etl.record.Route;
import millrace.etl.record.Seconds;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Exposed time, burden, combinations and links against methods 7 asked at every second. */
final class ExposureBySecondTest {
  /** Shortly before a midnight, so that doses fall on two days. */
  private static final long BASE = 20_000L * 86_400 - 60;

  private static final int LAST = 260;

  /** Prefixes under prefixes, two rows of one agent, two agents of one code, lags and routes. */
  private static final List<WatchedDrug> ROWS =
      List.of(
          row("alpha", "A1", "one", 5, 30, true, Route.IV, Route.PO),
          row("alpha", "A2", "one", 5, 30, true, Route.IV),
          row("beta", "A", "one", 0, 10, true, Route.IV),
          row("gamma", "B", "two", 12, 50, true, Route.PO),
          row("delta", "B", "three", 12, 50, false, Route.PO, Route.IV),
          row("late", "C", "three", 40, 20, true, Route.IV),
          row("omega", "D", "four", 0, 25, true, Route.IV));

  private static final List<Combination> COMBINATIONS =
      List.of(
          new Combination("classes", List.of("one", "two")),
          new Combination("mixed", List.of("three", "alpha", "omega")));

  private static final Subjects SUBJECTS = new Subjects(new Watchlist(ROWS), COMBINATIONS);

  private static WatchedDrug row(
      String agent, String atc, String drugClass, long lag, long back, boolean burden, Route... r) {
    return new WatchedDrug(
        agent, atc, drugClass, "m", EnumSet.copyOf(List.of(r)), lag, back, burden);
  }

  @Provide
  Arbitrary<List<Administration>> doses() {
    return Combinators.combine(
            Arbitraries.of("A1", "A11", "A2", "A3", "B", "B7", "C", "D", "E", ""),
            Arbitraries.of(Route.IV, Route.PO, Route.TOPICAL),
            Arbitraries.integers().between(0, 150),
            Arbitraries.integers().between(-5, 60),
            Arbitraries.of(true, true, true, false),
            Arbitraries.integers().between(1, 1_000_000))
        .as(
            (atc, route, start, length, given, line) ->
                new Administration(
                    atc,
                    atc,
                    "",
                    route,
                    BASE + start,
                    length == 0 ? Seconds.ABSENT : BASE + start + length,
                    "",
                    given ? DoseBasis.ADMINISTERED : DoseBasis.ORDERED,
                    "",
                    new SourceLine(0, line)))
        .list()
        .ofMaxSize(8)
        .map(
            list ->
                list.stream().sorted(Comparator.comparingLong(Administration::startedAt)).toList());
  }

  @Property(tries = 300)
  void subjectsExposeAtTheSecondsThatTheirDosesReach(
      @ForAll("doses") List<Administration> doses, @ForAll boolean countOrdered) {
    Exposure exposure = Exposure.of(doses, SUBJECTS, countOrdered);

    for (long t = BASE - 5; t < BASE + LAST; t++) {
      assertEquals(expected(doses, countOrdered, t), actual(exposure, t), "second " + (t - BASE));
    }
  }

  @Property(tries = 300)
  void burdenIsTheNumberOfAgentsMarkedForIt(@ForAll("doses") List<Administration> doses) {
    Exposure exposure = Exposure.of(doses, SUBJECTS, false);

    for (long t = BASE - 5; t < BASE + LAST; t++) {
      long now = t;
      long agents =
          ROWS.stream()
              .filter(WatchedDrug::burden)
              .filter(row -> doses.stream().anyMatch(d -> exposes(d, row, false, now)))
              .map(WatchedDrug::agent)
              .distinct()
              .count();
      assertEquals(Math.min(agents, 3), exposure.burdenAt(t));
    }
  }

  @Property(tries = 300)
  void linksHoldTheDosesInReachOfAgentsThatExpose(@ForAll("doses") List<Administration> doses) {
    Exposure exposure = Exposure.of(doses, SUBJECTS, false);
    LinkFinder finder = new LinkFinder(SUBJECTS, ZoneOffset.UTC);

    for (long t = BASE - 5; t < BASE + LAST; t += 3) {
      assertEquals(links(doses, t), finder.links(exposure, t), "second " + (t - BASE));
    }
  }

  /** The rows with the longest code of the dose, then those that list its route. */
  private static List<WatchedDrug> watched(Administration dose) {
    List<WatchedDrug> matching =
        ROWS.stream()
            .filter(row -> !dose.atc().isEmpty() && dose.atc().startsWith(row.atc()))
            .toList();
    int longest = matching.stream().mapToInt(row -> row.atc().length()).max().orElse(0);
    return matching.stream()
        .filter(row -> row.atc().length() == longest && row.routes().contains(dose.route()))
        .toList();
  }

  private static long end(Administration dose) {
    return Math.max(dose.startedAt(), dose.endedAt());
  }

  private static boolean exposes(
      Administration dose, WatchedDrug row, boolean countOrdered, long t) {
    boolean counts = countOrdered || dose.basis() == DoseBasis.ADMINISTERED;
    return counts
        && watched(dose).contains(row)
        && t >= dose.startedAt() + row.lagSeconds()
        && t < end(dose) + row.lookBackSeconds();
  }

  private static Set<String> expected(List<Administration> doses, boolean countOrdered, long t) {
    List<WatchedDrug> rows =
        ROWS.stream()
            .filter(row -> doses.stream().anyMatch(d -> exposes(d, row, countOrdered, t)))
            .toList();
    Set<String> names = new TreeSet<>();
    rows.forEach(row -> names.addAll(List.of("agent " + row.agent(), "class " + row.drugClass())));
    for (Combination combination : COMBINATIONS) {
      if (combination.members().stream()
          .allMatch(m -> names.contains("agent " + m) || names.contains("class " + m))) {
        names.add("combination " + combination.name());
      }
    }
    return names;
  }

  private static Set<String> actual(Exposure exposure, long t) {
    return exposure.sets().entrySet().stream()
        .filter(e -> e.getValue().contains(t))
        .map(e -> SUBJECTS.all().get(e.getKey()))
        .map(s -> s.level().word() + " " + s.name())
        .collect(Collectors.toCollection(TreeSet::new));
  }

  private static List<Link> links(List<Administration> doses, long onset) {
    TreeMap<String, List<Administration>> inReach = new TreeMap<>();
    Set<String> exposing = expected(doses, false, onset);
    for (WatchedDrug row : ROWS) {
      for (Administration dose : doses) {
        if (exposing.contains("agent " + row.agent())
            && dose.basis() == DoseBasis.ADMINISTERED
            && watched(dose).contains(row)
            && dose.startedAt() <= onset - row.lagSeconds()
            && end(dose) >= onset - row.lookBackSeconds()) {
          inReach.computeIfAbsent(row.agent(), a -> new ArrayList<>()).add(dose);
        }
      }
    }
    List<Link> links = new ArrayList<>();
    inReach.forEach(
        (agent, own) ->
            links.add(
                new Link(
                    agent,
                    own.stream().mapToLong(Administration::startedAt).min().orElseThrow(),
                    own.stream().mapToLong(Administration::startedAt).max().orElseThrow(),
                    (int) own.stream().map(d -> d.startedAt() / 86_400).distinct().count(),
                    (int) own.stream().map(Administration::source).distinct().count())));
    return links;
  }

  /** A subject that never exposes has no set, and an agent whose lag eats its reach none either. */
  @Property(tries = 100)
  void setsAreNeverEmpty(@ForAll("doses") List<Administration> doses) {
    List<IntervalSet> sets = List.copyOf(Exposure.of(doses, SUBJECTS, true).sets().values());

    assertEquals(List.of(), sets.stream().filter(IntervalSet::isEmpty).toList());
  }
}
