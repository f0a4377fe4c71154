package millrace.ui.mart;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import millrace.analytics.mart.Cautions;
import millrace.analytics.mart.Columns;
import millrace.analytics.mart.ManifestFile;
import millrace.analytics.mart.MartFolder;
import millrace.analytics.mart.MartTable;
import millrace.analytics.mart.RunManifest;

/** A small mart of invented rows. */
public final class MartFixture {
  /** The run that is served. */
  public static final String RUN = "r-invented";

  private final MartFolder mart;

  private MartFixture(Path folder) {
    this.mart = new MartFolder(folder);
  }

  /** Writes all tables of {@link InventedRows}. */
  public static Path write(Path folder) {
    MartFixture fixture = new MartFixture(folder);
    try (Connection connection = DriverManager.getConnection("jdbc:duckdb:")) {
      for (MartTable table : MartTable.values()) {
        Files.createDirectories(fixture.mart.table(RUN, table));
        fixture.table(connection, table, InventedRows.of(table));
      }
      ManifestFile.write(fixture.mart.run(RUN), manifest());
      Files.writeString(fixture.mart.currentFile(), RUN + "\n");
      return folder;
    } catch (SQLException e) {
      throw new IllegalStateException(e);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void table(Connection connection, MartTable table, List<? extends Record> rows)
      throws SQLException {
    RecordComponent[] components = table.rowType().getRecordComponents();
    List<String> names = Columns.of(table.rowType());
    String columns =
        IntStream.range(0, names.size())
            .mapToObj(i -> '"' + names.get(i) + "\" " + type(components[i]))
            .collect(Collectors.joining(", "));
    try (Statement statement = connection.createStatement()) {
      statement.execute("CREATE OR REPLACE TABLE t (" + columns + ")");
    }
    String marks =
        Arrays.stream(components)
            .map(c -> type(c).equals("TIMESTAMPTZ") ? "to_timestamp(?)" : "?")
            .collect(Collectors.joining(", "));
    try (PreparedStatement insert =
        connection.prepareStatement("INSERT INTO t VALUES (" + marks + ")")) {
      for (Record row : rows) {
        for (int i = 0; i < components.length; i++) {
          insert.setObject(i + 1, value(row, components[i]));
        }
        insert.execute();
      }
    }
    Path part = mart.table(RUN, table).resolve("part-00000.parquet");
    try (Statement statement = connection.createStatement()) {
      statement.execute("COPY t TO '" + part.toString().replace("'", "''") + "' (FORMAT parquet)");
    }
  }

  private static String type(RecordComponent component) {
    Class<?> type = component.getType();
    if (type == Optional.class) {
      type =
          (Class<?>) ((ParameterizedType) component.getGenericType()).getActualTypeArguments()[0];
    }
    if (type == Instant.class) {
      return "TIMESTAMPTZ";
    }
    if (type == long.class || type == OptionalLong.class) {
      return "BIGINT";
    }
    if (type == double.class || type == OptionalDouble.class) {
      return "DOUBLE";
    }
    return type == int.class ? "INTEGER" : type == boolean.class ? "BOOLEAN" : "VARCHAR";
  }

  private static Object value(Record row, RecordComponent component) {
    try {
      Object value = component.getAccessor().invoke(row);
      if (value instanceof Optional<?> optional) {
        value = optional.orElse(null);
      } else if (value instanceof OptionalLong optional) {
        return optional.isPresent() ? optional.getAsLong() : null;
      } else if (value instanceof OptionalDouble optional) {
        return optional.isPresent() ? optional.getAsDouble() : null;
      }
      return value instanceof Instant at ? (Object) (double) at.getEpochSecond() : value;
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(e);
    }
  }

  private static RunManifest manifest() {
    return new RunManifest(
        RUN,
        "0",
        "2031-05-01T00:00:00Z",
        "Saltreach General",
        "Europe/Dublin",
        "2031-01-01",
        "2031-05-01",
        "An invented hospital",
        "",
        new RunManifest.Extract("0", List.of()),
        Map.of("map_floor", "65"),
        new RunManifest.DrugListsUsed(List.of(), List.of(), List.of()),
        List.of(new RunManifest.TableAccount("results", 100, 98, 1, 1)),
        List.of(),
        Map.of(),
        Cautions.SENTENCES);
  }
}
