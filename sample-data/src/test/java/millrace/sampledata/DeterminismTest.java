package millrace.sampledata;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Map;
import millrace.sampledata.write.Packing;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Same seed and size, same bytes. */
final class DeterminismTest {
  @TempDir private Path temporary;

  @Test
  void threadsChangeNoByte() throws IOException {
    Map<String, byte[]> one = make("one", 5, 1, Packing.MIXED);
    Map<String, byte[]> three = make("three", 5, 3, Packing.MIXED);
    assertEquals(one.keySet(), three.keySet());
    one.forEach((name, bytes) -> assertArrayEquals(bytes, three.get(name), name));
  }

  @Test
  void anotherSeedMakesOtherPatients() throws IOException {
    Map<String, byte[]> five = make("five", 5, 2, Packing.PLAIN);
    Map<String, byte[]> six = make("six", 6, 2, Packing.PLAIN);
    for (String name : five.keySet()) {
      boolean fixed =
          name.endsWith("units.csv")
              || name.endsWith("code_map.csv")
              || name.endsWith("datapackage.json")
              || name.endsWith(".txt");
      assertEquals(fixed, Arrays.equals(five.get(name), six.get(name)), name);
    }
  }

  @Test
  void earlierFilesOfALargerExtractAreRemoved() throws IOException {
    GenerationOptions large =
        new GenerationOptions(temporary.resolve("again"), 1600, 5, 2, Packing.PLAIN);
    new ExtractGenerator(large).generate(done -> {});
    Map<String, byte[]> again = make("again", 5, 2, Packing.PLAIN);
    assertEquals(make("fresh", 5, 2, Packing.PLAIN).keySet(), again.keySet());
    assertFalse(again.isEmpty());
  }

  private Map<String, byte[]> make(String folder, long seed, int threads, Packing packing)
      throws IOException {
    Path out = temporary.resolve(folder);
    new ExtractGenerator(new GenerationOptions(out, 400, seed, threads, packing))
        .generate(done -> {});
    return Folders.bytes(out);
  }
}
