package millrace.analytics.command;

import java.util.concurrent.Callable;
import millrace.analytics.policy.PolicyReader;
import millrace.etl.ExitStatus;
import picocli.CommandLine.Command;

/** Prints the default policy file. */
@Command(
    name = "policy",
    description = "Prints the default policy file, commented.",
    mixinStandardHelpOptions = true)
final class PolicyCommand implements Callable<Integer> {
  @Override
  public Integer call() {
    System.out.print(PolicyReader.defaultText());
    return ExitStatus.DONE.code();
  }
}
