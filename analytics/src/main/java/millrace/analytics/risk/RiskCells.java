package millrace.analytics.risk;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import millrace.analytics.episode.Episode;
import millrace.analytics.exposure.Exposure;
import millrace.analytics.timeline.IntervalSet;
import millrace.analytics.timeline.Occupancy;

/**
 * Cuts time at risk at every change of day, unit, recent hypotension and burden and adds it up by
 * cell, once as a whole and once for each exposing subject; episodes go to the cells of their onset
 * (methods 6 to 8). Not for several threads.
 */
public final class RiskCells {
  private final LocalDays days;
  private final Map<String, Integer> unitNumbers;
  private final long dayBeforeSeconds;
  private final CellTable table;

  /**
   * Cells into a table.
   *
   * @param unitNumbers number of every unit, with that of {@link Occupancy#UNASSIGNED} and {@link
   *     Occupancy#NOWHERE}
   */
  public RiskCells(
      LocalDays days, Map<String, Integer> unitNumbers, long dayBeforeSeconds, CellTable table) {
    this.days = days;
    this.unitNumbers = unitNumbers;
    this.dayBeforeSeconds = dayBeforeSeconds;
    this.table = table;
  }

  /** What strata a patient's instants have. */
  public record Strata(Occupancy occupancy, Exposure exposure, IntervalSet recentHypotension) {}

  /** Adds the time at risk of one admission, and its counted episode. */
  public void add(RiskTime risk, Strata strata, List<Episode> episodes) {
    for (Attribution attribution : Attribution.values()) {
      long shift = attribution == Attribution.DAY_BEFORE ? dayBeforeSeconds : 0;
      long[] cuts = cuts(risk, strata, shift);
      for (int i = 0; i + 1 < cuts.length; i++) {
        addPiece(cuts[i], cuts[i + 1], attribution, shift, strata);
      }
      risk.countedEpisode().ifPresent(e -> addEpisode(episodes.get(e), attribution, shift, strata));
    }
  }

  private void addPiece(long from, long to, Attribution attribution, long shift, Strata strata) {
    long cell = cell(from, attribution, shift, strata);
    table.addSeconds(cell, to - from);
    strata
        .exposure()
        .sets()
        .forEach(
            (subject, set) -> {
              long exposed = set.overlapSeconds(from, to);
              if (exposed > 0) {
                table.addSeconds(RiskCell.withSubject(cell, subject), exposed);
              }
            });
  }

  private void addEpisode(Episode episode, Attribution attribution, long shift, Strata strata) {
    long onset = episode.span().onset();
    boolean stage2or3 = episode.stage() >= 2;
    long cell = cell(onset, attribution, shift, strata);
    table.addEpisode(cell, stage2or3);
    strata
        .exposure()
        .sets()
        .forEach(
            (subject, set) -> {
              if (set.contains(onset)) {
                table.addEpisode(RiskCell.withSubject(cell, subject), stage2or3);
              }
            });
  }

  private long cell(long instant, Attribution attribution, long shift, Strata strata) {
    return new RiskCell(
            days.dayOf(instant),
            unitNumbers.get(strata.occupancy().unitAt(instant - shift)),
            attribution,
            RiskCell.ALL,
            strata.recentHypotension().contains(instant),
            strata.exposure().burdenAt(instant))
        .packed();
  }

  /** Start, end and every instant between them at which a cell may change, in order. */
  private long[] cuts(RiskTime risk, Strata strata, long shift) {
    Cuts cuts = new Cuts(risk.from(), risk.to());
    for (long day = days.endOfDay(risk.from()); day < risk.to(); day = days.endOfDay(day)) {
      cuts.add(day);
    }
    for (long change : strata.occupancy().changes()) {
      cuts.add(change + shift);
    }
    cuts.addAll(strata.recentHypotension());
    strata.exposure().burdenSets().forEach(cuts::addAll);
    return cuts.sorted();
  }

  private static final class Cuts {
    private final long from;
    private final long to;
    private long[] instants = new long[32];
    private int size;

    Cuts(long from, long to) {
      this.from = from;
      this.to = to;
      instants[size++] = from;
      instants[size++] = to;
    }

    void add(long instant) {
      if (instant > from && instant < to) {
        if (size == instants.length) {
          instants = Arrays.copyOf(instants, size * 2);
        }
        instants[size++] = instant;
      }
    }

    void addAll(IntervalSet set) {
      for (int i = 0; i < set.size(); i++) {
        add(set.from(i));
        add(set.to(i));
      }
    }

    long[] sorted() {
      return Arrays.stream(instants, 0, size).sorted().distinct().toArray();
    }
  }
}
