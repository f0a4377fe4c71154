package millrace.analytics.mart;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * The layout of a mart: {@code CURRENT} names the run that is served, {@code runs/<run-id>/} holds
 * its tables and {@code run.json}.
 *
 * @param path the folder
 */
public record MartFolder(Path path) {
  /** Name of the file that describes a run. */
  public static final String MANIFEST = "run.json";

  private static final String CURRENT = "CURRENT";
  private static final String RUNS = "runs";

  /** Where runs are. */
  public Path runs() {
    return path.resolve(RUNS);
  }

  /** Folder of a run. */
  public Path run(String runId) {
    return runs().resolve(runId);
  }

  /** Folder of a table of a run. */
  public Path table(String runId, MartTable table) {
    return run(runId).resolve(table.tableName());
  }

  /** The file that names the served run. */
  public Path currentFile() {
    return path.resolve(CURRENT);
  }

  /** The id of the served run, or empty. */
  public Optional<String> current() throws IOException {
    if (!Files.isRegularFile(currentFile())) {
      return Optional.empty();
    }
    String id = Files.readString(currentFile()).strip();
    return id.isEmpty() ? Optional.empty() : Optional.of(id);
  }

  /** Ids of all published runs, the oldest first. */
  public List<String> published() throws IOException {
    if (!Files.isDirectory(runs())) {
      return List.of();
    }
    try (Stream<Path> runs = Files.list(runs())) {
      return runs.filter(r -> Files.isRegularFile(r.resolve(MANIFEST)))
          .map(r -> r.getFileName().toString())
          .filter(name -> !name.startsWith("."))
          .sorted()
          .toList();
    }
  }
}
