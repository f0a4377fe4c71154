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
import millrace.etl.check.Quarantined;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.CutSizes;
import millrace.etl.spark.ExtractFile;
import millrace.etl.spark.ExtractReader;
import millrace.etl.spark.ReadExtract;
import org.apache.spark.sql.SparkSession;

/** A run from the files of an extract to a published mart. */
public final class MartRun {
  private final SparkSession spark;
  private final RunPlan plan;
  private final CutSizes cuts;
  private final TaskListener steps;
  private final StageClock clock = new StageClock();

  /** A run of that plan. */
  public MartRun(SparkSession spark, RunPlan plan, Progress progress) {
    this(spark, plan, progress, CutSizes.DEFAULT);
  }

  /** A run of that plan that cuts the extract into those sizes. */
  MartRun(SparkSession spark, RunPlan plan, Progress progress, CutSizes cuts) {
    this.spark = spark;
    this.plan = plan;
    this.cuts = cuts;
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
    ReadExtract extract = new ExtractReader(spark, plan.extract(), cuts, this::step).open();
    RunContext context =
        new RunContext(
            plan.policy(),
            extract.descriptor().cover(),
            plan.subjects(),
            extract.context().value().units(),
            extract.files().stream().map(ExtractFile::path).toList());
    step("patients");
    Path run = publisher.unfinished();
    try (PatientSums patients = PatientSums.of(spark, extract, context, run)) {
      Tally tally = patients.tallies();
      tally.addFindings(extract.findings());
      Map<ContractTable, Accounting.Line> accounts = accounts(extract, tally);
      AccountCheck.check(extract.files(), accounts);
      step("rates");
      writeRates(patients, context, run);
      step("tables");
      writeSummaries(extract, context, tally, run);
      return publisher.manifest(plan, extract, accounts);
    }
  }

  private void writeRates(PatientSums patients, RunContext context, Path run) throws IOException {
    Map<String, String> kinds = new HashMap<>();
    context.units().forEach((id, unit) -> kinds.put(id, unit.kind().word()));
    RateTables rates =
        new RateTables(
            new RateTables.Units(context.unitNames(), kinds),
            plan.subjects(),
            plan.policy().exposure());
    RiskCube.write(patients.cells(), context, run, rates);
    write(run, UNIT_RATES, UnitRateRow.class, rates.unitRates());
    write(run, DRUG_RATES, DrugRateRow.class, rates.drugRates());
    write(run, CLASS_PRESSURE, ClassPressureRow.class, rates.classPressure());
    write(run, UNIT_PRESSURE, UnitPressureRow.class, rates.unitPressure());
  }

  private void writeSummaries(ReadExtract extract, RunContext context, Tally tally, Path run)
      throws IOException {
    write(run, FLOW, FlowRow.class, SummaryTables.flow(tally));
    write(run, FINDINGS, FindingRow.class, SummaryTables.findings(tally));
    write(run, MONITORING, MonitoringRow.class, SummaryTables.monitoring(tally, plan.subjects()));
    write(run, TESTING, TestingRow.class, SummaryTables.testing(tally));
    write(run, UNITS, UnitRow.class, SummaryTables.units(context.units()));
    // The other parts of the quarantine are those of the patients.
    int part = extract.patientBlocks().toJavaRDD().getNumPartitions();
    Path folder = run.resolve(MartTable.QUARANTINE.tableName());
    try (TableFile<QuarantineRow> file = new TableFile<>(QuarantineRow.class, folder, part)) {
      for (Quarantined row : extract.quarantine()) {
        file.write(PatientAnalyst.quarantineRow(row, context.files()));
      }
    }
  }

  private static <T extends Record> void write(
      Path run, MartTable table, Class<T> rowType, List<T> rows) throws IOException {
    TableFile.write(rowType, run.resolve(table.tableName()), rows);
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
