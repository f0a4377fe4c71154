package millrace.ui.month;

import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H3;
import com.vaadin.flow.component.html.Section;
import java.util.Comparator;
import java.util.List;
import millrace.analytics.mart.FindingRow;
import millrace.analytics.mart.FlowRow;
import millrace.analytics.mart.RunManifest;
import millrace.ui.mart.Run;
import millrace.ui.page.DataTable;
import millrace.ui.page.Html;
import millrace.ui.page.Say;

/** Whether the numbers can be trusted: who was judged, what was refused, what was odd. */
final class TrustSection {
  private static final int SHOWN = 12;

  private TrustSection() {}

  static Section of(Run run) {
    List<FlowRow> flow = run.rows(FlowRow.class);
    long all = flow.stream().mapToLong(FlowRow::admissions).sum();
    long not =
        flow.stream()
            .filter(f -> f.cohortClass().equals("not-assessable"))
            .mapToLong(FlowRow::admissions)
            .sum();
    List<RunManifest.TableAccount> accounts = run.manifest().accounting();
    long read = accounts.stream().mapToLong(RunManifest.TableAccount::read).sum();
    long refused = accounts.stream().mapToLong(RunManifest.TableAccount::quarantined).sum();
    String say =
        Say.percent(not, all)
            + " of "
            + Say.count(all, "admission")
            + " cannot be assessed for want of results, which is never the same as no injury; "
            + Say.percent(refused, read)
            + " of "
            + Say.count(read, "row")
            + " are in quarantine. Over the whole cover.";
    return Html.section(
        "Can these numbers be trusted?",
        say,
        Html.div("thirds", flow(flow, all), quarantine(accounts), findings(run)));
  }

  private static Div flow(List<FlowRow> flow, long all) {
    DataTable table = new DataTable("Admissions by class", 1, "class", "admissions", "share");
    flow.stream()
        .sorted(Comparator.comparingLong(FlowRow::admissions).reversed())
        .forEach(
            f ->
                table.row(
                    f.cohortClass().replace('-', ' '),
                    Say.count(f.admissions()),
                    Say.percent(f.admissions(), all)));
    return new Div(new H3("Who was judged"), table);
  }

  private static Div quarantine(List<RunManifest.TableAccount> accounts) {
    DataTable table =
        new DataTable("Rows in quarantine by table", 1, "table", "read", "in quarantine", "share");
    accounts.forEach(
        a ->
            table.row(
                a.table().replace('_', ' '),
                Say.count(a.read()),
                Say.count(a.quarantined()),
                Say.percent(a.quarantined(), a.read())));
    return new Div(new H3("What was refused"), table);
  }

  private static Div findings(Run run) {
    List<FindingRow> findings =
        run.rows(FindingRow.class).stream()
            .sorted(
                Comparator.comparingLong(FindingRow::rows)
                    .reversed()
                    .thenComparing(FindingRow::kind)
                    .thenComparing(FindingRow::table)
                    .thenComparing(FindingRow::detail))
            .toList();
    Div all = new Div(new H3("What was odd and kept"));
    if (findings.isEmpty()) {
      all.add(Html.paragraph("say", "Nothing odd was found."));
      return all;
    }
    all.add(table(findings.subList(0, Math.min(SHOWN, findings.size()))));
    if (findings.size() > SHOWN) {
      all.add(
          Html.fold(
              "the other " + (findings.size() - SHOWN),
              table(findings.subList(SHOWN, findings.size()))));
    }
    return all;
  }

  private static DataTable table(List<FindingRow> findings) {
    DataTable table =
        new DataTable("Findings, the most frequent first", 2, "finding", "where", "rows");
    findings.forEach(
        f ->
            table.row(
                f.kind().replace('-', ' '),
                f.detail().isEmpty() ? f.table() : f.table() + ": " + f.detail(),
                Say.count(f.rows())));
    return table;
  }
}
