package millrace.sampledata.contract;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import java.util.zip.GZIPInputStream;

/**
 * An extract as text.
 *
 * @param descriptor text of the descriptor
 * @param files text of every table file, by name, in order of names
 */
record Extract(String descriptor, Map<String, String> files) {
  private static final Pattern PATH = Pattern.compile("\"([a-z_0-9-]+\\.csv(?:\\.gz)?)\"");

  static Extract read(Path folder) throws IOException {
    Map<String, String> files = new LinkedHashMap<>();
    try (Stream<Path> entries = Files.list(folder).sorted()) {
      for (Path file : entries.toList()) {
        String name = file.getFileName().toString();
        if (!name.equals("datapackage.json")) {
          files.put(name, text(file, name.endsWith(".gz")));
        }
      }
    }
    return new Extract(Files.readString(folder.resolve("datapackage.json")), files);
  }

  /** Names of the files that the descriptor lists, in its order. */
  List<String> listed() {
    List<String> names = new ArrayList<>();
    Matcher matcher = PATH.matcher(descriptor);
    while (matcher.find()) {
      names.add(matcher.group(1));
    }
    return names;
  }

  /** The rows of a table, file after file. */
  List<Map<String, String>> table(String table) {
    List<Map<String, String>> rows = new ArrayList<>();
    files.forEach(
        (name, text) -> {
          if (name.replaceAll("(-\\d+)?\\.csv(\\.gz)?$", "").equals(table)) {
            rows.addAll(CsvText.rows(text));
          }
        });
    return rows;
  }

  private static String text(Path file, boolean packed) throws IOException {
    byte[] bytes = Files.readAllBytes(file);
    try (InputStream in =
        packed
            ? new GZIPInputStream(new ByteArrayInputStream(bytes))
            : new ByteArrayInputStream(bytes)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
