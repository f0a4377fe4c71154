package millrace.analytics.risk;

import java.util.Arrays;

/**
 * Sums by cell: seconds at risk, counted episodes, those of stage 2 or 3. Open addressing on packed
 * cells, since a run adds hundreds of millions of times. Not for several threads.
 */
public final class CellTable {
  private static final int FIRST_SIZE = 1 << 12;
  private long[] cells = new long[FIRST_SIZE];
  private long[] seconds = new long[FIRST_SIZE];
  private int[] episodes = new int[FIRST_SIZE];
  private int[] stage2plus = new int[FIRST_SIZE];
  private boolean[] used = new boolean[FIRST_SIZE];
  private int size;

  /** Takes one cell and its sums. */
  public interface Visitor {
    /** One cell. */
    void cell(long packed, long seconds, int episodes, int stage2plus);
  }

  /** Number of cells. */
  public int size() {
    return size;
  }

  /** Adds time. */
  public void addSeconds(long packed, long more) {
    int slot = slot(packed);
    seconds[slot] += more;
  }

  /** Adds sums. */
  public void add(long packed, long moreSeconds, int moreEpisodes, int moreStage2plus) {
    int slot = slot(packed);
    seconds[slot] += moreSeconds;
    episodes[slot] += moreEpisodes;
    stage2plus[slot] += moreStage2plus;
  }

  /** Adds a counted episode. */
  public void addEpisode(long packed, boolean stage2or3) {
    int slot = slot(packed);
    episodes[slot]++;
    stage2plus[slot] += stage2or3 ? 1 : 0;
  }

  /** Visits all cells, in no order. */
  public void forEach(Visitor visitor) {
    for (int i = 0; i < cells.length; i++) {
      if (used[i]) {
        visitor.cell(cells[i], seconds[i], episodes[i], stage2plus[i]);
      }
    }
  }

  private int slot(long packed) {
    int at = find(packed);
    if (!used[at]) {
      if (size * 2 >= cells.length) {
        grow();
        at = find(packed);
      }
      used[at] = true;
      cells[at] = packed;
      size++;
    }
    return at;
  }

  private int find(long packed) {
    long mixed = packed * 0x9E3779B97F4A7C15L;
    int at = (int) (mixed >>> 32) & (cells.length - 1);
    while (used[at] && cells[at] != packed) {
      at = (at + 1) & (cells.length - 1);
    }
    return at;
  }

  private void grow() {
    long[] oldCells = cells;
    long[] oldSeconds = seconds;
    int[] oldEpisodes = episodes;
    int[] oldStages = stage2plus;
    boolean[] oldUsed = used;
    int larger = oldCells.length * 2;
    cells = new long[larger];
    seconds = new long[larger];
    episodes = new int[larger];
    stage2plus = new int[larger];
    used = new boolean[larger];
    for (int i = 0; i < oldCells.length; i++) {
      if (oldUsed[i]) {
        int at = find(oldCells[i]);
        used[at] = true;
        cells[at] = oldCells[i];
        seconds[at] = oldSeconds[i];
        episodes[at] = oldEpisodes[i];
        stage2plus[at] = oldStages[i];
      }
    }
  }

  /** Forgets everything. */
  public void clear() {
    Arrays.fill(used, false);
    Arrays.fill(seconds, 0);
    Arrays.fill(episodes, 0);
    Arrays.fill(stage2plus, 0);
    size = 0;
  }
}
