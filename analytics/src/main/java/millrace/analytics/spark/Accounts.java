package millrace.analytics.spark;

import millrace.analytics.patient.Tally;
import millrace.etl.check.Accounting;
import millrace.etl.contract.ContractTable;

/** The accounts of tables as tallies, and back. */
final class Accounts {
  private Accounts() {}

  static void tally(Tally tally, ContractTable table, Accounting.Line line) {
    String name = table.tableName();
    tally.add(Tally.Group.ACCOUNT, name, "read", "", line.read());
    tally.add(Tally.Group.ACCOUNT, name, "kept", "", line.kept());
    tally.add(Tally.Group.ACCOUNT, name, "merged", "", line.merged());
    tally.add(Tally.Group.ACCOUNT, name, "quarantined", "", line.quarantined());
  }

  static Accounting.Line line(Tally tally, ContractTable table) {
    String name = table.tableName();
    return new Accounting.Line(
        tally.sum(new Tally.Key(Tally.Group.ACCOUNT, name, "read", "")),
        tally.sum(new Tally.Key(Tally.Group.ACCOUNT, name, "kept", "")),
        tally.sum(new Tally.Key(Tally.Group.ACCOUNT, name, "merged", "")),
        tally.sum(new Tally.Key(Tally.Group.ACCOUNT, name, "quarantined", "")));
  }
}
