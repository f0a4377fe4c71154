package millrace.ui.episodes;

import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import millrace.analytics.mart.DoseLine;
import millrace.analytics.mart.LinkRow;
import millrace.ui.page.Say;

/**
 * A drug that was given around the onset and is not linked.
 *
 * @param name drug and route
 * @param reason why not
 * @param rule rule
 */
record NotLinked(String name, String reason, String rule) {
  private static final String NOT_WATCHED = "not watched";
  private static final long SECONDS_OF_AN_HOUR = 3_600;
  private static final long SECONDS_OF_A_DAY = 86_400;

  static List<NotLinked> of(EpisodeData data) {
    Set<String> linked = data.links().stream().map(LinkRow::agent).collect(Collectors.toSet());
    Map<String, List<DoseLine>> byName = new TreeMap<>();
    Set<String> notWatched = new java.util.TreeSet<>();
    for (DoseLine dose : data.dosesShown()) {
      if (dose.agent().isEmpty() && dose.note().equals(NOT_WATCHED)) {
        notWatched.add(drug(dose));
      } else if (!(dose.exposing() && dose.agent().filter(linked::contains).isPresent())) {
        byName.computeIfAbsent(drug(dose) + " " + dose.route(), n -> new ArrayList<>()).add(dose);
      }
    }
    List<NotLinked> all = new ArrayList<>();
    byName.forEach((name, doses) -> all.add(reason(name, doses, data.episode().onsetAt())));
    if (!notWatched.isEmpty()) {
      all.add(
          new NotLinked(
              Say.count(notWatched.size(), "other drug"),
              "not on the watchlist (" + String.join(", ", notWatched) + ").",
              "methods 7"));
    }
    return all;
  }

  /** Name of a drug, or its code. */
  static String drug(DoseLine dose) {
    return dose.drugName().isEmpty() ? dose.drug() : dose.drugName();
  }

  /** Lag and look-back in words. */
  static String window(DoseLine dose) {
    return "lag "
        + dose.lagSeconds() / SECONDS_OF_AN_HOUR
        + " h, look-back "
        + dose.lookBackSeconds() / SECONDS_OF_A_DAY
        + " d";
  }

  private static NotLinked reason(String name, List<DoseLine> doses, Instant onset) {
    Optional<DoseLine> noted = doses.stream().filter(d -> !d.exposing()).findFirst();
    if (noted.isPresent()) {
      return new NotLinked(name, noted.get().note() + ".", "methods 7");
    }
    DoseLine first = doses.get(0);
    DoseLine last =
        doses.stream()
            .max(Comparator.comparing(d -> d.endedAt().orElse(d.startedAt())))
            .orElseThrow();
    Instant end = last.endedAt().orElse(last.startedAt());
    String rule = window(first) + " · methods 7";
    if (first.startedAt().isAfter(onset)) {
      return new NotLinked(
          name,
          "the first dose shown is " + Clock.span(onset, first.startedAt()) + " after onset.",
          rule);
    }
    if (first.startedAt().isAfter(onset.minusSeconds(first.lagSeconds()))) {
      return new NotLinked(
          name,
          "first dose " + Clock.span(first.startedAt(), onset) + " before onset, inside the lag.",
          rule);
    }
    if (!end.plusSeconds(last.lookBackSeconds()).isAfter(onset)) {
      return new NotLinked(
          name,
          "last dose " + Clock.span(end, onset) + " before onset, beyond the look-back.",
          rule);
    }
    return new NotLinked(name, "no dose reaches the onset.", rule);
  }
}
