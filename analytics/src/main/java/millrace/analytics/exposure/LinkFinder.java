package millrace.analytics.exposure;

import java.time.Instant;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import millrace.analytics.timeline.IntervalSet;

/** Finds which agents, classes and combinations expose at an onset (methods 7). */
public final class LinkFinder {
  private final Subjects subjects;
  private final ZoneId zone;

  /** A finder. */
  public LinkFinder(Subjects subjects, ZoneId zone) {
    this.subjects = subjects;
    this.zone = zone;
  }

  /** The links of an onset, by agent. */
  public List<Link> links(Exposure exposure, long onset) {
    Map<String, List<WatchedDose>> inReach = new TreeMap<>();
    for (WatchedDose dose : exposure.doses()) {
      int subject = subjects.number(Subjects.Level.AGENT, dose.drug().agent());
      IntervalSet set = exposure.sets().getOrDefault(subject, IntervalSet.EMPTY);
      if (set.contains(onset) && dose.reaches(onset)) {
        inReach.computeIfAbsent(dose.drug().agent(), a -> new ArrayList<>()).add(dose);
      }
    }
    List<Link> links = new ArrayList<>();
    inReach.forEach((agent, doses) -> links.add(link(agent, doses)));
    return links;
  }

  /** Names of the subjects of a level that expose at an instant, sorted and joined. */
  public String exposing(Exposure exposure, Subjects.Level level, long instant) {
    List<String> names = new ArrayList<>();
    exposure
        .sets()
        .forEach(
            (number, set) -> {
              Subjects.Subject subject = subjects.all().get(number);
              if (subject.level() == level && set.contains(instant)) {
                names.add(subject.name());
              }
            });
    names.sort(null);
    return String.join(";", names);
  }

  private Link link(String agent, List<WatchedDose> doses) {
    long first = doses.stream().mapToLong(d -> d.dose().startedAt()).min().orElseThrow();
    long last = doses.stream().mapToLong(d -> d.dose().startedAt()).max().orElseThrow();
    long days =
        doses.stream()
            .map(d -> Instant.ofEpochSecond(d.dose().startedAt()).atZone(zone).toLocalDate())
            .distinct()
            .count();
    // One administration that two rows of an agent match is one dose.
    long number = doses.stream().map(d -> d.dose().source()).distinct().count();
    return new Link(agent, first, last, (int) days, (int) number);
  }
}
