package millrace.analytics.spark;

import java.util.ArrayList;
import java.util.List;
import millrace.analytics.mart.RunManifest.StageTime;

/** How long each stage of a run took. */
final class StageClock {
  private static final double NANOS = 1e9;

  private final List<StageTime> ended = new ArrayList<>();
  private String current = "";
  private long startedAt;

  /** A stage starts, and the one before ends. */
  void start(String stage) {
    long now = System.nanoTime();
    if (!current.isEmpty()) {
      ended.add(new StageTime(current, (now - startedAt) / NANOS));
    }
    current = stage;
    startedAt = now;
  }

  /** The stages that have ended. */
  List<StageTime> ended() {
    return List.copyOf(ended);
  }
}
