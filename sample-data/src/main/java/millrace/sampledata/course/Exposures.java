package millrace.sampledata.course;

import java.util.ArrayList;
import java.util.List;
import millrace.sampledata.scenario.Drug;
import millrace.sampledata.scenario.DrugClass;
import millrace.sampledata.scenario.Planted;

/** The exposed times of one patient, by drug, over all admissions. */
final class Exposures {
  private static final long HOUR = 3600;
  private static final int DRUGS = Drug.values().length;

  private final List<Window> windows = new ArrayList<>();
  private final Window[] latest = new Window[DRUGS];

  /** Adds a dose; the doses of one drug must come in order of time. */
  void add(Dose dose) {
    Drug drug = dose.drug();
    DrugClass drugClass = drug.drugClass();
    if (!dose.exposes() || drugClass == DrugClass.UNWATCHED) {
      return;
    }
    long from = dose.startedAt() + drugClass.lagHours() * HOUR;
    long to = Math.max(dose.startedAt(), dose.endedAt()) + drugClass.lookBackDays() * 24 * HOUR;
    Window last = latest[drug.ordinal()];
    if (last != null && from <= last.to) {
      last.to = Math.max(last.to, to);
    } else {
      latest[drug.ordinal()] = new Window(from, to, Planted.bit(drugClass));
      windows.add(latest[drug.ordinal()]);
    }
  }

  /** Mask of the classes that expose at an instant. */
  int maskAt(long at) {
    int mask = 0;
    for (Window window : windows) {
      if (window.from <= at && at < window.to) {
        mask |= window.bit;
      }
    }
    return mask;
  }

  /** Hands every start and end to the walk. */
  void boundaries(Boundaries boundaries) {
    for (Window window : windows) {
      boundaries.add(window.from);
      boundaries.add(window.to);
    }
  }

  private static final class Window {
    private final long from;
    private final int bit;
    private long to;

    private Window(long from, long to, int bit) {
      this.from = from;
      this.to = to;
      this.bit = bit;
    }
  }
}
