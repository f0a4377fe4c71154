package millrace.etl.check;

import java.util.ArrayList;
import java.util.List;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.FileLayout;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.RowFields;
import millrace.etl.parse.WallClock;

/**
 * Sifts the rows of one table: merges equal ones, applies the rules, accounts for each row. Not for
 * several threads.
 *
 * @param <T> canonical row
 */
final class TableSieve<T> {
  private final ContractTable table;
  private final RowKind<T> kind;
  private final List<FileLayout> layouts;
  private final RowParser parser;
  private final Accounting accounting;
  private final RowFields compared;

  TableSieve(
      ContractTable table,
      RowKind<T> kind,
      List<FileLayout> layouts,
      WallClock clock,
      Findings findings,
      Accounting accounting) {
    this.table = table;
    this.kind = kind;
    this.layouts = layouts;
    this.parser = new RowParser(table, clock, findings);
    this.accounting = accounting;
    this.compared = new RowFields(table.columns().size());
  }

  /**
   * Sifts rows in the order of the extract.
   *
   * @param rows rows that may be equal to each other and to no other row of the extract
   * @param quarantine where broken rows go
   * @return canonical rows
   */
  List<T> sift(List<RawRow> rows, Person person, List<Quarantined> quarantine) {
    List<T> canonical = new ArrayList<>(rows.size());
    HashIndex seen = new HashIndex(rows.size());
    int merged = 0;
    int broken = 0;
    for (int i = 0; i < rows.size(); i++) {
      RawRow raw = rows.get(i);
      FileLayout layout = layouts.get(raw.source().file());
      parser.split(raw, layout);
      if (rows.size() > 1 && isRepeated(rows, i, seen)) {
        merged++;
        continue;
      }
      Broken rule = parser.parse(layout);
      if (rule == null) {
        rule = kind.broken(parser.row(), person);
      }
      if (rule != null) {
        broken++;
        kind.sawBroken(parser.row());
        quarantine.add(new Quarantined(table, raw.source(), rule, raw.text()));
        continue;
      }
      T row = kind.keep(parser.row(), person);
      if (row != null) {
        canonical.add(row);
      }
    }
    accounting.add(
        table, new Accounting.Line(rows.size(), rows.size() - merged - broken, merged, broken));
    return canonical;
  }

  private boolean isRepeated(List<RawRow> rows, int at, HashIndex seen) {
    RowFields fields = parser.row().fields;
    return seen.addOrMatch(
        fields.hash(),
        at,
        earlier -> {
          RawRow raw = rows.get(earlier);
          compared.split(raw, layouts.get(raw.source().file()).columnOfField());
          return compared.sameText(fields);
        });
  }
}
