package millrace.etl.parse;

import java.io.Serializable;
import java.util.List;

/**
 * What one look through a file tells: its fingerprint, its header, and where it can be cut.
 *
 * @param bytes size of the file
 * @param sha256 SHA-256 of the file, in hexadecimal
 * @param textBytes size of the text, after decompression
 * @param records records after the header, empty lines not counted
 * @param header names of the fields
 * @param splits parts that can be read apart, in order; none when there is no record
 */
public record FileSurvey(
    long bytes,
    String sha256,
    long textBytes,
    long records,
    List<String> header,
    List<Split> splits)
    implements Serializable {
  /**
   * A part of a file.
   *
   * @param from position of its first record in the text
   * @param to position after its last record
   * @param firstLine line of its first record
   */
  public record Split(long from, long to, long firstLine) implements Serializable {}
}
