package millrace.sampledata.dirt;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Stream;
import millrace.sampledata.course.Chart;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;

/**
 * Plants a fault beside the rows of every fourth patient, of every patient in a small extract:
 * among as many faults in a row as there are kinds each occurs once, in an order drawn anew, so
 * that the smallest extract shows them all.
 */
public final class DirtPlanter {
  private static final List<Fault> FAULTS =
      Stream.of(
              ResultFaults.all(),
              DoseFaults.all(),
              PressureFaults.all(),
              StayFaults.all(),
              OtherFaults.all())
          .flatMap(List::stream)
          .toList();

  private static final long SMALL_PATIENTS = 1000;
  private static final long STREAM = 1L << 40;

  private final long seed;
  private final long stride;
  private final Buffers buffers;
  private long turn = -1;
  private List<Fault> order = List.of();

  /**
   * A planter into the buffers of a part.
   *
   * @param seed seed of the extract
   * @param patients patients of the extract
   * @param buffers the buffers
   */
  public DirtPlanter(long seed, long patients, Buffers buffers) {
    this.seed = seed;
    this.stride = patients < SMALL_PATIENTS ? 1 : 4;
    this.buffers = buffers;
  }

  /**
   * Plants the fault of a patient whose turn it is.
   *
   * @param number number of the patient
   * @param chart what happened; its rows are in the buffers already
   * @param chance dice of their own, so that faults change nothing else
   */
  public void plant(long number, Chart chart, Chance chance) {
    if (number % stride != 0) {
      return;
    }
    long planted = number / stride;
    if (planted / FAULTS.size() != turn) {
      turn = planted / FAULTS.size();
      order = drawOrder(Chance.of(seed, STREAM + turn));
    }
    order.get((int) (planted % FAULTS.size())).plant(chart, chance, buffers);
  }

  private static List<Fault> drawOrder(Chance chance) {
    List<Fault> order = new ArrayList<>(FAULTS);
    for (int index = order.size() - 1; index > 0; index--) {
      Collections.swap(order, index, chance.below(index + 1));
    }
    return order;
  }
}
