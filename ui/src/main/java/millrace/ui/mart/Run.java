package millrace.ui.mart;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RunManifest;
import org.duckdb.DuckDBConnection;

/** A published run. Its files never change, so it may be read for as long as it is there. */
public final class Run {
  private final DuckDBConnection database;
  private final Path folder;
  private final RunManifest manifest;

  Run(DuckDBConnection database, Path folder, RunManifest manifest) {
    this.database = database;
    this.folder = folder;
    this.manifest = manifest;
  }

  /** What run.json says. */
  public RunManifest manifest() {
    return manifest;
  }

  /** All rows of a table. */
  public <R extends Record> List<R> rows(Class<R> type) {
    return rows(type, Condition.ALL, "");
  }

  /**
   * Rows of a table.
   *
   * @param type its row
   * @param condition which
   * @param tail order and limits: text of the program, never of a user
   */
  public <R extends Record> List<R> rows(Class<R> type, Condition condition, String tail) {
    MartTable table = table(type);
    List<Path> files = files(table);
    if (files.isEmpty()) {
      return List.of();
    }
    RecordReader<R> reader = new RecordReader<>(type);
    String sql = "SELECT " + reader.columns() + from(files) + condition.where() + " " + tail;
    return query(
        table,
        sql,
        condition,
        row -> {
          List<R> all = new ArrayList<>();
          while (row.next()) {
            all.add(reader.read(row));
          }
          return all;
        });
  }

  /** How many rows of a table meet a condition. */
  public int count(Class<? extends Record> type, Condition condition) {
    MartTable table = table(type);
    List<Path> files = files(table);
    if (files.isEmpty()) {
      return 0;
    }
    String sql = "SELECT count(*)" + from(files) + condition.where();
    return query(
        table,
        sql,
        condition,
        row -> {
          row.next();
          return Math.toIntExact(row.getLong(1));
        });
  }

  private interface Reading<T> {
    T of(ResultSet rows) throws SQLException;
  }

  private <T> T query(MartTable table, String sql, Condition condition, Reading<T> reading) {
    try (Connection connection = database.duplicate();
        PreparedStatement statement = connection.prepareStatement(sql)) {
      for (int i = 0; i < condition.values().size(); i++) {
        statement.setObject(i + 1, condition.values().get(i));
      }
      try (ResultSet rows = statement.executeQuery()) {
        return reading.of(rows);
      }
    } catch (SQLException e) {
      throw new MartException(
          "table "
              + table.tableName()
              + " of run "
              + manifest.runId()
              + " cannot be read; publish a run again with this version of the program",
          e);
    }
  }

  private static MartTable table(Class<? extends Record> type) {
    return Stream.of(MartTable.values())
        .filter(t -> t.rowType() == type)
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no table of " + type.getSimpleName()));
  }

  private List<Path> files(MartTable table) {
    Path at = folder.resolve(table.tableName());
    try (Stream<Path> files = Files.list(at)) {
      return files.filter(f -> f.getFileName().toString().endsWith(".parquet")).sorted().toList();
    } catch (IOException e) {
      throw new MartException(
          "table "
              + table.tableName()
              + " of run "
              + manifest.runId()
              + " is not there; publish a run again",
          e);
    }
  }

  private static String from(List<Path> files) {
    return files.stream()
        .map(f -> "'" + f.toString().replace("'", "''") + "'")
        .collect(Collectors.joining(", ", " FROM read_parquet([", "])"));
  }
}
