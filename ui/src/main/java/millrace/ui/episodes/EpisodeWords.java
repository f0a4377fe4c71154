package millrace.ui.episodes;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Words of the mart in a reader's words. */
final class EpisodeWords {
  private static final Map<String, String> EVIDENCE =
      Map.of(
          "RISE_48H", "rise in 48 h",
          "RATIO_7D", "ratio in 7 d",
          "RATIO_BASELINE", "ratio to baseline",
          "FALL_7D", "fall in 7 d",
          "REPLACEMENT", "replacement");

  private EpisodeWords() {}

  static String evidence(String joined) {
    return Arrays.stream(joined.split(";"))
        .map(e -> EVIDENCE.getOrDefault(e, e))
        .collect(Collectors.joining("; "));
  }

  static String unit(Optional<String> id, Map<String, String> names) {
    return id.filter(u -> !u.isEmpty()).map(u -> names.getOrDefault(u, u)).orElse("no unit");
  }
}
