package millrace.ui.mart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import millrace.analytics.mart.DrugRateRow;
import millrace.analytics.mart.EpisodeRow;
import millrace.analytics.mart.MartTable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MartTest {
  @TempDir Path folder;

  @Test
  void readsBackEveryTable() {
    try (Mart mart = new Mart(MartFixture.write(folder.resolve("o'hara")))) {
      Run run = mart.open();
      for (MartTable table : MartTable.values()) {
        assertEquals(InventedRows.of(table), run.rows(table.rowType()), table.tableName());
      }
    }
  }

  @Test
  void takesValuesAsParametersOnly() {
    try (Mart mart = new Mart(MartFixture.write(folder))) {
      Run run = mart.open();
      assertEquals(1, run.count(EpisodeRow.class, Condition.equal("episode_id", "e-0-1")));
      assertEquals(0, run.count(EpisodeRow.class, Condition.equal("episode_id", "' OR 1=1 --")));
    }
  }

  @Test
  void keepsAnEmptyLimitEmpty() {
    try (Mart mart = new Mart(MartFixture.write(folder))) {
      List<DrugRateRow> rows = mart.open().rows(DrugRateRow.class);
      assertEquals(OptionalDouble.empty(), rows.get(0).upper());
    }
  }

  @Test
  void saysWhatIsMissing() throws Exception {
    assertTrue(
        assertThrows(MartException.class, () -> Mart.current(folder))
            .getMessage()
            .contains("no published run"));
    MartFixture.write(folder);
    Files.writeString(folder.resolve("CURRENT"), "r-gone");
    assertTrue(
        assertThrows(MartException.class, () -> Mart.current(folder))
            .getMessage()
            .contains("r-gone"));
  }
}
