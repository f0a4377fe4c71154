package millrace.analytics.command;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import millrace.analytics.mart.ManifestFile;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.RunManifest;
import millrace.analytics.spark.RunException;
import millrace.etl.ExitStatus;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Lists the published runs of a mart. */
@Command(
    name = "runs",
    description = "Lists the published runs of a mart; * marks the one that is served.",
    mixinStandardHelpOptions = true)
final class RunsCommand implements Callable<Integer> {
  @Option(names = "--mart", required = true, paramLabel = "DIR", description = "folder of the mart")
  private Path mart;

  @Override
  public Integer call() throws Exception {
    if (!Files.isDirectory(mart)) {
      throw RunException.wrongCall(mart + " is no folder; name the folder of a mart", null);
    }
    MartFolder folder = new MartFolder(mart);
    String current = folder.current().orElse("");
    TextTable table = new TextTable().row("", "run", "published", "site", "cover", "extract");
    for (String id : folder.published()) {
      RunManifest run = ManifestFile.read(folder.run(id));
      table.row(
          id.equals(current) ? "*" : "",
          run.runId(),
          run.finishedAt(),
          run.site(),
          run.coversFrom() + " to " + run.coversTo(),
          run.extract().fingerprint().substring(0, 12));
    }
    table.print(System.out);
    return ExitStatus.DONE.code();
  }
}
