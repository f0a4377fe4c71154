package millrace.analytics.mart;

import java.util.List;
import java.util.Map;

/**
 * What {@code run.json} says of a published run.
 *
 * @param runId the run's id
 * @param version version of the program
 * @param finishedAt when it was published, ISO-8601 UTC
 * @param site short name of the hospital
 * @param zone zone of the extract
 * @param coversFrom first local date covered
 * @param coversTo local date after the last one covered
 * @param title title of the extract; may be empty
 * @param description description of the extract; may be empty
 * @param extract the files it was computed from
 * @param policySettings every setting used, by its name in a policy file
 * @param watchlist agents watched, classes and combinations
 * @param accounting rows by table and fate
 * @param stages seconds by stage
 * @param tables rows of each published table
 * @param cautions what a reader must keep in mind
 */
public record RunManifest(
    String runId,
    String version,
    String finishedAt,
    String site,
    String zone,
    String coversFrom,
    String coversTo,
    String title,
    String description,
    Extract extract,
    Map<String, String> policySettings,
    DrugListsUsed watchlist,
    List<TableAccount> accounting,
    List<StageTime> stages,
    Map<String, Long> tables,
    List<String> cautions) {
  /** The extract. */
  public record Extract(String fingerprint, List<SourceFile> files) {}

  /** A file of the extract. */
  public record SourceFile(String table, String path, long bytes, String sha256) {}

  /** What was watched. */
  public record DrugListsUsed(
      List<String> agents, List<String> classes, List<String> combinations) {}

  /** Rows of a table of the extract: read = kept + merged + quarantined. */
  public record TableAccount(String table, long read, long kept, long merged, long quarantined) {}

  /** Time that a stage took. */
  public record StageTime(String name, double seconds) {}
}
