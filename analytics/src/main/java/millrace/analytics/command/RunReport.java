package millrace.analytics.command;

import java.io.IOException;
import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import millrace.analytics.mart.Cautions;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RunManifest;
import millrace.analytics.rates.Incidence;
import millrace.analytics.rates.RiskSum;
import millrace.analytics.spark.ParquetRows;
import org.apache.parquet.example.data.Group;

/**
 * What the command run prints when it is done: counts, cohort flow, headline rates, findings, and
 * where the mart is.
 */
final class RunReport {
  private RunReport() {}

  static void print(PrintStream out, MartFolder mart, RunManifest run) throws IOException {
    out.println(
        run.site() + ", " + run.coversFrom() + " to " + run.coversTo() + " (end not included)");
    if (!run.description().isEmpty()) {
      out.println(run.description());
    }
    out.println();
    TextTable accounts =
        new TextTable().row("rows of the extract", "read", "kept", "merged", "quarantined");
    run.accounting()
        .forEach(a -> accounts.row(a.table(), a.read(), a.kept(), a.merged(), a.quarantined()));
    accounts.print(out);
    out.println();
    TextTable tables = new TextTable().row("published tables", "rows");
    run.tables().forEach((name, rows) -> tables.row(name, rows));
    tables.print(out);
    out.println();
    flow(out, mart, run);
    rates(out, mart, run);
    episodes(out, mart, run);
    CheckReport.findings(out, findings(mart, run));
    Cautions.SENTENCES.forEach(out::println);
    out.println("Run " + run.runId() + " is published in " + mart.run(run.runId()));
  }

  private static void flow(PrintStream out, MartFolder mart, RunManifest run) throws IOException {
    TextTable table = new TextTable().row("cohort", "admissions");
    ParquetRows.forEach(
        mart.table(run.runId(), MartTable.FLOW),
        row -> table.row(row.getString("class", 0), row.getLong("admissions", 0)));
    table.print(out);
    out.println();
  }

  private static void rates(PrintStream out, MartFolder mart, RunManifest run) throws IOException {
    Map<String, RiskSum> byUnit = new TreeMap<>();
    ParquetRows.forEach(
        mart.table(run.runId(), MartTable.UNIT_RATES),
        row -> {
          if (row.getString("attribution", 0).equals("at-onset")) {
            byUnit.merge(row.getString("unit_id", 0), sum(row), RiskSum::plus);
          }
        });
    TextTable table =
        new TextTable()
            .row("per 1,000 patient-days at risk", "episodes", "days", "rate", "95 % limits");
    rate(table, "whole hospital", byUnit.values().stream().reduce(RiskSum.ZERO, RiskSum::plus));
    byUnit.forEach((unit, sum) -> rate(table, unit, sum));
    table.print(out);
    out.println();
  }

  private static void rate(TextTable table, String name, RiskSum sum) {
    Incidence incidence = Incidence.of(sum);
    boolean known = incidence.rate().isPresent();
    table.row(
        name,
        sum.episodes(),
        String.format("%,.1f", sum.days()),
        known ? String.format("%.2f", incidence.rate().getAsDouble()) : "",
        known
            ? String.format(
                "%.2f to %.2f", incidence.lower().getAsDouble(), incidence.upper().getAsDouble())
            : "");
  }

  private static void episodes(PrintStream out, MartFolder mart, RunManifest run)
      throws IOException {
    Map<String, long[]> byOrigin = new TreeMap<>();
    ParquetRows.forEach(
        mart.table(run.runId(), MartTable.EPISODES),
        row ->
            byOrigin
                .computeIfAbsent(row.getString("origin", 0), o -> new long[4])[
                row.getInteger("stage", 0)]++);
    TextTable table = new TextTable().row("episodes by origin", "stage 1", "stage 2", "stage 3");
    byOrigin.forEach((origin, stages) -> table.row(origin, stages[1], stages[2], stages[3]));
    table.print(out);
    out.println();
  }

  private static List<FindingRow> findings(MartFolder mart, RunManifest run) throws IOException {
    List<FindingRow> rows = new ArrayList<>();
    ParquetRows.forEach(
        mart.table(run.runId(), MartTable.FINDINGS),
        row ->
            rows.add(
                new FindingRow(
                    row.getString("kind", 0),
                    row.getString("table", 0),
                    row.getString("detail", 0),
                    row.getLong("rows", 0))));
    return rows;
  }

  private static RiskSum sum(Group row) {
    return new RiskSum(
        row.getLong("at_risk_seconds", 0),
        row.getLong("episodes", 0),
        row.getLong("stage2plus", 0));
  }
}
