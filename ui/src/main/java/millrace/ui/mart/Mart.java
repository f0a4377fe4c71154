package millrace.ui.mart;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import millrace.analytics.mart.ManifestFile;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.RunManifest;
import org.duckdb.DuckDBConnection;

/** The folder that runs are published in, and the database in memory that reads its files. */
public final class Mart implements AutoCloseable {
  private final Path folder;
  private final DuckDBConnection database;

  /**
   * Opens a database in memory; the folder is read at each {@link #open()}.
   *
   * @param folder folder of the mart
   */
  public Mart(Path folder) {
    this.folder = folder;
    this.database = start();
  }

  private static DuckDBConnection start() {
    try {
      Connection connection = DriverManager.getConnection("jdbc:duckdb:");
      try (Statement statement = connection.createStatement()) {
        statement.execute("SET threads = 2");
        statement.execute("SET memory_limit = '1GB'");
        statement.execute("SET TimeZone = 'UTC'");
        statement.execute("SET autoinstall_known_extensions = false");
      }
      return connection.unwrap(DuckDBConnection.class);
    } catch (SQLException e) {
      throw new MartException("the database in memory did not start: " + e.getMessage(), e);
    }
  }

  /**
   * Names the run that a mart serves.
   *
   * @throws MartException if there is none
   */
  public static String current(Path folder) {
    MartFolder mart = new MartFolder(folder);
    String mend =
        "; run 'java -jar millrace.jar run --extract DIR --mart " + folder + "' to publish one";
    try {
      String id =
          mart.current()
              .orElseThrow(
                  () ->
                      new MartException(
                          "the mart " + folder + " has no published run (no CURRENT)" + mend,
                          null));
      if (!Files.isRegularFile(mart.run(id).resolve(MartFolder.MANIFEST))) {
        throw new MartException(
            "the mart " + folder + " names run " + id + ", which is not there" + mend, null);
      }
      return id;
    } catch (IOException e) {
      throw new MartException("the mart " + folder + " cannot be read" + mend, e);
    }
  }

  /**
   * Opens the run that is served now.
   *
   * @throws MartException if there is none or it cannot be read
   */
  public Run open() {
    Path run = new MartFolder(folder).run(current(folder));
    try {
      RunManifest manifest = ManifestFile.read(run);
      return new Run(database, run, manifest);
    } catch (IOException e) {
      throw new MartException(
          "the description of run " + run.getFileName() + " cannot be read; publish a run again",
          e);
    }
  }

  @Override
  public void close() {
    try {
      database.close();
    } catch (SQLException e) {
      throw new MartException("the database in memory did not close", e);
    }
  }
}
