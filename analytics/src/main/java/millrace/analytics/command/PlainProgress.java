package millrace.analytics.command;

import java.io.PrintStream;
import millrace.analytics.spark.Progress;

/**
 * Progress for people: a bar on standard error that redraws itself on a terminal, a line a step on
 * standard output elsewhere.
 */
final class PlainProgress implements Progress {
  private static final int WIDTH = 30;

  private final PrintStream out;
  private final boolean terminal;
  private String step = "";

  PlainProgress(boolean terminal) {
    this.out = terminal ? System.err : System.out;
    this.terminal = terminal;
  }

  @Override
  public synchronized void step(String name) {
    step = name;
    if (terminal) {
      draw(0, 0);
    } else {
      out.println("[" + (STEPS.indexOf(name) + 1) + "/" + STEPS.size() + "] " + name);
    }
  }

  @Override
  public synchronized void tasks(int done, int known) {
    if (terminal && !step.isEmpty()) {
      draw(done, known);
    }
  }

  @Override
  public synchronized void end() {
    if (terminal && !step.isEmpty()) {
      out.print("\r" + " ".repeat(WIDTH + 50) + "\r");
      out.flush();
    }
    step = "";
  }

  private void draw(int done, int known) {
    int filled = known == 0 ? 0 : WIDTH * done / known;
    String bar = "=".repeat(filled) + " ".repeat(WIDTH - filled);
    String tasks = known == 0 ? "" : done + " of " + known;
    out.printf("\r[%s] %d/%d %-10s %-16s", bar, STEPS.indexOf(step) + 1, STEPS.size(), step, tasks);
    out.flush();
  }
}
