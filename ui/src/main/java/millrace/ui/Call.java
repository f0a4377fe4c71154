package millrace.ui;

import java.io.IOException;
import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.ServerSocket;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartException;

/**
 * How the dashboard was called.
 *
 * @param mart folder of the mart
 * @param port port to listen on
 */
public record Call(Path mart, int port) {
  /** The only address it listens on. */
  public static final String HOST = "127.0.0.1";

  /** What can be asked for. */
  public static final String USAGE =
      """
      Usage: java -jar millrace-ui.jar --mart DIR [--port 8080]
        --mart DIR    Folder that 'millrace run --mart DIR' filled.
        --port PORT   Port on 127.0.0.1, 1 to 65535 (default: 8080).
        --help        Print this help.""";

  private static final int DEFAULT_PORT = 8080;
  private static final int LAST_PORT = 65_535;

  /** A call that cannot be served; the message says why and what to do. */
  public static final class WrongCall extends Exception {
    private static final long serialVersionUID = 1L;

    WrongCall(String message) {
      super(message);
    }
  }

  /**
   * Reads the arguments.
   *
   * @throws WrongCall if an option is unknown, twice, without value or missing
   */
  public static Call parse(String... args) throws WrongCall {
    String mart = null;
    String port = null;
    for (int i = 0; i < args.length; i++) {
      int equals = args[i].startsWith("--") ? args[i].indexOf('=') : -1;
      String option = equals < 0 ? args[i] : args[i].substring(0, equals);
      if (!option.equals("--mart") && !option.equals("--port")) {
        throw new WrongCall("unknown option '" + option + "'; it knows --mart DIR and --port PORT");
      }
      if (equals < 0 && i + 1 == args.length) {
        throw new WrongCall(option + " lacks its value; see --help");
      }
      String value = equals < 0 ? args[++i] : args[i].substring(equals + 1);
      if (option.equals("--mart") ? mart != null : port != null) {
        throw new WrongCall(option + " is given twice; give it once");
      }
      if (option.equals("--mart")) {
        mart = value;
      } else {
        port = value;
      }
    }
    if (mart == null || mart.isBlank()) {
      throw new WrongCall("no mart given; add --mart DIR, the folder that 'millrace run' filled");
    }
    return new Call(path(mart), port == null ? DEFAULT_PORT : port(port));
  }

  private static Path path(String text) throws WrongCall {
    try {
      return Path.of(text);
    } catch (InvalidPathException e) {
      throw new WrongCall("--mart is no path; give the folder that 'millrace run' filled");
    }
  }

  private static int port(String text) throws WrongCall {
    try {
      int port = Integer.parseInt(text);
      if (port >= 1 && port <= LAST_PORT) {
        return port;
      }
    } catch (NumberFormatException e) {
      // falls through to the one message
    }
    throw new WrongCall("--port must be a whole number from 1 to 65535, and is '" + text + "'");
  }

  /**
   * Checks mart and port before anything starts.
   *
   * @throws WrongCall if the mart cannot be served or the port is taken
   */
  public void check() throws WrongCall {
    if (!Files.isDirectory(mart)) {
      throw new WrongCall(
          "there is no folder "
              + mart
              + "; make one with 'java -jar millrace.jar run --extract DIR --mart "
              + mart
              + "'");
    }
    try {
      Mart.current(mart);
    } catch (MartException e) {
      throw new WrongCall(e.getMessage());
    }
    try (ServerSocket socket = new ServerSocket()) {
      socket.setReuseAddress(true);
      socket.bind(new InetSocketAddress(InetAddress.getByName(HOST), port));
    } catch (IOException e) {
      throw new WrongCall(
          "port " + port + " is in use or not allowed; choose another one with --port");
    }
  }
}
