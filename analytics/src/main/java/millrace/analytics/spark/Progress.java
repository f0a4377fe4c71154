package millrace.analytics.spark;

import java.util.List;

/** Told how far a run is. */
public interface Progress {
  /** The steps of a run, in order. */
  List<String> STEPS = List.of("survey", "admissions", "patients", "rates", "tables", "publish");

  /** A step starts. */
  void step(String name);

  /**
   * Tasks of the current step.
   *
   * @param done tasks that have ended
   * @param known tasks known so far
   */
  void tasks(int done, int known);

  /** The run has ended, well or not. */
  void end();
}
