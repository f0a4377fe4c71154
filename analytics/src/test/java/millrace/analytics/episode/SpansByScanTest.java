package millrace.analytics.episode;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import millrace.analytics.criteria.GradualRise;
import millrace.analytics.policy.CriteriaPolicy;
import millrace.analytics.policy.EpisodePolicy;
import millrace.analytics.policy.Policy;
import millrace.analytics.policy.PolicyReader;
import millrace.analytics.timeline.PatientTimeline;
import millrace.analytics.timeline.Timelines;
import millrace.etl.record.Admission;
import millrace.etl.record.CreatinineResult;
import millrace.etl.record.KidneyReplacement;
import millrace.etl.record.Modality;
import millrace.etl.record.ReplacementPurpose;
import millrace.etl.record.ResultSetting;
import millrace.etl.record.Seconds;
import millrace.etl.record.SourceLine;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.statistics.Statistics;

/** Onsets, evidence, references, closings and gradual rises against methods 4 and 5 by scans. */
final class SpansByScanTest {
  /** Hours of the methods as seconds, and a lapse that is short enough to be met. */
  static final Policy POLICY = policy();

  private static Policy policy() {
    Policy d = PolicyReader.defaults();
    return new Policy(
        d.line(),
        d.baseline(),
        new CriteriaPolicy(12, 48, 168, 70, 168, 24, 168),
        new EpisodePolicy(48, 300, 168, 48, 48, 168, 72, 180, 35),
        d.cohort(),
        d.exposure(),
        d.pressure(),
        Map.of());
  }

  @Provide
  Arbitrary<List<Admission>> admissions() {
    return Combinators.combine(
            Arbitraries.integers().between(5, 100), Arbitraries.integers().between(20, 700))
        .as((gap, length) -> List.of(gap, length))
        .list()
        .ofMinSize(1)
        .ofMaxSize(2)
        .map(pairs -> Timelines.admissions(0, pairs.stream().flatMap(List::stream).toList()));
  }

  /** Many results that jump, or a few that creep, so that gradual rises are met too. */
  @Provide
  Arbitrary<List<CreatinineResult>> results() {
    return Arbitraries.oneOf(results(60, 40), results(31, 10));
  }

  private static Arbitrary<List<CreatinineResult>> results(int highest, int most) {
    return Combinators.combine(
            Arbitraries.integers().between(0, 1_200), Arbitraries.integers().between(20, highest))
        .as(
            (at, value) ->
                new CreatinineResult(
                    at,
                    Seconds.ABSENT,
                    value,
                    ResultSetting.UNKNOWN,
                    "",
                    new SourceLine(0, 2_000 * value + at)))
        .list()
        .ofMaxSize(most);
  }

  @Provide
  Arbitrary<List<KidneyReplacement>> replacements() {
    return Combinators.combine(
            Arbitraries.integers().between(0, 1_100),
            Arbitraries.integers().between(0, 40),
            Arbitraries.of(ReplacementPurpose.values()))
        .as(
            (at, length, purpose) ->
                new KidneyReplacement(
                    at, at + length, Modality.CONTINUOUS, purpose, new SourceLine(1, at + 2)))
        .list()
        .ofMaxSize(2);
  }

  @Provide
  Arbitrary<OptionalLong> baseline() {
    return Arbitraries.of(
        OptionalLong.empty(), OptionalLong.empty(), OptionalLong.of(20), OptionalLong.of(30));
  }

  @Property(tries = 1_000)
  void walkFindsWhatScansFind(
      @ForAll("admissions") List<Admission> admissions,
      @ForAll("results") List<CreatinineResult> results,
      @ForAll("replacements") List<KidneyReplacement> replacements,
      @ForAll("baseline") OptionalLong first,
      @ForAll("baseline") OptionalLong second) {
    PatientTimeline timeline = Timelines.of(admissions, results, replacements);
    OptionalLong[] baselines = new OptionalLong[admissions.size()];
    for (int i = 0; i < baselines.length; i++) {
      baselines[i] = i == 0 ? first : second;
    }
    SpanFinder walk = new SpanFinder(POLICY, timeline, baselines);
    SpanScan scan = new SpanScan(timeline, baselines);

    List<Span> spans = walk.find();
    assertEquals(scan.spans(), briefs(spans));
    assertEquals(scan.rises(), rises(walk.gradualRises()));
    Statistics.label("two episodes or more")
        .collect(spans.size() > 1)
        .coverage(c -> c.check(true).count(n -> n > 100));
    Statistics.label("a gradual rise")
        .collect(!walk.gradualRises().isEmpty())
        .coverage(c -> c.check(true).count(n -> n > 0));
  }

  private static List<String> briefs(List<Span> spans) {
    List<String> briefs = new ArrayList<>();
    for (Span span : spans) {
      briefs.add(
          SpanScan.brief(
              span.onset(), span.admission(), span.evidence(), span.reference(), span.closing()));
    }
    return briefs;
  }

  private static List<String> rises(List<GradualRise> rises) {
    return rises.stream()
        .map(
            r ->
                SpanScan.rise(
                    r.admission(), r.at(), r.referenceNanomolesPerLitre(), r.nanomolesPerLitre()))
        .toList();
  }
}
