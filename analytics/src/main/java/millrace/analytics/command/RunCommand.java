package millrace.analytics.command;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.RunManifest;
import millrace.analytics.spark.MartRun;
import millrace.analytics.spark.Progress;
import millrace.analytics.spark.RunPlan;
import millrace.etl.ExitStatus;
import millrace.etl.contract.DescriptorReader;
import org.apache.spark.sql.SparkSession;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Computes an extract and publishes the result in a mart. */
@Command(
    name = "run",
    description = "Computes an extract and publishes the result in a mart.",
    mixinStandardHelpOptions = true)
final class RunCommand implements Callable<Integer>, SparkCommand {
  @Option(
      names = "--extract",
      required = true,
      paramLabel = "DIR",
      description = "folder of the extract")
  private Path extract;

  @Option(
      names = "--mart",
      required = true,
      paramLabel = "DIR",
      description = "folder of the mart; made when there is none")
  private Path mart;

  @Option(
      names = "--policy",
      paramLabel = "FILE",
      description = "policy file; the command policy prints the default")
  private Optional<Path> policy = Optional.empty();

  @Mixin private SparkOptions options;

  @Override
  public Integer call() throws Exception {
    RunPlan plan = RunPlan.of(extract, policy);
    DescriptorReader.read(extract);
    Progress progress = options.progress();
    RunManifest manifest;
    try (SparkSession spark = options.start()) {
      manifest = new MartRun(spark, plan, progress).run(mart);
    } finally {
      progress.end();
    }
    RunReport.print(System.out, new MartFolder(mart), manifest);
    return ExitStatus.DONE.code();
  }

  @Override
  public boolean verbose() {
    return options.verbose();
  }
}
