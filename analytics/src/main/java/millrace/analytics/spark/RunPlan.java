package millrace.analytics.spark;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import millrace.analytics.exposure.DrugLists;
import millrace.analytics.exposure.Subjects;
import millrace.analytics.exposure.Watchlist;
import millrace.analytics.policy.Policy;
import millrace.analytics.policy.PolicyReader;

/**
 * What a run is asked to do, checked before Spark starts.
 *
 * @param extract folder of the extract
 * @param policy the policy
 * @param subjects watchlist and combinations
 */
public record RunPlan(Path extract, Policy policy, Subjects subjects) {
  /**
   * The plan of a call.
   *
   * @param policyFile the policy file, or empty for the defaults; files it names lie beside it, or
   *     where the program was called
   * @throws millrace.analytics.policy.PolicyException if the policy, watchlist or combinations
   *     cannot be used
   */
  public static RunPlan of(Path extract, Optional<Path> policyFile) {
    Policy policy = policyFile.map(PolicyReader::read).orElseGet(PolicyReader::defaults);
    Watchlist watchlist =
        DrugLists.watchlist(beside(policyFile, policy.exposure().watchlistFile()));
    return new RunPlan(
        extract,
        policy,
        new Subjects(
            watchlist,
            DrugLists.combinations(
                beside(policyFile, policy.exposure().combinationsFile()), watchlist)));
  }

  /** A file that a policy names: beside the policy file, else where the program was called. */
  private static Optional<Path> beside(Optional<Path> policyFile, String name) {
    if (name.isEmpty()) {
      return Optional.empty();
    }
    Path here = Path.of(name);
    Path beside = policyFile.map(p -> p.toAbsolutePath().resolveSibling(name)).orElse(here);
    return Optional.of(Files.exists(beside) || !Files.exists(here) ? beside : here);
  }
}
