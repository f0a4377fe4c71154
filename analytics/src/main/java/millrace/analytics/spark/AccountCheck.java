package millrace.analytics.spark;

import java.util.List;
import java.util.Map;
import millrace.etl.check.Accounting;
import millrace.etl.contract.ContractTable;
import millrace.etl.spark.ExtractFile;

/** Checks at run time that no row was lost, and that every required table has a valid one. */
final class AccountCheck {
  private AccountCheck() {}

  /**
   * Checks all tables of the extract.
   *
   * @throws RunException if a required table has no valid row, or an account does not balance
   */
  static void check(List<ExtractFile> files, Map<ContractTable, Accounting.Line> accounts) {
    for (ContractTable table : ContractTable.values()) {
      Accounting.Line line = accounts.get(table);
      long surveyed =
          files.stream().filter(f -> f.table() == table).mapToLong(f -> f.survey().records()).sum();
      if (line.read() != surveyed || !line.balances()) {
        throw RunException.failed(
            "the account of "
                + table.tableName()
                + " does not balance: "
                + surveyed
                + " rows in the files, "
                + line.read()
                + " read, "
                + line.kept()
                + " kept, "
                + line.merged()
                + " merged, "
                + line.quarantined()
                + " quarantined; this is a fault of the program, please report it",
            null);
      }
      if (table.required() && line.kept() == 0) {
        String path =
            files.stream()
                .filter(f -> f.table() == table)
                .findFirst()
                .map(ExtractFile::path)
                .orElse("");
        throw RunException.contract(
            path
                + ": no row of "
                + table.tableName()
                + " is valid ("
                + line.quarantined()
                + " in quarantine); the command check with --report DIR writes them with the rule each one breaks");
      }
    }
  }
}
