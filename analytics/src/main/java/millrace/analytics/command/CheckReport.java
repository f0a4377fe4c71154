package millrace.analytics.command;

import java.io.PrintStream;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.spark.ExtractCheck;
import millrace.etl.check.Accounting;
import millrace.etl.contract.ContractTable;

/** What the command check prints. */
final class CheckReport {
  private static final int MOST_FINDINGS = 40;

  private CheckReport() {}

  static void print(PrintStream out, ExtractCheck.Report result, Optional<Path> report) {
    accounts(out, result.accounts());
    findings(out, result.findings());
    out.println(
        report.isPresent()
            ? "The quarantined rows and all findings are in " + report.get()
            : "With --report DIR the quarantined rows are written with the rule each one breaks.");
  }

  static void accounts(PrintStream out, Map<ContractTable, Accounting.Line> accounts) {
    TextTable table =
        new TextTable().row("rows of the extract", "read", "kept", "merged", "quarantined");
    for (ContractTable each : ContractTable.values()) {
      Accounting.Line line = accounts.get(each);
      table.row(each.tableName(), line.read(), line.kept(), line.merged(), line.quarantined());
    }
    table.print(out);
    out.println();
  }

  static void findings(PrintStream out, List<FindingRow> findings) {
    if (findings.isEmpty()) {
      return;
    }
    TextTable table = new TextTable().row("findings", "table", "detail", "rows");
    findings.stream()
        .limit(MOST_FINDINGS)
        .forEach(f -> table.row(f.kind(), f.table(), f.detail(), f.rows()));
    if (findings.size() > MOST_FINDINGS) {
      table.row("and more", "", "", findings.size() - MOST_FINDINGS);
    }
    table.print(out);
    out.println();
  }
}
