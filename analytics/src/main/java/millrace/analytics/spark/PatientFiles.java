package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import millrace.analytics.mart.AdmissionRow;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.GradualRiseRow;
import millrace.analytics.mart.LinkRow;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.PressureLine;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.mart.ReplacementLine;
import millrace.analytics.mart.ResultLine;
import millrace.analytics.mart.StayLine;
import millrace.analytics.patient.PatientOutcome;

/** The files of one partition of patients: a part of each table that has rows by patient. */
final class PatientFiles implements AutoCloseable {
  private final int part;
  private final TableFile<AdmissionRow> admissions;
  private final TableFile<EpisodeRow> episodes;
  private final TableFile<GradualRiseRow> gradualRises;
  private final TableFile<LinkRow> links;
  private final TableFile<QuarantineRow> quarantine;
  private final TableFile<ResultLine> results;
  private final TableFile<DoseLine> doses;
  private final TableFile<PressureLine> pressures;
  private final TableFile<StayLine> stays;
  private final TableFile<ReplacementLine> replacements;
  private int lastEpisode;

  /**
   * Files of a partition.
   *
   * @param run folder of the unfinished run
   * @param part number of the partition
   */
  PatientFiles(Path run, int part) {
    this.part = part;
    admissions = file(AdmissionRow.class, run, MartTable.ADMISSIONS);
    episodes = file(EpisodeRow.class, run, MartTable.EPISODES);
    gradualRises = file(GradualRiseRow.class, run, MartTable.GRADUAL_RISES);
    links = file(LinkRow.class, run, MartTable.LINKS);
    quarantine = file(QuarantineRow.class, run, MartTable.QUARANTINE);
    results = file(ResultLine.class, run, MartTable.RESULTS);
    doses = file(DoseLine.class, run, MartTable.DOSES);
    pressures = file(PressureLine.class, run, MartTable.PRESSURES);
    stays = file(StayLine.class, run, MartTable.STAYS);
    replacements = file(ReplacementLine.class, run, MartTable.REPLACEMENTS);
  }

  /**
   * Writes the rows of a patient; episodes get their ids here, which tell nothing of the patient.
   */
  void write(PatientOutcome outcome) throws IOException {
    admissions.writeAll(outcome.admissions());
    for (EpisodeRow episode : outcome.episodes()) {
      lastEpisode++;
      episodes.write(episode.withEpisodeId("e-" + (part + 1) + "-" + lastEpisode));
    }
    gradualRises.writeAll(outcome.gradualRises());
    links.writeAll(outcome.links());
    quarantine.writeAll(outcome.quarantine());
    results.writeAll(outcome.results());
    doses.writeAll(outcome.doses());
    pressures.writeAll(outcome.pressures());
    stays.writeAll(outcome.stays());
    replacements.writeAll(outcome.replacements());
  }

  @Override
  public void close() throws IOException {
    for (TableFile<?> file :
        List.of(
            admissions,
            episodes,
            gradualRises,
            links,
            quarantine,
            results,
            doses,
            pressures,
            stays,
            replacements)) {
      file.close();
    }
  }

  private <T extends Record> TableFile<T> file(Class<T> rowType, Path run, MartTable table) {
    return new TableFile<>(rowType, run.resolve(table.tableName()), part);
  }
}
