package millrace.ui.mart;

import java.util.ArrayList;
import java.util.List;

/**
 * Which rows of a table; all parts hold. Values of a user go in as parameters only.
 *
 * @param parts expressions with a ? for each value
 * @param values values in their order
 */
public record Condition(List<String> parts, List<Object> values) {
  /** Every row. */
  public static final Condition ALL = new Condition(List.of(), List.of());

  /** Copies both lists. */
  public Condition {
    parts = List.copyOf(parts);
    values = List.copyOf(values);
  }

  /** Rows whose column has a value. */
  public static Condition equal(String column, Object value) {
    return ALL.and(column + " = ?", value);
  }

  /** This and one expression more. */
  public Condition and(String part, Object... more) {
    List<String> allParts = new ArrayList<>(parts);
    allParts.add(part);
    List<Object> allValues = new ArrayList<>(values);
    allValues.addAll(List.of(more));
    return new Condition(allParts, allValues);
  }

  String where() {
    return parts.isEmpty() ? "" : " WHERE (" + String.join(") AND (", parts) + ")";
  }
}
