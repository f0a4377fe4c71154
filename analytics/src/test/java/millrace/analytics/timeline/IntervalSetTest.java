package millrace.analytics.timeline;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.BitSet;
import java.util.List;
import millrace.analytics.timeline.IntervalSet.Interval;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Interval sets against sets of single seconds. */
final class IntervalSetTest {
  private static final int END = 80;

  /** Some are empty, and some end before they start. */
  @Provide
  Arbitrary<List<Interval>> intervals() {
    Arbitrary<Long> instant = Arbitraries.longs().between(0, END - 1);
    return Combinators.combine(instant, instant).as(Interval::new).list().ofMaxSize(8);
  }

  @Property(tries = 500)
  void unionHoldsTheSecondsOfAnyInterval(@ForAll("intervals") List<Interval> intervals) {
    assertEquals(seconds(intervals), seconds(IntervalSet.union(intervals)));
  }

  @Property(tries = 500)
  void unionOfSetsHoldsTheSecondsOfAny(
      @ForAll("intervals") List<Interval> one, @ForAll("intervals") List<Interval> other) {
    BitSet expected = seconds(one);
    expected.or(seconds(other));

    assertEquals(
        expected,
        seconds(IntervalSet.unionOf(List.of(IntervalSet.union(one), IntervalSet.union(other)))));
  }

  @Property(tries = 500)
  void intersectionHoldsTheSecondsOfBoth(
      @ForAll("intervals") List<Interval> one, @ForAll("intervals") List<Interval> other) {
    BitSet expected = seconds(one);
    expected.and(seconds(other));

    assertEquals(expected, seconds(IntervalSet.union(one).intersect(IntervalSet.union(other))));
  }

  @Property(tries = 500)
  void overlapCountsTheSecondsInside(
      @ForAll("intervals") List<Interval> intervals, @ForAll("intervals") List<Interval> spans) {
    IntervalSet set = IntervalSet.union(intervals);
    for (Interval span : spans) {
      BitSet inside = seconds(intervals);
      inside.and(seconds(List.of(span)));

      assertEquals(
          inside.cardinality(),
          set.overlapSeconds(span.from(), Math.max(span.from(), span.to())),
          span::toString);
    }
  }

  @Property(tries = 500)
  void intervalsAreInOrderNotEmptyAndApart(@ForAll("intervals") List<Interval> intervals) {
    IntervalSet set = IntervalSet.union(intervals);

    assertEquals(set.size() == 0, set.isEmpty());
    for (int i = 0; i < set.size(); i++) {
      assertTrue(set.from(i) < set.to(i));
      assertTrue(i == 0 || set.to(i - 1) < set.from(i));
    }
  }

  private static BitSet seconds(List<Interval> intervals) {
    BitSet seconds = new BitSet();
    for (Interval interval : intervals) {
      for (long t = interval.from(); t < interval.to(); t++) {
        seconds.set((int) t);
      }
    }
    return seconds;
  }

  private static BitSet seconds(IntervalSet set) {
    BitSet seconds = new BitSet();
    for (int t = 0; t < END; t++) {
      seconds.set(t, set.contains(t));
    }
    return seconds;
  }
}
