package millrace.etl.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.FileLayout;
import millrace.etl.contract.MappedTable;
import millrace.etl.normalise.CodeMap;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.WallClock;
import millrace.etl.record.Unit;
import millrace.etl.record.UnitKind;

/**
 * Checks {@code units} and {@code code_map}, which belong to no patient. Not for several threads.
 */
public final class SmallTables {
  private final List<FileLayout> layouts;
  private final WallClock clock;
  private final Findings findings;
  private final Accounting accounting;

  /** A check that counts into these. */
  public SmallTables(
      List<FileLayout> layouts, WallClock clock, Findings findings, Accounting accounting) {
    this.layouts = layouts;
    this.clock = clock;
    this.findings = findings;
    this.accounting = accounting;
  }

  /** Kept units by id; later rows with an id already seen are broken. */
  public Map<String, Unit> units(List<RawRow> rows, List<Quarantined> quarantine) {
    Map<String, Unit> units = new HashMap<>();
    for (Unit unit : sift(ContractTable.UNITS, new UnitRows(), rows, quarantine)) {
      units.put(unit.unitId(), unit);
    }
    return units;
  }

  /** The code map; the first entry of a local code stands. */
  public CodeMap codeMap(List<RawRow> rows, List<Quarantined> quarantine) {
    Map<String, String> analytes = new HashMap<>();
    Map<String, String> drugs = new HashMap<>();
    for (Entry entry : sift(ContractTable.CODE_MAP, new EntryRows(), rows, quarantine)) {
      Map<String, String> target =
          switch (entry.table()) {
            case RESULTS -> entry.codeSystem().equals("loinc") ? analytes : new HashMap<>();
            case ADMINISTRATIONS -> entry.codeSystem().equals("atc") ? drugs : new HashMap<>();
            case CONDITIONS -> new HashMap<>();
          };
      if (target.putIfAbsent(entry.localCode(), entry.code()) != null) {
        findings.count(FindingKind.REPEATED_CODE, ContractTable.CODE_MAP, entry.localCode());
      }
    }
    return new CodeMap(analytes, drugs);
  }

  private <T> List<T> sift(
      ContractTable table, RowKind<T> kind, List<RawRow> rows, List<Quarantined> quarantine) {
    return new ArrayList<>(
        new TableSieve<>(table, kind, layouts, clock, findings, accounting)
            .sift(rows, Person.UNKNOWN, quarantine));
  }

  /** An entry of the code map. */
  private record Entry(MappedTable table, String localCode, String codeSystem, String code) {}

  private static final class UnitRows implements RowKind<Unit> {
    private static final int UNIT_ID = ContractTable.UNITS.column("unit_id");
    private static final int NAME = ContractTable.UNITS.column("name");
    private static final int KIND = ContractTable.UNITS.column("kind");
    private final Set<String> seen = new HashSet<>();

    @Override
    public Broken broken(ParsedRow row, Person person) {
      return seen.contains(row.text(UNIT_ID)) ? new Broken(Rule.REPEATED_KEY, "unit_id") : null;
    }

    @Override
    public Unit keep(ParsedRow row, Person person) {
      seen.add(row.text(UNIT_ID));
      return new Unit(
          row.text(UNIT_ID), row.text(NAME), row.word(KIND, UnitKind.values(), UnitKind.OTHER));
    }

    @Override
    public void sawBroken(ParsedRow row) {
      seen.add(row.text(UNIT_ID));
    }
  }

  private static final class EntryRows implements RowKind<Entry> {
    private static final ContractTable TABLE = ContractTable.CODE_MAP;
    private static final int MAPPED = TABLE.column("table");
    private static final int LOCAL_CODE = TABLE.column("local_code");
    private static final int CODE_SYSTEM = TABLE.column("code_system");
    private static final int CODE = TABLE.column("code");

    @Override
    public Broken broken(ParsedRow row, Person person) {
      return null;
    }

    @Override
    public Entry keep(ParsedRow row, Person person) {
      return new Entry(
          row.word(MAPPED, MappedTable.values(), MappedTable.CONDITIONS),
          row.text(LOCAL_CODE),
          row.text(CODE_SYSTEM),
          row.text(CODE));
    }
  }
}
