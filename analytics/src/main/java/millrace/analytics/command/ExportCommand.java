package millrace.analytics.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import millrace.analytics.export.ExportTable;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.spark.MartExporter;
import millrace.analytics.spark.RunException;
import millrace.etl.ExitStatus;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Writes a published table as CSV. */
@Command(
    name = "export",
    description = {
      "Writes a published table as CSV: admissions, episodes, gradual_rises, unit_rates, drug_rates, links, flow, quarantine.",
      "Retrospective surveillance for quality review; not for the care of a patient. Associations, not causes.",
      "Patient rows are sensitive."
    },
    mixinStandardHelpOptions = true)
final class ExportCommand implements Callable<Integer> {
  @Option(names = "--mart", required = true, paramLabel = "DIR", description = "folder of the mart")
  private Path mart;

  @Option(names = "--table", required = true, paramLabel = "NAME", description = "table to write")
  private String table;

  @Option(names = "--out", required = true, paramLabel = "FILE.csv", description = "file to write")
  private Path out;

  @Option(
      names = "--run",
      paramLabel = "ID",
      description = "run to take it from; default: the served one")
  private Optional<String> run = Optional.empty();

  @Override
  public Integer call() throws Exception {
    ExportTable export =
        ExportTable.named(table)
            .orElseThrow(
                () ->
                    RunException.wrongCall(
                        "there is no table "
                            + table
                            + " to export; the tables are "
                            + ExportTable.names(),
                        null));
    MartFolder folder = new MartFolder(mart);
    String id = id(folder);
    Path target = out.toAbsolutePath();
    if (Files.isDirectory(target) || !Files.isDirectory(target.getParent())) {
      throw RunException.wrongCall(
          out + " cannot be written; name a file in a folder that exists as --out", null);
    }
    int rows = write(folder, export, id, target);
    System.out.println(rows + " rows of " + table + " of run " + id + " are in " + out);
    System.out.println(
        "Associations, not causes; for quality review, not for the care of a patient. Patient rows are sensitive.");
    return ExitStatus.DONE.code();
  }

  private int write(MartFolder folder, ExportTable export, String id, Path target) {
    try {
      return MartExporter.export(folder.table(id, export.table()), export, target);
    } catch (IOException e) {
      throw RunException.wrongCall(
          out + " could not be written; check its permissions and the free space", e);
    }
  }

  private String id(MartFolder folder) throws IOException {
    if (run.isPresent()) {
      if (!folder.published().contains(run.get())) {
        throw RunException.wrongCall(
            mart + " has no published run " + run.get() + "; the command runs lists them", null);
      }
      return run.get();
    }
    return folder
        .current()
        .filter(id -> Files.isDirectory(folder.run(id)))
        .orElseThrow(
            () ->
                RunException.wrongCall(
                    mart + " serves no run; make one with the command run", null));
  }
}
