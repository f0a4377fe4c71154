package millrace.ui.episodes;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import millrace.analytics.risk.Attribution;
import millrace.ui.page.Say;

/** A filter in words. */
final class FilterWords {
  private FilterWords() {}

  static String of(EpisodeFilter filter, Map<String, String> units) {
    List<String> words = new ArrayList<>();
    filter.month().ifPresent(m -> words.add("with onset in " + Say.month(m)));
    filter
        .unit()
        .ifPresent(
            u ->
                words.add(
                    (filter.attribution().filter(Attribution.DAY_BEFORE.word()::equals).isPresent()
                            ? "24 hours before in "
                            : "in ")
                        + units.getOrDefault(u, u)));
    filter.stage().ifPresent(s -> words.add(s.equals("2+") ? "of stage 2 or 3" : "of stage " + s));
    filter.origin().ifPresent(o -> words.add("of origin " + o));
    filter.cohortClass().ifPresent(c -> words.add("of class " + c.replace('-', ' ')));
    filter
        .recentHypotension()
        .ifPresent(r -> words.add((r ? "after" : "without") + " recent low pressure"));
    filter.counted().ifPresent(c -> words.add(c ? "that count in rates" : "that count in no rate"));
    filter
        .drugClass()
        .ifPresent(
            d ->
                words.add(
                    (filter.linked().orElse(true) ? "linked to class " : "not linked to class ")
                        + d));
    return words.isEmpty() ? "of every month, class and origin" : String.join(", ", words);
  }
}
