package millrace.analytics.criteria;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** The monotonic queue and the window of the criteria against plain scans. */
final class SlidingMinimumTest {
  /** A result some time after the one before; a closing may fall on it. */
  record Step(int later, long value, boolean closes) {}

  @Provide
  Arbitrary<List<Step>> steps() {
    return Combinators.combine(
            Arbitraries.integers().between(1, 12),
            Arbitraries.longs().between(1, 9),
            Arbitraries.integers().between(0, 7).map(i -> i == 0))
        .as(Step::new)
        .list()
        .ofMaxSize(40);
  }

  @Property(tries = 500)
  void lowestIsThatOfAScan(@ForAll("steps") List<Step> steps, @ForAll("widths") int width) {
    SlidingMinimum minimum = new SlidingMinimum(steps.size());
    long[] at = times(steps);

    for (int i = 0; i < steps.size(); i++) {
      assertEquals(scan(steps, at, i, at[i] - width), minimum.lowestFrom(at[i] - width));
      minimum.add(at[i], steps.get(i).value());
    }
  }

  /** Exactly the width before counts; the closing result counts, and nothing before it. */
  @Property(tries = 500)
  void windowsLookBackToTheirWidthAndNotPastAClosing(@ForAll("steps") List<Step> steps) {
    Window window = new Window(Policies.criteria(10, 25), steps.size());
    long[] at = times(steps);
    long floor = Long.MIN_VALUE;

    for (int i = 0; i < steps.size(); i++) {
      assertEquals(scan(steps, at, i, Math.max(floor, at[i] - 10)), window.lowestForRise(at[i]));
      assertEquals(scan(steps, at, i, Math.max(floor, at[i] - 25)), window.lowestForRatio(at[i]));
      if (steps.get(i).closes()) {
        floor = at[i];
        window.closeAt(at[i]);
      }
      window.add(at[i], steps.get(i).value());
    }
  }

  @Provide
  Arbitrary<Integer> widths() {
    return Arbitraries.integers().between(0, 60);
  }

  private static long[] times(List<Step> steps) {
    long[] at = new long[steps.size()];
    long now = 0;
    for (int i = 0; i < at.length; i++) {
      now += steps.get(i).later();
      at[i] = now;
    }
    return at;
  }

  private static long scan(List<Step> steps, long[] at, int before, long from) {
    long lowest = SlidingMinimum.NONE;
    for (int i = 0; i < before; i++) {
      if (at[i] >= from) {
        lowest = Math.min(lowest, steps.get(i).value());
      }
    }
    return lowest;
  }
}
