package millrace.etl.record;

/**
 * Where a row stands in the extract.
 *
 * @param file index of the file in the descriptor's order
 * @param line line on which the row starts; the header is line 1
 */
public record SourceLine(int file, int line)
    implements Comparable<SourceLine>, java.io.Serializable {
  @Override
  public int compareTo(SourceLine other) {
    int byFile = Integer.compare(file, other.file);
    return byFile != 0 ? byFile : Integer.compare(line, other.line);
  }
}
