package millrace.etl.spark;

import static org.apache.spark.sql.functions.col;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.stream.StreamSupport;
import millrace.etl.check.AdmissionKeys;
import millrace.etl.check.CheckContext;
import millrace.etl.normalise.KeySet;
import millrace.etl.record.SourceLine;
import org.apache.spark.api.java.JavaRDD;
import org.apache.spark.api.java.JavaSparkContext;
import org.apache.spark.broadcast.Broadcast;
import org.apache.spark.sql.Dataset;
import org.apache.spark.sql.Row;
import org.apache.spark.sql.RowFactory;
import org.apache.spark.sql.SparkSession;
import org.apache.spark.sql.types.DataTypes;
import org.apache.spark.sql.types.StructType;
import org.apache.spark.storage.StorageLevel;

/**
 * Which admissions are kept, and whose they are: settles repeated keys and sends each unit stay to
 * the patient of its admission. The claims of admissions and the stays meet by admission id.
 */
final class AdmissionIndex {
  private static final StructType CLAIMS =
      new StructType()
          .add("admission_id", DataTypes.StringType, false)
          .add("block", DataTypes.BinaryType, true)
          .add("patient_id", DataTypes.StringType, true)
          .add("file", DataTypes.IntegerType, false)
          .add("line", DataTypes.IntegerType, false)
          .add("valid", DataTypes.BooleanType, false);

  /**
   * A stay's block with its patient, the place of a repeated row without a key, or the hash of a
   * kept id.
   */
  private static final StructType SETTLED =
      new StructType()
          .add("patient_id", DataTypes.StringType, true)
          .add("block", DataTypes.BinaryType, true)
          .add("file", DataTypes.IntegerType, false)
          .add("line", DataTypes.IntegerType, false)
          .add("hash", DataTypes.LongType, false);

  private final Dataset<Row> settled;

  private AdmissionIndex(Dataset<Row> settled) {
    this.settled = settled;
  }

  /**
   * Builds the index.
   *
   * @param people blocks of {@code patients} and {@code admissions}
   * @param stays blocks of {@code unit_stays}, by admission
   * @param partitions partitions of the two shuffles
   */
  static AdmissionIndex of(
      SparkSession spark,
      Dataset<Row> people,
      Dataset<Row> stays,
      CheckContext context,
      int partitions) {
    Broadcast<CheckContext> shared =
        JavaSparkContext.fromSparkContext(spark.sparkContext()).broadcast(context);
    JavaRDD<Row> claims =
        BlockFrames.byKey(people, partitions)
            .toJavaRDD()
            .mapPartitions(rows -> claims(rows, shared.value()));
    JavaRDD<Row> stayRows =
        stays
            .toJavaRDD()
            .map(r -> RowFactory.create(r.getString(0), r.getAs(1), null, 0, 0, false));
    Dataset<Row> together = spark.createDataFrame(claims.union(stayRows), CLAIMS);
    JavaRDD<Row> settled =
        BlockFrames.byKey(together, partitions).toJavaRDD().mapPartitions(AdmissionIndex::settle);
    return new AdmissionIndex(
        spark.createDataFrame(settled, SETTLED).persist(StorageLevel.MEMORY_AND_DISK_SER()));
  }

  /** Rows of {@code admissions} that repeat a key. */
  Set<SourceLine> repeated() {
    return new HashSet<>(
        settled
            .where(col("patient_id").isNull())
            .select("file", "line")
            .toJavaRDD()
            .map(r -> new SourceLine(r.getInt(0), r.getInt(1)))
            .collect());
  }

  /** Ids of all kept admissions. */
  KeySet kept() {
    List<long[]> parts =
        settled
            .where(col("patient_id").isNotNull().and(col("block").isNull()))
            .select("hash")
            .toJavaRDD()
            .mapPartitions(AdmissionIndex::hashes)
            .collect();
    return KeySet.of(parts.stream().flatMapToLong(Arrays::stream).toArray());
  }

  /** Blocks of {@code unit_stays}, by patient. */
  Dataset<Row> staysByPatient() {
    return settled.where(col("block").isNotNull()).select("patient_id", "block");
  }

  void release() {
    settled.unpersist();
  }

  private static Iterator<Row> claims(Iterator<Row> sorted, CheckContext context) {
    AdmissionKeys keys = new AdmissionKeys(context);
    RowGroups groups = new RowGroups(sorted);
    Iterable<RowGroups.Group> each = () -> groups;
    return StreamSupport.stream(each.spliterator(), false)
        .flatMap(g -> keys.claims(PatientStream.rows(g.rows(), 1)).stream())
        .map(
            c ->
                RowFactory.create(
                    c.admissionId(),
                    null,
                    c.patientId(),
                    c.source().file(),
                    c.source().line(),
                    c.valid()))
        .iterator();
  }

  /**
   * Rows (key, block or null, file, line, hash): a stay with its patient, a repeated row (no key),
   * or a kept id's hash.
   */
  private static Iterator<Row> settle(Iterator<Row> sorted) {
    RowGroups groups = new RowGroups(sorted);
    Iterable<RowGroups.Group> each = () -> groups;
    return StreamSupport.stream(each.spliterator(), false)
        .flatMap(g -> settleOne(g).stream())
        .iterator();
  }

  private static List<Row> settleOne(RowGroups.Group group) {
    List<AdmissionKeys.Claim> claims = new ArrayList<>();
    List<byte[]> stays = new ArrayList<>();
    for (Row row : group.rows()) {
      if (row.isNullAt(1)) {
        claims.add(
            new AdmissionKeys.Claim(
                group.key(),
                row.getString(2),
                new SourceLine(row.getInt(3), row.getInt(4)),
                row.getBoolean(5)));
      } else {
        stays.add(row.getAs(1));
      }
    }
    AdmissionKeys.Settled settled = AdmissionKeys.settle(claims);
    String owner = settled.kept().orElseGet(() -> BlockReader.keyless(KeySet.hash(group.key())));
    List<Row> out = new ArrayList<>();
    stays.forEach(block -> out.add(RowFactory.create(owner, block, 0, 0, 0L)));
    settled.repeated().forEach(s -> out.add(RowFactory.create(null, null, s.file(), s.line(), 0L)));
    if (settled.kept().isPresent()) {
      out.add(RowFactory.create(owner, null, 0, 0, KeySet.hash(group.key())));
    }
    return out;
  }

  private static Iterator<long[]> hashes(Iterator<Row> rows) {
    Iterable<Row> each = () -> rows;
    long[] hashes =
        StreamSupport.stream(each.spliterator(), false).mapToLong(r -> r.getLong(0)).toArray();
    return List.of(hashes).iterator();
  }
}
