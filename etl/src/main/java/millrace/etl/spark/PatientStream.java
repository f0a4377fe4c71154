package millrace.etl.spark;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import millrace.etl.check.Accounting;
import millrace.etl.check.CheckContext;
import millrace.etl.check.CheckedPatient;
import millrace.etl.check.Findings;
import millrace.etl.check.PatientCheck;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.RawRow;
import org.apache.spark.sql.Row;

/**
 * The patients of one partition of {@link ReadExtract#patientBlocks()}, checked one after another.
 */
public final class PatientStream implements Iterator<CheckedPatient> {
  private static final int BLOCK = 1;

  private final RowGroups groups;
  private final PatientCheck check;

  /** Over the rows of a partition, sorted by patient. */
  public PatientStream(Iterator<Row> sortedBlocks, CheckContext context) {
    groups = new RowGroups(sortedBlocks);
    check = new PatientCheck(context);
  }

  @Override
  public boolean hasNext() {
    return groups.hasNext();
  }

  @Override
  public CheckedPatient next() {
    return check.check(rows(groups.next().rows(), BLOCK));
  }

  /** What was found odd in the patients seen so far. */
  public Findings findings() {
    return check.findings();
  }

  /** The accounts of the patients seen so far. */
  public Accounting accounting() {
    return check.accounting();
  }

  /** The raw rows in blocks, by table and in the order of the extract. */
  static Map<ContractTable, List<RawRow>> rows(List<Row> blocks, int blockColumn) {
    Map<ContractTable, List<RawRow>> rows = new EnumMap<>(ContractTable.class);
    for (ContractTable table : ContractTable.values()) {
      rows.put(table, new ArrayList<>());
    }
    for (Row block : blocks) {
      PatientBlock.unpack(block.getAs(blockColumn), rows);
    }
    rows.values().forEach(list -> list.sort(Comparator.comparing(RawRow::source)));
    return rows;
  }
}
