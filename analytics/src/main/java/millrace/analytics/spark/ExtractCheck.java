package millrace.analytics.spark;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import millrace.analytics.export.ExportColumn;
import millrace.analytics.export.ExportTable;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.QuarantineRow;
import millrace.analytics.patient.PatientAnalyst;
import millrace.analytics.patient.Tally;
import millrace.etl.check.Accounting;
import millrace.etl.check.CheckContext;
import millrace.etl.check.Quarantined;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.CutSizes;
import millrace.etl.spark.ExtractFile;
import millrace.etl.spark.ExtractReader;
import millrace.etl.spark.PatientStream;
import millrace.etl.spark.ReadExtract;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.broadcast.Broadcast;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.storage.StorageLevel;

/** Checks an extract against its contract without computing anything from it. */
public final class ExtractCheck {
  /** What a check found. */
  public record Report(
      Map<ContractTable, Accounting.Line> accounts, List<FindingRow> findings, long quarantined) {}

  /** Quarantined rows of a part of the patients, and its sums. */
  private record Part(ArrayList<Quarantined> quarantine, ArrayList<TallySum> sums)
      implements java.io.Serializable {}

  private record TallySum(Tally.Key key, long sum) implements java.io.Serializable {}

  private ExtractCheck() {}

  /**
   * Checks an extract.
   *
   * @param report folder for {@code quarantine.csv} and {@code findings.csv}, or null for none
   */
  public static Report check(SparkSession spark, Path folder, Path report, Progress progress)
      throws IOException {
    TaskListener steps = new TaskListener(progress);
    spark.sparkContext().addSparkListener(steps);
    ReadExtract extract = new ExtractReader(spark, folder, CutSizes.DEFAULT, steps::step).open();
    steps.step("patients");
    Broadcast<CheckContext> context = extract.context();
    JavaRDD<Part> parts =
        extract
            .patientBlocks()
            .toJavaRDD()
            .mapPartitions(rows -> part(rows, context.value()))
            .persist(StorageLevel.DISK_ONLY());
    Tally tally = new Tally();
    parts
        .flatMap(p -> p.sums().iterator())
        .collect()
        .forEach(
            s ->
                tally.add(
                    s.key().group(), s.key().first(), s.key().second(), s.key().third(), s.sum()));
    tally.addFindings(extract.findings());
    Map<ContractTable, Accounting.Line> accounts = new HashMap<>();
    for (ContractTable table : ContractTable.values()) {
      accounts.put(table, Accounts.line(tally, table).plus(extract.accounting().of(table)));
    }
    List<FindingRow> findings = SummaryTables.findings(tally);
    if (report != null) {
      Files.createDirectories(report);
      List<String> files = extract.files().stream().map(ExtractFile::path).toList();
      List<Quarantined> quarantine = new ArrayList<>(extract.quarantine());
      quarantine.addAll(parts.flatMap(p -> p.quarantine().iterator()).collect());
      writeQuarantine(report.resolve("quarantine.csv"), quarantine, files);
      writeFindings(report.resolve("findings.csv"), findings);
    }
    AccountCheck.check(extract.files(), accounts);
    parts.unpersist();
    return new Report(
        accounts,
        findings,
        accounts.values().stream().mapToLong(Accounting.Line::quarantined).sum());
  }

  private static Iterator<Part> part(Iterator<Row> rows, CheckContext context) {
    PatientStream patients = new PatientStream(rows, context);
    ArrayList<Quarantined> quarantine = new ArrayList<>();
    patients.forEachRemaining(p -> quarantine.addAll(p.quarantine()));
    Tally tally = new Tally();
    tally.addFindings(patients.findings());
    for (ContractTable table : ContractTable.values()) {
      Accounts.tally(tally, table, patients.accounting().of(table));
    }
    ArrayList<TallySum> sums = new ArrayList<>();
    tally.forEach((key, sum) -> sums.add(new TallySum(key, sum)));
    return List.of(new Part(quarantine, sums)).iterator();
  }

  private static void writeQuarantine(Path file, List<Quarantined> quarantine, List<String> files)
      throws IOException {
    List<QuarantineRow> rows =
        quarantine.stream()
            .map(q -> PatientAnalyst.quarantineRow(q, files))
            .sorted(
                Comparator.comparing(QuarantineRow::table)
                    .thenComparing(QuarantineRow::file)
                    .thenComparing(QuarantineRow::line))
            .toList();
    String[] header =
        ExportTable.QUARANTINE.columns().stream().map(ExportColumn::name).toArray(String[]::new);
    try (CSVPrinter printer = printer(file, header)) {
      for (QuarantineRow row : rows) {
        printer.printRecord(
            row.table(), row.file(), row.line(), row.rule(), row.column(), row.raw());
      }
    }
  }

  private static void writeFindings(Path file, List<FindingRow> findings) throws IOException {
    try (CSVPrinter printer = printer(file, "kind", "table", "detail", "rows")) {
      for (FindingRow row : findings) {
        printer.printRecord(row.kind(), row.table(), row.detail(), row.rows());
      }
    }
  }

  private static CSVPrinter printer(Path file, String... header) throws IOException {
    BufferedWriter writer = Files.newBufferedWriter(file);
    return new CSVPrinter(
        writer, CSVFormat.RFC4180.builder().setRecordSeparator("\n").setHeader(header).get());
  }
}
