package millrace.sampledata.dirt;

import millrace.sampledata.course.Chart;
import millrace.sampledata.scenario.Chance;
import millrace.sampledata.write.Buffers;

/**
 * One way in which a real extract goes wrong: adds a row, and leaves the clean rows as they are.
 */
@FunctionalInterface
interface Fault {
  /** Adds the row beside the clean rows of a patient. */
  void plant(Chart chart, Chance chance, Buffers buffers);
}
