package millrace.analytics.cohort;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * Condition codes of a policy, compared without point and case; {@code *} at the end makes a prefix
 * (methods 6).
 */
final class CodePatterns {
  private final Set<String> codes = new HashSet<>();
  private final List<String> prefixes = new ArrayList<>();

  CodePatterns(List<String> patterns) {
    for (String pattern : patterns) {
      String plain = pattern.replace(".", "").replace(" ", "").toUpperCase(Locale.ROOT);
      if (plain.endsWith("*")) {
        prefixes.add(plain.substring(0, plain.length() - 1));
      } else {
        codes.add(plain);
      }
    }
  }

  boolean matches(String plainCode) {
    return codes.contains(plainCode) || prefixes.stream().anyMatch(plainCode::startsWith);
  }
}
