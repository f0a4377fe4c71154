package millrace.analytics.command;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import millrace.analytics.spark.ExtractCheck;
import millrace.analytics.spark.Progress;
import millrace.etl.ExitStatus;
import millrace.etl.contract.DescriptorReader;
import org.apache.spark.sql.SparkSession;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Checks an extract against its contract and computes nothing from it. */
@Command(
    name = "check",
    description = "Checks an extract against its contract and computes nothing from it.",
    mixinStandardHelpOptions = true)
final class CheckCommand implements Callable<Integer>, SparkCommand {
  @Option(
      names = "--extract",
      required = true,
      paramLabel = "DIR",
      description = "folder of the extract")
  private Path extract;

  @Option(
      names = "--report",
      paramLabel = "DIR",
      description =
          "folder for quarantine.csv and findings.csv; sensitive, for it holds the raw rows")
  private Optional<Path> report = Optional.empty();

  @Mixin private SparkOptions options;

  @Override
  public Integer call() throws Exception {
    DescriptorReader.read(extract);
    Progress progress = options.progress();
    ExtractCheck.Report result;
    try (SparkSession spark = options.start()) {
      result = ExtractCheck.check(spark, extract, report.orElse(null), progress);
    } finally {
      progress.end();
    }
    CheckReport.print(System.out, result, report);
    return ExitStatus.DONE.code();
  }

  @Override
  public boolean verbose() {
    return options.verbose();
  }
}
