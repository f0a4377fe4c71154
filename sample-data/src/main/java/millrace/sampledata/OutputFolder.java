package millrace.sampledata;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/**
 * The folder that gets the extract and the truth.
 *
 * @param extract folder of the extract, which keeps to the contract
 * @param truth folder beside it
 */
record OutputFolder(Path extract, Path truth) {
  private static final String MARKER = "INVENTED.txt";
  private static final String NOTICE =
      """
      Every person, place and event in this folder is invented, by the sample-data program of Millrace.
      extract/ holds tables as a hospital would send them; truth/ holds what was planted in them.
      """;

  /**
   * Makes the folder ready: an empty one is used, an earlier output of this program is replaced,
   * anything else is left alone.
   *
   * @throws IllegalArgumentException when the folder holds something else
   */
  static OutputFolder prepare(Path out) throws IOException {
    if (Files.exists(out) && !Files.isDirectory(out)) {
      throw new IllegalArgumentException("--out " + out + " is a file; name a folder");
    }
    Files.createDirectories(out);
    if (!isEmpty(out) && !isEarlierOutput(out)) {
      throw new IllegalArgumentException(
          "--out "
              + out
              + " is not empty and no earlier output of this program; name another folder");
    }
    Files.writeString(out.resolve(MARKER), NOTICE);
    OutputFolder folder = new OutputFolder(out.resolve("extract"), out.resolve("truth"));
    for (Path inner : List.of(folder.extract, folder.truth)) {
      Files.createDirectories(inner);
      removeTables(inner);
    }
    return folder;
  }

  private static boolean isEmpty(Path folder) throws IOException {
    try (Stream<Path> entries = Files.list(folder)) {
      return entries.findAny().isEmpty();
    }
  }

  private static boolean isEarlierOutput(Path out) throws IOException {
    Path marker = out.resolve(MARKER);
    return Files.isRegularFile(marker) && Files.readString(marker).equals(NOTICE);
  }

  private static void removeTables(Path folder) throws IOException {
    List<Path> tables;
    try (Stream<Path> entries = Files.list(folder)) {
      tables = entries.filter(OutputFolder::isTable).toList();
    }
    for (Path table : tables) {
      Files.delete(table);
    }
  }

  private static boolean isTable(Path file) {
    String name = file.getFileName().toString();
    return name.endsWith(".csv") || name.endsWith(".csv.gz") || name.endsWith(".json");
  }
}
