package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;

/** A patient's true creatinine over time, as a factor of the usual value. */
final class CreatinineCourse {
  private static final double GRADUAL_FACTOR_PER_DAY = 0.042;

  private final List<Injury> injuries = new ArrayList<>();
  private long gradualFrom;
  private long gradualTo;

  void add(Injury injury) {
    injuries.add(injury);
  }

  /** Lets the creatinine creep up in a time, too slowly for any seven days to show it. */
  void creep(long from, long to) {
    gradualFrom = from;
    gradualTo = to;
  }

  /** The factor at an instant. */
  double factorAt(long at) {
    double factor = 1;
    for (Injury injury : injuries) {
      double own = injury.factorAt(at);
      factor = own > factor || factor == 1 ? own : factor;
    }
    if (at > gradualFrom && at < gradualTo) {
      factor *= 1 + GRADUAL_FACTOR_PER_DAY * (at - gradualFrom) / 86_400.0;
    }
    return factor;
  }
}
