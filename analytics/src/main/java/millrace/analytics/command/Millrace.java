package millrace.analytics.command;

import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The command line of the program. */
@Command(
    name = "millrace",
    description = {
      "Finds acute kidney injury in a hospital's extract and links it to drugs and low pressures.",
      "Retrospective surveillance for quality review; not for the care of a patient. Associations, not causes."
    },
    subcommands = {
      RunCommand.class,
      CheckCommand.class,
      RunsCommand.class,
      ExportCommand.class,
      PolicyCommand.class
    },
    synopsisSubcommandLabel = "run|check|runs|export|policy",
    mixinStandardHelpOptions = true)
public final class Millrace {
  private Millrace() {}

  /** Runs a command and ends with its exit status. */
  public static void main(String[] args) {
    System.exit(execute(args));
  }

  /** Runs a command; returns its exit status. */
  public static int execute(String... args) {
    CommandLine line = new CommandLine(Millrace.class, new ConstructorFactory());
    line.setParameterExceptionHandler(Failures::wrongCall);
    line.setExecutionExceptionHandler(Failures::failed);
    line.setUnmatchedOptionsArePositionalParams(false);
    line.setCaseInsensitiveEnumValuesAllowed(true);
    return line.execute(args);
  }

  /** Makes the commands; the root has nothing to make. */
  private static final class ConstructorFactory implements CommandLine.IFactory {
    private final CommandLine.IFactory others = CommandLine.defaultFactory();

    @Override
    public <K> K create(Class<K> type) throws Exception {
      return type == Millrace.class ? type.cast(new Millrace()) : others.create(type);
    }
  }
}
