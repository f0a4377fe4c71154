package millrace.analytics.exposure;

import java.io.Serializable;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Everything whose exposed time is counted, numbered: agents, classes, combinations. */
public final class Subjects implements Serializable {
  private static final long serialVersionUID = 1L;

  /** A level of subjects. */
  public enum Level {
    /** A single agent. */
    AGENT("agent"),
    /** A class of agents. */
    CLASS("class"),
    /** A combination. */
    COMBINATION("combination");

    private final String word;

    Level(String word) {
      this.word = word;
    }

    /** Its name in exports. */
    public String word() {
      return word;
    }
  }

  /** A subject. */
  public record Subject(Level level, String name) implements Serializable {}

  private final Watchlist watchlist;
  private final ArrayList<Combination> combinations;
  private final ArrayList<Subject> all = new ArrayList<>();
  private final HashMap<Subject, Integer> numbers = new HashMap<>();
  private final HashMap<String, String> classes;
  private final HashMap<String, String> mechanisms;

  /** The subjects of a watchlist and its combinations. */
  public Subjects(Watchlist watchlist, List<Combination> combinations) {
    this.watchlist = watchlist;
    this.combinations = new ArrayList<>(combinations);
    this.classes = new HashMap<>(watchlist.classOfAgent());
    this.mechanisms = new HashMap<>(watchlist.mechanismOfAgent());
    watchlist.agents().forEach(name -> add(Level.AGENT, name));
    watchlist.classes().forEach(name -> add(Level.CLASS, name));
    combinations.stream()
        .map(Combination::name)
        .sorted()
        .forEach(name -> add(Level.COMBINATION, name));
  }

  /** All subjects by number. */
  public List<Subject> all() {
    return all;
  }

  /** The number of a subject. */
  public int number(Level level, String name) {
    return numbers.get(new Subject(level, name));
  }

  /** The watchlist. */
  public Watchlist watchlist() {
    return watchlist;
  }

  /** The combinations. */
  public List<Combination> combinations() {
    return combinations;
  }

  /** Class of an agent. */
  public Map<String, String> classOfAgent() {
    return classes;
  }

  /** Mechanism of an agent. */
  public Map<String, String> mechanismOfAgent() {
    return mechanisms;
  }

  private void add(Level level, String name) {
    numbers.computeIfAbsent(
        new Subject(level, name),
        subject -> {
          all.add(subject);
          return all.size() - 1;
        });
  }
}
