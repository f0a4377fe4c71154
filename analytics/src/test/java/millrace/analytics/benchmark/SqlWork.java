package millrace.analytics.benchmark;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import millrace.etl.contract.DescriptorReader;
import millrace.etl.contract.ExtractDescriptor;

/**
 * Runs {@code same_work.sql} over an extract, part by part, in a database in memory that may spill
 * to disk.
 */
final class SqlWork {
  private static final String PART = "-- part: ";
  private static final double NANOS = 1e9;

  private SqlWork() {}

  /** A part of the script and how long it took. */
  record Part(String name, double seconds) {}

  /** What the script did. */
  record Outcome(List<Part> parts, Map<String, Long> rows) {
    double seconds() {
      return parts.stream().mapToDouble(Part::seconds).sum();
    }
  }

  /**
   * Runs the script.
   *
   * @param extract folder of the extract
   * @param work folder for what it writes and spills
   * @param threads threads of the database
   */
  static Outcome run(Path extract, Path work, int threads) throws IOException, SQLException {
    Files.createDirectories(work);
    List<Part> parts = new ArrayList<>();
    try (Connection connection = DriverManager.getConnection("jdbc:duckdb:");
        Statement statement = connection.createStatement()) {
      statement.execute("SET threads = " + threads);
      statement.execute("SET memory_limit = '4GB'");
      statement.execute("SET TimeZone = 'UTC'");
      statement.execute("SET preserve_insertion_order = false");
      statement.execute("SET temp_directory = '" + work.resolve("spill") + "'");
      for (String part : script(extract, work).split(PART)) {
        if (!part.startsWith("-- ")) {
          String name = part.lines().findFirst().orElseThrow();
          long start = System.nanoTime();
          statement.execute(part.substring(name.length()));
          parts.add(new Part(name, (System.nanoTime() - start) / NANOS));
        }
      }
      return new Outcome(parts, rows(statement));
    }
  }

  private static Map<String, Long> rows(Statement statement) throws SQLException {
    Map<String, Long> rows = new HashMap<>();
    for (String table :
        List.of(
            "patients",
            "admissions",
            "results",
            "pressures",
            "hits",
            "exposures",
            "spells",
            "risk_by_unit",
            "risk_by_agent")) {
      try (ResultSet count = statement.executeQuery("SELECT count(*) FROM " + table)) {
        count.next();
        rows.put(table, count.getLong(1));
      }
    }
    return rows;
  }

  private static String script(Path extract, Path work) throws IOException {
    ExtractDescriptor descriptor = DescriptorReader.read(extract);
    String script = resource("/benchmark/same_work.sql");
    for (ExtractDescriptor.Resource resource : descriptor.resources()) {
      String files =
          resource.paths().stream()
              .map(p -> "'" + extract.resolve(p).toAbsolutePath() + "'")
              .collect(Collectors.joining(", ", "[", "]"));
      script = script.replace("${" + resource.table().tableName() + "}", files);
    }
    Path watchlist = work.resolve("watchlist.csv");
    Files.writeString(watchlist, resource("/millrace/watchlist.csv"));
    return script
        .replace("${watchlist}", watchlist.toString())
        .replace("${zone}", descriptor.cover().zone().getId())
        .replace("${covers_from}", descriptor.cover().fromDate().toString())
        .replace("${covers_to}", descriptor.cover().toDate().toString())
        .replace("${out}", work.toString());
  }

  private static String resource(String name) throws IOException {
    try (InputStream in = SqlWork.class.getResourceAsStream(name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
