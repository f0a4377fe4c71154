package millrace.analytics.spark;

import java.io.IOException;
import java.nio.file.DirectoryNotEmptyException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import millrace.analytics.exposure.Combination;
import millrace.analytics.mart.Cautions;
import millrace.analytics.mart.ManifestFile;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RunManifest;
import millrace.etl.check.Accounting;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.ReadExtract;

/**
 * Publishes a run: tables under a temporary name, checked, renamed, and then the one-line file that
 * names the served run replaced in one move. Whoever kills the program at any instant leaves the
 * run before served.
 */
final class MartPublisher {
  private static final String UNFINISHED = ".unfinished-";
  private static final DateTimeFormatter STAMP =
      DateTimeFormatter.ofPattern("yyyyMMdd'T'HHmmssSSS").withZone(ZoneOffset.UTC);
  private static final int FINGERPRINT_LENGTH = 8;

  private final MartFolder mart;
  private final String stamp;
  private final Path unfinished;

  private MartPublisher(MartFolder mart, String stamp) {
    this.mart = mart;
    this.stamp = stamp;
    this.unfinished = mart.runs().resolve(UNFINISHED + stamp);
  }

  /**
   * Starts an unfinished run, and clears away those that were cut off; the lock shows that no other
   * run is writing.
   */
  static MartPublisher start(Path path, MartLock lock) throws IOException {
    lock.requireHeld();
    MartFolder mart = new MartFolder(path);
    Files.createDirectories(mart.runs());
    try (Stream<Path> runs = Files.list(mart.runs())) {
      for (Path run :
          runs.filter(r -> r.getFileName().toString().startsWith(UNFINISHED)).toList()) {
        delete(run);
      }
    }
    MartPublisher publisher = new MartPublisher(mart, STAMP.format(Instant.now()));
    Files.createDirectories(publisher.unfinished);
    return publisher;
  }

  /** Where the tables go. */
  Path unfinished() {
    return unfinished;
  }

  /** The manifest, with the rows that are really in each table. */
  RunManifest manifest(
      RunPlan plan, ReadExtract extract, Map<ContractTable, Accounting.Line> accounts)
      throws IOException {
    var descriptor = extract.descriptor();
    List<RunManifest.TableAccount> accounting = new ArrayList<>();
    for (ContractTable table : ContractTable.values()) {
      Accounting.Line line = accounts.get(table);
      accounting.add(
          new RunManifest.TableAccount(
              table.tableName(), line.read(), line.kept(), line.merged(), line.quarantined()));
    }
    return new RunManifest(
        "r-" + stamp + "-" + extract.fingerprint().substring(0, FINGERPRINT_LENGTH),
        ProgramVersion.text(),
        Instant.now().toString(),
        descriptor.site(),
        descriptor.cover().zone().getId(),
        descriptor.cover().fromDate().toString(),
        descriptor.cover().toDate().toString(),
        descriptor.title(),
        descriptor.description(),
        new RunManifest.Extract(
            extract.fingerprint(),
            extract.files().stream()
                .map(
                    f ->
                        new RunManifest.SourceFile(
                            f.table().tableName(),
                            f.path(),
                            f.survey().bytes(),
                            f.survey().sha256()))
                .toList()),
        plan.policy().settings(),
        new RunManifest.DrugListsUsed(
            plan.subjects().watchlist().agents(),
            plan.subjects().watchlist().classes(),
            plan.subjects().combinations().stream().map(Combination::name).toList()),
        accounting,
        List.of(),
        rowsOfTables(),
        Cautions.SENTENCES);
  }

  /** Checks the tables against the accounts, renames the run and lets it be served. */
  RunManifest publish(RunManifest manifest, StageClock clock) throws IOException {
    check(manifest);
    RunManifest timed =
        new RunManifest(
            manifest.runId(),
            manifest.version(),
            manifest.finishedAt(),
            manifest.site(),
            manifest.zone(),
            manifest.coversFrom(),
            manifest.coversTo(),
            manifest.title(),
            manifest.description(),
            manifest.extract(),
            manifest.policySettings(),
            manifest.watchlist(),
            manifest.accounting(),
            clock.ended(),
            manifest.tables(),
            manifest.cautions());
    ManifestFile.write(unfinished, timed);
    Files.move(unfinished, mart.run(manifest.runId()), StandardCopyOption.ATOMIC_MOVE);
    Path next = mart.path().resolve(".CURRENT-" + stamp);
    Files.writeString(next, manifest.runId() + "\n");
    Files.move(
        next,
        mart.currentFile(),
        StandardCopyOption.ATOMIC_MOVE,
        StandardCopyOption.REPLACE_EXISTING);
    return timed;
  }

  /** Removes what was not published; nothing after publishing. */
  void discard() throws IOException {
    delete(unfinished);
  }

  private Map<String, Long> rowsOfTables() throws IOException {
    Map<String, Long> rows = new LinkedHashMap<>();
    for (MartTable table : MartTable.values()) {
      rows.put(table.tableName(), ParquetRows.count(unfinished.resolve(table.tableName())));
    }
    return rows;
  }

  private static void check(RunManifest manifest) {
    long quarantined =
        manifest.accounting().stream().mapToLong(RunManifest.TableAccount::quarantined).sum();
    long admissions =
        manifest.accounting().stream()
            .filter(a -> a.table().equals(ContractTable.ADMISSIONS.tableName()))
            .mapToLong(RunManifest.TableAccount::kept)
            .sum();
    expect(manifest, MartTable.QUARANTINE, quarantined);
    expect(manifest, MartTable.ADMISSIONS, admissions);
  }

  private static void expect(RunManifest manifest, MartTable table, long expected) {
    long written = manifest.tables().get(table.tableName());
    if (written != expected) {
      throw RunException.failed(
          "the table "
              + table.tableName()
              + " has "
              + written
              + " rows and should have "
              + expected
              + "; is the disk full? The run before is still served",
          null);
    }
  }

  private static void delete(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return;
    }
    try (Stream<Path> tree = Files.walk(folder)) {
      for (Path path : tree.sorted(Comparator.reverseOrder()).toList()) {
        Files.deleteIfExists(path);
      }
    } catch (DirectoryNotEmptyException e) {
      throw new IOException(folder + " is still being written to", e);
    }
  }
}
