package millrace.analytics.spark;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.fixture.ExtractCopy;
import millrace.analytics.fixture.Runs;
import millrace.analytics.fixture.SmallExtract;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RunManifest.TableAccount;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Sums that must agree with each other over a whole run, to the row and to the second. */
final class RunAccountsTest {
  @TempDir private static Path folder;
  private static Exports exports;

  @BeforeAll
  static void run() {
    exports = Runs.run(SmallExtract.FOLDER, folder.resolve("mart"), Optional.empty());
  }

  @Test
  void everyRowReadIsKeptMergedOrQuarantined() {
    ExtractCopy extract = ExtractCopy.of(SmallExtract.FOLDER);
    for (TableAccount account : exports.manifest().accounting()) {
      assertEquals(extract.records(account.table()), account.read(), account.table());
      assertEquals(
          account.read(),
          account.kept() + account.merged() + account.quarantined(),
          account.table());
      assertEquals(
          exports.rows(ExportTable.QUARANTINE, "table", account.table()).size(),
          account.quarantined(),
          account.table());
    }
  }

  @Test
  void everyKeptAdmissionHasARowAndAClass() {
    long kept =
        exports.manifest().accounting().stream()
            .filter(a -> a.table().equals("admissions"))
            .mapToLong(TableAccount::kept)
            .sum();

    assertEquals(kept, exports.rows(ExportTable.ADMISSIONS).size());
    for (Map<String, String> flow : exports.rows(ExportTable.FLOW)) {
      List<Map<String, String>> own =
          exports.rows(ExportTable.ADMISSIONS, "class", flow.get("class"));
      assertEquals(Long.parseLong(flow.get("admissions")), own.size(), flow.get("class"));
      assertTrue(
          own.stream()
              .allMatch(
                  a -> a.get("at_risk_days").isEmpty() != flow.get("class").equals("eligible")));
    }
    assertEquals(5, exports.rows(ExportTable.FLOW).size());
  }

  @ParameterizedTest
  @ValueSource(strings = {"at-onset", "day-before"})
  void timeOfUnitsAndMonthsIsThatOfAdmissions(String attribution) {
    long byUnit =
        exports.rows(ExportTable.UNIT_RATES, "attribution", attribution).stream()
            .mapToLong(r -> seconds(r.get("at_risk_days")))
            .sum();

    assertTrue(atRisk() > 0);
    assertEquals(atRisk(), byUnit);
  }

  @ParameterizedTest
  @ValueSource(strings = {"at-onset", "day-before"})
  void episodesOfUnitsAndMonthsAreThoseThatCount(String attribution) throws IOException {
    AtomicLong counted = new AtomicLong();
    forEach(MartTable.EPISODES, row -> counted.addAndGet(row.getBoolean("counted", 0) ? 1 : 0));
    long byUnit =
        exports.rows(ExportTable.UNIT_RATES, "attribution", attribution).stream()
            .mapToLong(r -> Long.parseLong(r.get("episodes")))
            .sum();

    assertTrue(byUnit > 0);
    assertEquals(counted.get(), byUnit);
  }

  @Test
  void exposedAndUnexposedAreTheWholeForEverySubject() {
    long episodes =
        exports.rows(ExportTable.UNIT_RATES, "attribution", "at-onset").stream()
            .mapToLong(r -> Long.parseLong(r.get("episodes")))
            .sum();
    for (Map<String, String> row : exports.rows(ExportTable.DRUG_RATES)) {
      assertEquals(
          atRisk(),
          seconds(row.get("exposed_days")) + seconds(row.get("unexposed_days")),
          row.get("subject"));
      assertEquals(
          episodes,
          Long.parseLong(row.get("exposed_episodes"))
              + Long.parseLong(row.get("unexposed_episodes")),
          row.get("subject"));
    }
  }

  @Test
  void burdenLevelsDivideTheTime() {
    long exposed =
        exports.rows(ExportTable.DRUG_RATES, "level", "burden").stream()
            .mapToLong(r -> seconds(r.get("exposed_days")))
            .sum();

    assertEquals(atRisk(), exposed);
  }

  @Test
  void cubeHoldsTheTimeOfBothAttributions() throws IOException {
    AtomicLong seconds = new AtomicLong();
    forEach(
        MartTable.RISK_CUBE,
        row ->
            seconds.addAndGet(
                row.getString("level", 0).equals("all") ? row.getLong("at_risk_seconds", 0) : 0));

    assertEquals(2 * atRisk(), seconds.get());
  }

  @ParameterizedTest
  @EnumSource(MartTable.class)
  void manifestTellsTheRowsOfEveryTable(MartTable table) throws IOException {
    AtomicLong rows = new AtomicLong();
    forEach(table, row -> rows.incrementAndGet());

    assertEquals(rows.get(), exports.manifest().tables().get(table.tableName()));
  }

  @Test
  void linkedAgentsOfAnEpisodeAreItsLinks() {
    for (Map<String, String> episode : exports.rows(ExportTable.EPISODES)) {
      String links =
          exports.of(ExportTable.LINKS, episode.get("patient_id")).stream()
              .filter(l -> l.get("onset_at").equals(episode.get("onset_at")))
              .map(l -> l.get("agent"))
              .reduce((a, b) -> a + ";" + b)
              .orElse("");
      assertEquals(episode.get("linked_agents"), links);
    }
  }

  private static long atRisk() {
    return exports.rows(ExportTable.ADMISSIONS, "class", "eligible").stream()
        .mapToLong(r -> seconds(r.get("at_risk_days")))
        .sum();
  }

  /** Six decimals of a day are less than a tenth of a second. */
  private static long seconds(String days) {
    return Math.round(Double.parseDouble(days) * 86_400);
  }

  private static void forEach(
      MartTable table, java.util.function.Consumer<org.apache.parquet.example.data.Group> row)
      throws IOException {
    MartFolder mart = new MartFolder(folder.resolve("mart"));
    ParquetRows.forEach(mart.table(mart.current().orElseThrow(), table), row);
  }
}
