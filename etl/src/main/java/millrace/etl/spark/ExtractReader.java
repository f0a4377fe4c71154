package millrace.etl.spark;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Predicate;
import millrace.etl.check.Accounting;
import millrace.etl.check.CheckContext;
import millrace.etl.check.FindingKind;
import millrace.etl.check.Findings;
import millrace.etl.check.Quarantined;
import millrace.etl.check.SmallTables;
import millrace.etl.contract.ContractException;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.DescriptorReader;
import millrace.etl.contract.ExtractDescriptor;
import millrace.etl.contract.FileLayout;
import millrace.etl.normalise.CodeMap;
import millrace.etl.normalise.KeySet;
import millrace.etl.parse.FileSurveyor;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.SmallTableReader;
import millrace.etl.parse.WallClock;
import millrace.etl.record.Unit;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.api.java.JavaSparkContext;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.SparkSession;

/**
 * Opens an extract: descriptor, survey of every file, small tables, admissions, and the shuffle by
 * patient.
 */
public final class ExtractReader {
  /** Tables that are read on the driver, because they belong to no patient. */
  private static final Set<ContractTable> SMALL =
      EnumSet.of(ContractTable.UNITS, ContractTable.CODE_MAP);

  private static final Set<ContractTable> PEOPLE =
      EnumSet.of(ContractTable.PATIENTS, ContractTable.ADMISSIONS);
  private static final int MOST_BUCKETS = 2_000;

  private final SparkSession spark;
  private final JavaSparkContext context;
  private final Path folder;
  private final CutSizes cuts;
  private final Consumer<String> step;

  /**
   * A reader of that folder.
   *
   * @param cuts into what sizes it is cut
   * @param step told the name of each step as it starts
   */
  public ExtractReader(SparkSession spark, Path folder, CutSizes cuts, Consumer<String> step) {
    this.spark = spark;
    this.context = JavaSparkContext.fromSparkContext(spark.sparkContext());
    this.folder = folder;
    this.cuts = cuts;
    this.step = step;
  }

  /**
   * Opens the extract.
   *
   * @throws ContractException if the extract as a whole breaks its contract
   */
  public ReadExtract open() {
    ExtractDescriptor descriptor = DescriptorReader.read(folder);
    step.accept("survey");
    List<ExtractFile> files = survey(descriptor);
    List<FileLayout> layouts =
        files.stream().map(f -> FileLayout.of(f.table(), f.survey().header(), f.path())).toList();
    Findings findings = new Findings();
    refuseEmpty(files, findings);
    noteUnknown(descriptor, files, layouts, findings);
    Accounting accounting = new Accounting();
    List<Quarantined> quarantine = new ArrayList<>();
    SmallTables small =
        new SmallTables(layouts, new WallClock(descriptor.cover().zone()), findings, accounting);
    Map<String, Unit> units = small.units(smallRows(files, ContractTable.UNITS), quarantine);
    CodeMap codes = small.codeMap(smallRows(files, ContractTable.CODE_MAP), quarantine);
    CheckContext unsettled =
        new CheckContext(
            descriptor.cover(), layouts, units, codes, new KeySet(new long[0]), Set.of());

    step.accept("admissions");
    int buckets = buckets(files);
    AdmissionIndex index =
        AdmissionIndex.of(
            spark,
            blocks(files, layouts, PEOPLE::contains),
            blocks(files, layouts, t -> t == ContractTable.UNIT_STAYS),
            unsettled,
            Math.max(1, buckets / 4));
    CheckContext settled =
        new CheckContext(descriptor.cover(), layouts, units, codes, index.kept(), index.repeated());
    Dataset<Row> bulk =
        blocks(files, layouts, t -> !SMALL.contains(t) && t != ContractTable.UNIT_STAYS);
    Dataset<Row> all = bulk.union(index.staysByPatient());
    return new ReadExtract(
        descriptor,
        files,
        fingerprint(files),
        context.broadcast(settled),
        findings,
        accounting,
        quarantine,
        BlockFrames.byKey(all, buckets));
  }

  private List<ExtractFile> survey(ExtractDescriptor descriptor) {
    List<ExtractFile> unread = new ArrayList<>();
    for (ExtractDescriptor.Resource resource : descriptor.resources()) {
      resource.paths().forEach(path -> unread.add(new ExtractFile(resource.table(), path, null)));
    }
    String root = folder.toString();
    long splitBytes = cuts.splitBytes();
    return context
        .parallelize(unread, unread.size())
        .map(
            f ->
                new ExtractFile(
                    f.table(),
                    f.path(),
                    FileSurveyor.survey(Path.of(root), f.path(), f.table(), splitBytes)))
        .collect();
  }

  private Dataset<Row> blocks(
      List<ExtractFile> files, List<FileLayout> layouts, Predicate<ContractTable> wanted) {
    List<BlockReader.Part> parts = new ArrayList<>();
    for (int i = 0; i < files.size(); i++) {
      ExtractFile file = files.get(i);
      if (wanted.test(file.table())) {
        for (var split : file.survey().splits()) {
          parts.add(new BlockReader.Part(i, file.table(), file.path(), layouts.get(i), split));
        }
      }
    }
    JavaRDD<BlockReader.Part> each = context.parallelize(parts, Math.max(1, parts.size()));
    return BlockFrames.of(spark, each.flatMap(new BlockReader(folder)));
  }

  private List<RawRow> smallRows(List<ExtractFile> files, ContractTable table) {
    List<RawRow> rows = new ArrayList<>();
    for (int i = 0; i < files.size(); i++) {
      if (files.get(i).table() == table) {
        try {
          rows.addAll(SmallTableReader.read(folder, files.get(i).path(), i));
        } catch (IOException e) {
          throw new ContractException(
              files.get(i).path() + " cannot be read as CSV; mend its quotes", e);
        }
      }
    }
    return rows;
  }

  /**
   * How many parts the patients are cut into: a matter of the extract alone, so that the mart's
   * files are the same everywhere.
   */
  private int buckets(List<ExtractFile> files) {
    long bytes = files.stream().mapToLong(f -> f.survey().textBytes()).sum();
    return (int) Math.min(MOST_BUCKETS, 1 + bytes / cuts.bucketBytes());
  }

  private static void refuseEmpty(List<ExtractFile> files, Findings findings) {
    for (ContractTable table : ContractTable.values()) {
      List<ExtractFile> own = files.stream().filter(f -> f.table() == table).toList();
      long records = own.stream().mapToLong(f -> f.survey().records()).sum();
      if (!own.isEmpty() && records == 0) {
        if (table.required()) {
          throw new ContractException(
              own.get(0).path()
                  + " has a header and no row; the table "
                  + table.tableName()
                  + " is required: export its rows");
        }
        findings.count(FindingKind.EMPTY_TABLE, table, "");
      }
    }
  }

  private static void noteUnknown(
      ExtractDescriptor descriptor,
      List<ExtractFile> files,
      List<FileLayout> layouts,
      Findings findings) {
    descriptor
        .unknownResources()
        .forEach(r -> findings.add(new Findings.Key(FindingKind.UNKNOWN_TABLE, r, ""), 1));
    for (int i = 0; i < files.size(); i++) {
      for (String column : layouts.get(i).unknownColumns()) {
        findings.count(FindingKind.UNKNOWN_COLUMN, files.get(i).table(), column);
      }
    }
  }

  private static String fingerprint(List<ExtractFile> files) {
    try {
      MessageDigest digest = MessageDigest.getInstance("SHA-256");
      for (ExtractFile file : files) {
        String line =
            file.table().tableName() + " " + file.path() + " " + file.survey().sha256() + "\n";
        digest.update(line.getBytes(StandardCharsets.UTF_8));
      }
      return HexFormat.of().formatHex(digest.digest());
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
