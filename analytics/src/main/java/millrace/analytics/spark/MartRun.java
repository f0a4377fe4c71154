package millrace.analytics.spark;

import static millrace.analytics.mart.MartTable.CLASS_PRESSURE;
import static millrace.analytics.mart.MartTable.DRUG_RATES;
import static millrace.analytics.mart.MartTable.FINDINGS;
import static millrace.analytics.mart.MartTable.FLOW;
import static millrace.analytics.mart.MartTable.MONITORING;
import static millrace.analytics.mart.MartTable.TESTING;
import static millrace.analytics.mart.MartTable.UNITS;
import static millrace.analytics.mart.MartTable.UNIT_PRESSURE;
import static millrace.analytics.mart.MartTable.UNIT_RATES;

import java.io.IOException;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import millrace.analytics.mart.ClassPressureRow;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.FlowRow;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.MonitoringRow;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.mart.RunManifest;
import millrace.analytics.mart.TestingRow;
import millrace.analytics.mart.UnitPressureRow;
import millrace.analytics.mart.UnitRateRow;
import millrace.analytics.mart.UnitRow;
import millrace.analytics.patient.PatientAnalyst;
import millrace.analytics.patient.RunContext;
import millrace.analytics.patient.Tally;
import millrace.analytics.rates.RateTables;
import millrace.etl.check.Accounting;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.ExtractFile;
import millrace.etl.spark.ExtractReader;
import millrace.etl.spark.ReadExtract;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;

/** A run from the files of an extract to a published mart. */
public final class MartRun {
  private final SparkSession spark;
  private final RunPlan plan;
  private final TaskListener steps;
  private final StageClock clock = new StageClock();

  /** A run of that plan. */
  public MartRun(SparkSession spark, RunPlan plan, Progress progress) {
    this.spark = spark;
    this.plan = plan;
    this.steps = new TaskListener(progress);
    spark.sparkContext().addSparkListener(steps);
  }

  /**
   * Runs and publishes.
   *
   * @param mart folder of the mart
   * @return what was published
   * @throws RunException if the mart cannot be written, the accounts do not balance or a table has
   *     no valid row
   * @throws millrace.etl.contract.ContractException if the extract as a whole breaks its contract
   */
  public RunManifest run(Path mart) throws IOException {
    try (MartLock lock = MartLock.take(mart)) {
      MartPublisher publisher = MartPublisher.start(mart, lock);
      try {
        RunManifest manifest = compute(publisher);
        step("publish");
        return publisher.publish(manifest, clock);
      } finally {
        publisher.discard();
      }
    }
  }

  private RunManifest compute(MartPublisher publisher) throws IOException {
    ReadExtract extract = new ExtractReader(spark, plan.extract(), this::step).open();
    RunContext context =
        new RunContext(
            plan.policy(),
            extract.descriptor().cover(),
            plan.subjects(),
            extract.context().value().units(),
            extract.files().stream().map(ExtractFile::path).toList());
    step("patients");
    try (PatientTables patients = PatientTables.of(spark, extract, context)) {
      Tally tally = patients.tallies();
      extract
          .findings()
          .forEach(
              (key, rows) ->
                  tally.add(
                      Tally.Group.FINDING,
                      key.kind().word(),
                      key.table().tableName(),
                      key.detail(),
                      rows));
      Map<ContractTable, Accounting.Line> accounts = accounts(extract, tally);
      AccountCheck.check(extract.files(), accounts);
      TableWriter writer = new TableWriter(spark, publisher.unfinished());
      step("rates");
      writeRates(patients, context, tally, writer);
      step("tables");
      writeTables(patients, extract, context, writer);
      return publisher.manifest(plan, extract, accounts);
    }
  }

  private void writeRates(
      PatientTables patients, RunContext context, Tally tally, TableWriter writer)
      throws IOException {
    Map<String, String> kinds = new HashMap<>();
    context.units().forEach((id, unit) -> kinds.put(id, unit.kind().word()));
    RateTables rates =
        new RateTables(
            new RateTables.Units(context.unitNames(), kinds),
            plan.subjects(),
            plan.policy().exposure());
    try (RiskCube cube = RiskCube.of(patients.cells())) {
      cube.addTo(rates);
      writer.write(MartTable.RISK_CUBE, cube.table(spark, context));
    }
    writer.write(UNIT_RATES, UnitRateRow.class, rates.unitRates());
    writer.write(DRUG_RATES, DrugRateRow.class, rates.drugRates());
    writer.write(CLASS_PRESSURE, ClassPressureRow.class, rates.classPressure());
    writer.write(UNIT_PRESSURE, UnitPressureRow.class, rates.unitPressure());
    writer.write(FLOW, FlowRow.class, SummaryTables.flow(tally));
    writer.write(FINDINGS, FindingRow.class, SummaryTables.findings(tally));
    writer.write(MONITORING, MonitoringRow.class, SummaryTables.monitoring(tally, plan.subjects()));
    writer.write(TESTING, TestingRow.class, SummaryTables.testing(tally));
    writer.write(UNITS, UnitRow.class, SummaryTables.units(context.units()));
  }

  private void writeTables(
      PatientTables patients, ReadExtract extract, RunContext context, TableWriter writer)
      throws IOException {
    writer.write(MartTable.EPISODES, patients.episodes());
    writer.write(
        MartTable.GRADUAL_RISES,
        patients.sorted(MartTable.GRADUAL_RISES, "patient_id", "first_at"));
    writer.write(
        MartTable.LINKS, patients.sorted(MartTable.LINKS, "patient_id", "onset_at", "agent"));
    List<QuarantineRow> small =
        extract.quarantine().stream()
            .map(q -> PatientAnalyst.quarantineRow(q, context.files()))
            .toList();
    RowCodec<QuarantineRow> codec = new RowCodec<>(QuarantineRow.class);
    Dataset<Row> ofTablesWithoutPatient =
        spark.createDataFrame(codec.encodeAll(small), codec.schema()).coalesce(1);
    writer.write(
        MartTable.QUARANTINE, patients.table(MartTable.QUARANTINE).union(ofTablesWithoutPatient));
    for (MartTable table :
        List.of(
            MartTable.ADMISSIONS,
            MartTable.RESULTS,
            MartTable.DOSES,
            MartTable.PRESSURES,
            MartTable.STAYS,
            MartTable.REPLACEMENTS)) {
      writer.write(table, patients.table(table));
    }
  }

  private static Map<ContractTable, Accounting.Line> accounts(ReadExtract extract, Tally tally) {
    Map<ContractTable, Accounting.Line> accounts = new HashMap<>();
    for (ContractTable table : ContractTable.values()) {
      accounts.put(table, Accounts.line(tally, table).plus(extract.accounting().of(table)));
    }
    return accounts;
  }

  private void step(String name) {
    clock.start(name);
    steps.step(name);
  }
}
