package millrace.analytics.stats;

import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.LongRange;

class PoissonRatePropertiesTest {
  @Property(tries = 300)
  void limitsRiseWithTheCount(@ForAll @LongRange(min = 0, max = 1_000_000) long events) {
    Limits fewer = PoissonRate.garwood(events, 0.95);
    Limits more = PoissonRate.garwood(events + 1, 0.95);

    assertTrue(more.lower() > fewer.lower(), () -> fewer + " " + more);
    assertTrue(more.upper() > fewer.upper(), () -> fewer + " " + more);
  }

  @Property(tries = 300)
  void limitsHoldTheRateBetweenThem(
      @ForAll @LongRange(min = 0, max = 1_000_000) long events,
      @ForAll @DoubleRange(min = -6, max = 9) double powerOfTen) {
    PoissonRate rate = new PoissonRate(events, Math.pow(10, powerOfTen));
    Limits limits = rate.limits(0.95).orElseThrow();
    double value = rate.value().orElseThrow();

    assertTrue(events == 0 ? limits.lower() == 0 : limits.lower() < value, limits::toString);
    assertTrue(value < limits.upper(), limits::toString);
  }

  @Property(tries = 300)
  void moreConfidenceWidensTheLimits(
      @ForAll @LongRange(min = 1, max = 1_000_000) long events,
      @ForAll @DoubleRange(min = 0.5, max = 0.94) double confidence) {
    Limits narrow = PoissonRate.garwood(events, confidence);
    Limits wide = PoissonRate.garwood(events, 0.95);

    assertTrue(wide.lower() < narrow.lower(), () -> narrow + " " + wide);
    assertTrue(wide.upper() > narrow.upper(), () -> narrow + " " + wide);
  }
}
