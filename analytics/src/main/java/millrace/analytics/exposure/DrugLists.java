package millrace.analytics.exposure;

import java.io.IOException;
import java.io.InputStream;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import millrace.analytics.policy.PolicyException;
import millrace.etl.record.Route;
import millrace.etl.record.Seconds;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Reads the watchlist and the combinations: the hospital's own files, or those that ship with the
 * program.
 */
public final class DrugLists {
  private static final List<String> WATCHLIST_COLUMNS =
      List.of(
          "agent", "atc", "class", "mechanism", "routes", "lag_hours", "look_back_days", "burden");
  private static final List<String> COMBINATION_COLUMNS = List.of("name", "members");
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180
          .builder()
          .setHeader()
          .setSkipHeaderRecord(true)
          .setTrim(true)
          .setIgnoreEmptyLines(true)
          .get();

  private DrugLists() {}

  /**
   * The watchlist.
   *
   * @param file the hospital's file, or empty for the shipped list
   * @throws PolicyException if it cannot be read or a row is wrong
   */
  public static Watchlist watchlist(Optional<Path> file) {
    String name = file.map(Path::toString).orElse("watchlist.csv");
    List<WatchedDrug> rows = new ArrayList<>();
    for (CSVRecord record : records(file, name, WATCHLIST_COLUMNS)) {
      Line line = new Line(name, record);
      rows.add(
          new WatchedDrug(
              line.text("agent"),
              line.text("atc"),
              line.text("class"),
              line.optional("mechanism"),
              line.routes(),
              line.seconds("lag_hours", Seconds.HOUR),
              line.seconds("look_back_days", Seconds.DAY),
              line.flag("burden")));
    }
    return new Watchlist(rows);
  }

  /**
   * The combinations.
   *
   * @param file the hospital's file, or empty for the shipped ones
   * @param watchlist where every member must be a class or an agent
   * @throws PolicyException if it cannot be read or a row is wrong
   */
  public static List<Combination> combinations(Optional<Path> file, Watchlist watchlist) {
    String name = file.map(Path::toString).orElse("combinations.csv");
    Set<String> known = new HashSet<>(watchlist.agents());
    known.addAll(watchlist.classes());
    List<Combination> combinations = new ArrayList<>();
    for (CSVRecord record : records(file, name, COMBINATION_COLUMNS)) {
      Line line = new Line(name, record);
      List<String> members =
          Arrays.stream(line.text("members").split(";")).map(String::strip).toList();
      for (String member : members) {
        // A member that a hospital's own shorter watchlist lacks can never expose; the shipped
        // combinations stay listed.
        if (!known.contains(member) && file.isPresent()) {
          throw line.wrong(
              "members",
              "names " + member + ", which the watchlist has neither as a class nor as an agent");
        }
      }
      combinations.add(new Combination(line.text("name"), members));
    }
    return combinations;
  }

  private static List<CSVRecord> records(Optional<Path> file, String name, List<String> columns) {
    try (CSVParser parser = CSVParser.parse(text(file, name), FORMAT)) {
      for (String column : columns) {
        if (!parser.getHeaderMap().containsKey(column)) {
          throw new PolicyException(
              name
                  + ", line 1: the column "
                  + column
                  + " is missing; the header is "
                  + String.join(",", columns));
        }
      }
      return parser.getRecords();
    } catch (IOException | IllegalArgumentException e) {
      throw new PolicyException(
          name + " cannot be read as CSV; check its name, header and quotes", e);
    }
  }

  private static String text(Optional<Path> file, String name) throws IOException {
    String text;
    if (file.isPresent()) {
      text = Files.readString(file.get());
    } else {
      try (InputStream in = DrugLists.class.getResourceAsStream("/millrace/" + name)) {
        text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      }
    }
    return text.startsWith("\uFEFF") ? text.substring(1) : text;
  }

  /** A row of a list, with its place for messages. */
  private record Line(String file, CSVRecord record) {
    String optional(String column) {
      return record.isSet(column) ? record.get(column) : "";
    }

    String text(String column) {
      String text = optional(column);
      if (text.isEmpty()) {
        throw wrong(column, "is empty");
      }
      return text;
    }

    Set<Route> routes() {
      Set<Route> routes = EnumSet.noneOf(Route.class);
      for (String word : text("routes").split(";")) {
        routes.add(
            Arrays.stream(Route.values())
                .filter(r -> r.word().equals(word.strip()))
                .findFirst()
                .orElseThrow(
                    () ->
                        wrong(
                            "routes",
                            "names "
                                + word.strip()
                                + ", which is no route of the extract contract")));
      }
      return routes;
    }

    long seconds(String column, long unit) {
      try {
        BigDecimal number = new BigDecimal(text(column));
        if (number.signum() >= 0) {
          return number.multiply(BigDecimal.valueOf(unit)).longValueExact();
        }
      } catch (ArithmeticException | NumberFormatException e) {
        throw wrong(column, "is " + optional(column) + ", which is no number of whole seconds");
      }
      throw wrong(column, "is " + optional(column) + "; it cannot be negative");
    }

    boolean flag(String column) {
      return switch (text(column).toLowerCase(java.util.Locale.ROOT)) {
        case "true", "yes", "y", "1" -> true;
        case "false", "no", "n", "0" -> false;
        default -> throw wrong(column, "is " + optional(column) + "; write true or false");
      };
    }

    PolicyException wrong(String column, String what) {
      return new PolicyException(
          file + ", row " + record.getRecordNumber() + ": " + column + " " + what);
    }
  }
}
