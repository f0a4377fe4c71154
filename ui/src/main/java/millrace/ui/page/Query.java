package millrace.ui.page;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.time.DateTimeException;
import java.time.YearMonth;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/** The values after the question mark of an address: read strictly, written in a fixed order. */
public final class Query {
  private final Map<String, List<String>> values;

  private Query(Map<String, List<String>> values) {
    this.values = values;
  }

  /**
   * Takes the values of an address.
   *
   * @throws BadAddress if one is unknown or given twice
   */
  public static Query of(Map<String, List<String>> values, Set<String> known) {
    values.forEach(
        (name, all) -> {
          if (!known.contains(name)) {
            throw new BadAddress(
                "This page knows no value called '"
                    + name
                    + "'; it knows "
                    + String.join(", ", known.stream().sorted().toList())
                    + ".");
          }
          if (all.size() > 1) {
            throw new BadAddress("The value '" + name + "' stands twice in the address.");
          }
        });
    return new Query(values);
  }

  /** A text, or empty when absent or blank. */
  public Optional<String> text(String name) {
    List<String> all = values.getOrDefault(name, List.of());
    return all.isEmpty() || all.get(0).isBlank() ? Optional.empty() : Optional.of(all.get(0));
  }

  /** One of some words, or empty. */
  public Optional<String> word(String name, List<String> words) {
    Optional<String> value = text(name);
    if (value.isPresent() && !words.contains(value.get())) {
      throw new BadAddress(
          "The value '" + name + "' may be " + String.join(", ", words) + ", nothing else.");
    }
    return value;
  }

  /** Yes or no, or empty. */
  public Optional<Boolean> flag(String name) {
    return word(name, List.of("yes", "no")).map("yes"::equals);
  }

  /** A month, or empty. */
  public Optional<YearMonth> month(String name) {
    return text(name)
        .map(
            text -> {
              try {
                if (text.matches("\\d{4}-\\d{2}")) {
                  return YearMonth.parse(text);
                }
              } catch (DateTimeException e) {
                // falls through to the one message
              }
              throw new BadAddress(
                  "The value '" + name + "' must be a month, year first, as in 2031-03.");
            });
  }

  /** Writes values behind a path, those that are there, in their order. */
  public static String address(String path, Map<String, Optional<String>> values) {
    Map<String, String> there = new LinkedHashMap<>();
    values.forEach((name, value) -> value.ifPresent(v -> there.put(name, v)));
    String query =
        there.entrySet().stream()
            .map(e -> e.getKey() + "=" + URLEncoder.encode(e.getValue(), StandardCharsets.UTF_8))
            .collect(Collectors.joining("&"));
    return query.isEmpty() ? path : path + "?" + query;
  }

  /** The word of a flag. */
  public static Optional<String> word(Optional<Boolean> flag) {
    return flag.map(f -> f ? "yes" : "no");
  }
}
