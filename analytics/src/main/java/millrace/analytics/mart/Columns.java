package millrace.analytics.mart;

import java.lang.reflect.RecordComponent;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Names of the mart's columns: the components of a row type in snake case. */
public final class Columns {
  /** {@code class} is a reserved word in Java. */
  private static final Map<String, String> RESERVED =
      Map.of("cohortClass", "class", "drugClass", "class");

  private Columns() {}

  /** Column names of a row type, in order. */
  public static List<String> of(Class<? extends Record> rowType) {
    return Arrays.stream(rowType.getRecordComponents())
        .map(RecordComponent::getName)
        .map(Columns::of)
        .toList();
  }

  private static String of(String component) {
    String reserved = RESERVED.get(component);
    return reserved != null
        ? reserved
        : component.replaceAll("(?<=[a-z0-9])(?=[A-Z])", "_").toLowerCase(Locale.ROOT);
  }
}
