package millrace.sampledata;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.GZIPInputStream;

/** Folders as maps from file name to bytes. */
final class Folders {
  private Folders() {}

  /** The files of a folder as they lie on disk. */
  static Map<String, byte[]> bytes(Path folder) throws IOException {
    Map<String, byte[]> files = new TreeMap<>();
    try (Stream<Path> entries = Files.walk(folder)) {
      for (Path file : entries.filter(Files::isRegularFile).toList()) {
        files.put(folder.relativize(file).toString(), Files.readAllBytes(file));
      }
    }
    return files;
  }

  /** The files of a folder, unpacked: how well a file is packed depends on the machine's zlib. */
  static Map<String, byte[]> unpacked(Path folder) throws IOException {
    Map<String, byte[]> files = bytes(folder);
    files.replaceAll((name, bytes) -> name.endsWith(".gz") ? unpack(bytes) : bytes);
    return files;
  }

  private static byte[] unpack(byte[] packed) {
    try (InputStream in = new GZIPInputStream(new ByteArrayInputStream(packed))) {
      return in.readAllBytes();
    } catch (IOException failure) {
      throw new UncheckedIOException(failure);
    }
  }
}
