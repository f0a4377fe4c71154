package millrace.sampledata.write;

import millrace.sampledata.course.Chart;
import millrace.sampledata.scenario.Chance;

/** Writes the rows of a patient into the buffers of a part. */
public final class PatientWriter {
  private final ChartRows chartRows;
  private final PersonRows personRows;

  /**
   * A writer into buffers.
   *
   * @param buffers the buffers of the part
   */
  public PatientWriter(Buffers buffers) {
    this.chartRows = new ChartRows(buffers);
    this.personRows = new PersonRows(buffers);
  }

  /**
   * Writes a patient.
   *
   * @param chart what happened
   * @param chance dice for what only the writing decides
   */
  public void write(Chart chart, Chance chance) {
    chartRows.write(chart);
    personRows.write(chart, chance);
  }
}
