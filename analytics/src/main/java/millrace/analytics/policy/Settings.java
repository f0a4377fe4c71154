package millrace.analytics.policy;

import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The settings of a policy file by name, over the defaults.
 *
 * @param file file they come from, for the messages
 * @param values every setting
 */
record Settings(String file, Map<String, Object> values) {
  private static final Pattern DURATION = Pattern.compile("(\\d{1,9})\\s*(s|min|h|d)");

  long seconds(String key) {
    return seconds(key, values.get(key));
  }

  /** A duration inside a setting that is a map. */
  long seconds(String key, String part) {
    Object value = values.get(key);
    if (!(value instanceof Map<?, ?> map) || !map.containsKey(part)) {
      throw wrong(key, value, "write a map with " + part);
    }
    return seconds(key, map.get(part));
  }

  int whole(String key) {
    Object value = values.get(key);
    if (value instanceof Integer number && number >= 0) {
      return number;
    }
    throw wrong(key, value, "write a whole number, 0 or more");
  }

  boolean flag(String key) {
    if (values.get(key) instanceof Boolean flag) {
      return flag;
    }
    throw wrong(key, values.get(key), "write true or false");
  }

  String oneOf(String key, List<String> words) {
    String word = String.valueOf(values.get(key));
    if (words.contains(word)) {
      return word;
    }
    throw wrong(key, word, "write one of " + String.join(", ", words));
  }

  /** A text, or empty when the setting is not given. */
  String text(String key) {
    Object value = values.get(key);
    if (value == null || value instanceof String) {
      return value == null ? "" : (String) value;
    }
    throw wrong(key, value, "write the name of a file");
  }

  List<String> texts(String key) {
    if (values.get(key) instanceof List<?> list) {
      return list.stream().map(String::valueOf).toList();
    }
    throw wrong(key, values.get(key), "write a list, as [A, B]");
  }

  private long seconds(String key, Object value) {
    Matcher form = DURATION.matcher(String.valueOf(value).strip());
    if (!form.matches()) {
      throw wrong(key, value, "write a whole number and a unit, as 48 h, 7 d or 15 min");
    }
    long number = Long.parseLong(form.group(1));
    return switch (form.group(2)) {
      case "s" -> number;
      case "min" -> number * 60;
      case "h" -> number * 3_600;
      default -> number * 86_400;
    };
  }

  private PolicyException wrong(String key, Object value, String mend) {
    return new PolicyException(file + ": " + key + " is " + value + "; " + mend);
  }
}
