package millrace.analytics.exposure;

import java.io.Serializable;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import millrace.etl.record.Route;

/**
 * The watched drugs, found by ATC code: the longest matching code wins, then the route must be
 * listed (methods 7).
 */
public final class Watchlist implements Serializable {
  private static final long serialVersionUID = 1L;

  private final ArrayList<WatchedDrug> rows;
  private final HashMap<String, ArrayList<WatchedDrug>> byCode = new HashMap<>();

  /** A watchlist of these rows. */
  public Watchlist(List<WatchedDrug> rows) {
    this.rows = new ArrayList<>(rows);
    rows.forEach(row -> byCode.computeIfAbsent(row.atc(), c -> new ArrayList<>()).add(row));
  }

  /** Rows with the longest code that is the drug's code or its prefix, whatever their route. */
  public List<WatchedDrug> byCode(String atc) {
    for (int length = atc.length(); length > 0; length--) {
      List<WatchedDrug> found = byCode.get(atc.substring(0, length));
      if (found != null) {
        return found;
      }
    }
    return List.of();
  }

  /** Rows that a dose of that code by that route exposes to. */
  public List<WatchedDrug> exposing(String atc, Route route) {
    List<WatchedDrug> found = byCode(atc);
    if (found.isEmpty() || (found.size() == 1 && found.get(0).routes().contains(route))) {
      return found;
    }
    return found.stream().filter(row -> row.routes().contains(route)).toList();
  }

  /** Names of all agents, sorted. */
  public List<String> agents() {
    return List.copyOf(new TreeSet<>(rows.stream().map(WatchedDrug::agent).toList()));
  }

  /** Names of all classes, sorted. */
  public List<String> classes() {
    return List.copyOf(new TreeSet<>(rows.stream().map(WatchedDrug::drugClass).toList()));
  }

  /** Classes of an agent, sorted and joined; one, as a rule. */
  public Map<String, String> classOfAgent() {
    return joined(WatchedDrug::drugClass);
  }

  /** Mechanisms of each agent, sorted and joined. */
  public Map<String, String> mechanismOfAgent() {
    return joined(WatchedDrug::mechanism);
  }

  private Map<String, String> joined(java.util.function.Function<WatchedDrug, String> field) {
    Map<String, TreeSet<String>> values = new HashMap<>();
    for (WatchedDrug row : rows) {
      TreeSet<String> own = values.computeIfAbsent(row.agent(), a -> new TreeSet<>());
      for (String part : field.apply(row).split(";")) {
        own.add(part.strip());
      }
    }
    Map<String, String> joined = new HashMap<>();
    values.forEach((agent, parts) -> joined.put(agent, String.join(";", parts)));
    return joined;
  }
}
