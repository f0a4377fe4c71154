package millrace.analytics.mart;

import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Reads and writes {@code run.json}. */
public final class ManifestFile {
  private static final JsonMapper JSON =
      JsonMapper.builder()
          .enable(SerializationFeature.INDENT_OUTPUT)
          .disable(DeserializationFeature.FAIL_ON_UNKNOWN_PROPERTIES)
          .build();

  private ManifestFile() {}

  /**
   * Reads the manifest of a run.
   *
   * @param run folder of the run
   * @throws IOException if it is missing or no manifest
   */
  public static RunManifest read(Path run) throws IOException {
    return JSON.readValue(Files.readAllBytes(run.resolve(MartFolder.MANIFEST)), RunManifest.class);
  }

  /** Writes the manifest of a run. */
  public static void write(Path run, RunManifest manifest) throws IOException {
    Files.write(run.resolve(MartFolder.MANIFEST), JSON.writeValueAsBytes(manifest));
  }
}
