package millrace.analytics.policy;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.yaml.snakeyaml.LoaderOptions;
import org.yaml.snakeyaml.Yaml;
import org.yaml.snakeyaml.constructor.SafeConstructor;
import org.yaml.snakeyaml.error.MarkedYAMLException;
import org.yaml.snakeyaml.error.YAMLException;

/** Reads a policy file over the defaults that ship with the program. */
public final class PolicyReader {
  private static final String DEFAULTS = "/millrace/policy.yaml";
  private static final Set<String> NAMES_OF_FILES = Set.of("watchlist", "combinations");
  private static final int FARTHEST_SUGGESTION = 4;

  private PolicyReader() {}

  /** The default policy file, commented. */
  public static String defaultText() {
    try (InputStream in = PolicyReader.class.getResourceAsStream(DEFAULTS)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new IllegalStateException("the program lacks its own " + DEFAULTS, e);
    }
  }

  /** The default policy. */
  public static Policy defaults() {
    return policy("default policy", Map.of());
  }

  /**
   * Reads a policy file.
   *
   * @throws PolicyException if it cannot be read, names a setting that does not exist, or gives one
   *     a wrong value
   */
  public static Policy read(Path file) {
    try {
      return policy(file.toString(), parse(file.toString(), Files.readString(file)));
    } catch (IOException e) {
      throw new PolicyException(
          file + " cannot be read as a policy file; check its name and permissions", e);
    }
  }

  private static Policy policy(String file, Map<String, Object> own) {
    Map<String, Object> values = new LinkedHashMap<>(parse("default policy", defaultText()));
    Set<String> known = new TreeSet<>(values.keySet());
    known.addAll(NAMES_OF_FILES);
    for (String key : own.keySet()) {
      if (!known.contains(key)) {
        throw new PolicyException(file + ": there is no setting " + key + suggestion(key, known));
      }
    }
    values.putAll(own);
    return Policy.of(new Settings(file, values));
  }

  private static Map<String, Object> parse(String file, String text) {
    try {
      LoaderOptions options = new LoaderOptions();
      options.setAllowDuplicateKeys(false);
      Object root = new Yaml(new SafeConstructor(options)).load(text);
      Map<String, Object> settings = new LinkedHashMap<>();
      if (root instanceof Map<?, ?> map) {
        map.forEach((key, value) -> settings.put(String.valueOf(key), value));
      } else if (root != null) {
        throw new PolicyException(
            file + " is no list of settings; write one setting a line, as: min_age: 18");
      }
      return settings;
    } catch (MarkedYAMLException e) {
      String line =
          e.getProblemMark() == null ? "" : ", line " + (e.getProblemMark().getLine() + 1);
      throw new PolicyException(file + line + ": " + e.getProblem() + "; mend the YAML", e);
    } catch (YAMLException e) {
      throw new PolicyException(file + " is no readable YAML; mend it", e);
    }
  }

  private static String suggestion(String key, Set<String> known) {
    List<String> nearest =
        known.stream().sorted(Comparator.comparingInt(k -> distance(key, k))).toList();
    return distance(key, nearest.get(0)) <= FARTHEST_SUGGESTION
        ? "; did you mean " + nearest.get(0) + "?"
        : "; the command policy prints all settings";
  }

  /** Levenshtein distance. */
  private static int distance(String a, String b) {
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int changed = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(changed, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()];
  }
}
