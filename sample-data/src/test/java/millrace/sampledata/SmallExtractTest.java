package millrace.sampledata;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import millrace.sampledata.write.Packing;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The small extract in the repository is what the generator makes today; README.md says how to make
 * it again.
 */
final class SmallExtractTest {
  private static final int LARGEST_BYTES = 3_000_000;

  @TempDir private Path temporary;

  @Test
  void generatorStillMakesTheSmallExtract() throws IOException {
    new ExtractGenerator(new GenerationOptions(temporary, 300, 20310401, 2, Packing.GZIP))
        .generate(done -> {});
    assertSame(Path.of("small-extract"), temporary.resolve("extract"));
    assertSame(Path.of("small-extract-truth"), temporary.resolve("truth"));
  }

  @Test
  void smallExtractIsSmallAndOneFileIsNotPacked() throws IOException {
    Map<String, byte[]> files = Folders.bytes(Path.of("small-extract"));
    int sum = files.values().stream().mapToInt(bytes -> bytes.length).sum();
    assertTrue(sum < LARGEST_BYTES, "bytes: " + sum);
    assertEquals(1, files.keySet().stream().filter(name -> name.endsWith(".csv")).count());
  }

  private static void assertSame(Path committed, Path made) throws IOException {
    Map<String, byte[]> expected = Folders.unpacked(committed);
    Map<String, byte[]> actual = Folders.unpacked(made);
    assertEquals(expected.keySet(), actual.keySet());
    expected.forEach((name, bytes) -> assertArrayEquals(bytes, actual.get(name), name));
  }
}
