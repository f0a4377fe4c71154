package millrace.analytics.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import millrace.analytics.export.ExportTable;
import millrace.analytics.fixture.Exports;
import millrace.analytics.mart.RunManifest.TableAccount;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** An extract of one's own, in the folder that {@code -Dreal.extract=DIR} names. */
final class RealExtractTest {
  private static final String PROPERTY = "real.extract";

  @Test
  void runsAndBalances(@TempDir Path folder) throws IOException {
    String extract = System.getProperty(PROPERTY, "").strip();
    Assumptions.assumeFalse(
        extract.isEmpty(),
        "skipped: no extract of a hospital was named; give its folder as -D" + PROPERTY + "=DIR");
    Path mart = folder.resolve("mart");

    CommandLineRun run = CommandLineRun.of("run", "--extract", extract, "--mart", mart);

    assertEquals(0, run.status(), run::err);
    Exports exports = Exports.of(mart);
    long quarantined = 0;
    for (TableAccount account : exports.manifest().accounting()) {
      assertEquals(
          account.read(),
          account.kept() + account.merged() + account.quarantined(),
          account.table());
      quarantined += account.quarantined();
    }
    assertEquals(quarantined, exports.rows(ExportTable.QUARANTINE).size());
    assertTrue(exports.rows(ExportTable.ADMISSIONS).size() > 0);
  }
}
