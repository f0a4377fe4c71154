package millrace.analytics.command;

import java.io.PrintStream;
import millrace.analytics.spark.Progress;

/** Progress for programs: one JSON object a line, with the step, its place and its tasks. */
final class JsonProgress implements Progress {
  private final PrintStream out;
  private String step = "";

  JsonProgress(PrintStream out) {
    this.out = out;
  }

  @Override
  public synchronized void step(String name) {
    step = name;
    line(0, 0);
  }

  @Override
  public synchronized void tasks(int done, int known) {
    if (!step.isEmpty()) {
      line(done, known);
    }
  }

  @Override
  public synchronized void end() {
    step = "";
  }

  /** The step's name is one of a fixed list and needs no escape. */
  private void line(int done, int known) {
    out.printf(
        "{\"step\":\"%s\",\"number\":%d,\"steps\":%d,\"tasksDone\":%d,\"tasksKnown\":%d}%n",
        step, STEPS.indexOf(step) + 1, STEPS.size(), done, known);
    out.flush();
  }
}
