package millrace.analytics.spark;

import org.apache.spark.scheduler.SparkListener;
import org.apache.spark.scheduler.SparkListenerStageSubmitted;
import org.apache.spark.scheduler.SparkListenerTaskEnd;

/** Counts the tasks of the current step from Spark's events. */
final class TaskListener extends SparkListener {
  private final Progress progress;
  private int done;
  private int known;

  TaskListener(Progress progress) {
    this.progress = progress;
  }

  synchronized void step(String name) {
    done = 0;
    known = 0;
    progress.step(name);
  }

  @Override
  public synchronized void onStageSubmitted(SparkListenerStageSubmitted stage) {
    known += stage.stageInfo().numTasks();
    progress.tasks(done, known);
  }

  @Override
  public synchronized void onTaskEnd(SparkListenerTaskEnd task) {
    done++;
    progress.tasks(Math.min(done, known), known);
  }
}
