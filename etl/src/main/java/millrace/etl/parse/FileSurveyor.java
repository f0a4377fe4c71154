package millrace.etl.parse;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipException;
import millrace.etl.contract.ContractException;
import millrace.etl.contract.ContractTable;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;

/** Looks once through a file of an extract, plain or gzip. */
public final class FileSurveyor {
  private static final int BUFFER = 1 << 18;
  private static final String GZIP = ".gz";
  private static final char BYTE_ORDER_MARK = '\uFEFF';

  private FileSurveyor() {}

  /**
   * Surveys a file.
   *
   * @param folder folder of the extract
   * @param path path of the file inside it
   * @param table its table, for the messages
   * @param splitBytes size after which a plain file is cut; a gzip file is one part
   * @throws ContractException if the file cannot be read as gzip, has no header or ends inside a
   *     quoted field
   */
  public static FileSurvey survey(Path folder, String path, ContractTable table, long splitBytes) {
    MessageDigest digest = sha256();
    try (InputStream file = Files.newInputStream(folder.resolve(path));
        DigestInputStream digested = new DigestInputStream(file, digest);
        RecordReader reader = new RecordReader(decompressed(digested, path), 1, BUFFER)) {
      if (!reader.next()) {
        throw new ContractException(
            path
                + " is empty; the table "
                + table.tableName()
                + " needs a header line and its rows");
      }
      List<String> header = header(reader);
      Splits splits = new Splits(reader, isGzip(path) ? Long.MAX_VALUE : splitBytes);
      while (reader.next()) {
        splits.record(reader);
      }
      digested.transferTo(java.io.OutputStream.nullOutputStream());
      return new FileSurvey(
          Files.size(folder.resolve(path)),
          HexFormat.of().formatHex(digest.digest()),
          reader.nextPosition(),
          splits.records,
          header,
          splits.done(reader));
    } catch (UnclosedQuoteException e) {
      throw new ContractException(
          path
              + ", line "
              + e.line()
              + ": a quoted field that starts in this record is never closed; close it or double the quote",
          e);
    } catch (ZipException | java.io.EOFException e) {
      throw new ContractException(path + " is no readable gzip file; compress the table again", e);
    } catch (IOException e) {
      throw new ContractException(path + " cannot be read; check the file and its permissions", e);
    }
  }

  /** Opens the text of a part, at its first record. */
  public static RecordReader open(Path folder, String path, FileSurvey.Split split)
      throws IOException {
    InputStream file = Files.newInputStream(folder.resolve(path));
    InputStream text = decompressed(file, path);
    text.skipNBytes(split.from());
    return new RecordReader(text, split.firstLine(), BUFFER);
  }

  /** Names of the fields in a header record, without a byte-order mark. */
  static List<String> header(RecordReader reader) throws IOException {
    String text =
        new String(
            reader.buffer(), reader.from(), reader.to() - reader.from(), StandardCharsets.UTF_8);
    if (text.charAt(0) == BYTE_ORDER_MARK) {
      text = text.substring(1);
    }
    try (CSVParser parser = CSVParser.parse(text, CSVFormat.RFC4180)) {
      return parser.stream().flatMap(r -> r.toList().stream()).map(String::strip).toList();
    }
  }

  private static InputStream decompressed(InputStream file, String path) throws IOException {
    return isGzip(path) ? new GZIPInputStream(new BufferedInputStream(file, BUFFER), BUFFER) : file;
  }

  private static boolean isGzip(String path) {
    return path.endsWith(GZIP);
  }

  private static MessageDigest sha256() {
    try {
      return MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  /** Cuts as the records go by. */
  private static final class Splits {
    private final long splitBytes;
    private final List<FileSurvey.Split> splits = new ArrayList<>();
    private long from;
    private long firstLine;
    private long records;

    Splits(RecordReader afterHeader, long splitBytes) {
      this.splitBytes = splitBytes;
      start(afterHeader);
    }

    void record(RecordReader reader) {
      records++;
      if (reader.nextPosition() - from >= splitBytes) {
        splits.add(new FileSurvey.Split(from, reader.nextPosition(), firstLine));
        start(reader);
      }
    }

    List<FileSurvey.Split> done(RecordReader reader) {
      if (reader.nextPosition() > from && records > 0) {
        splits.add(new FileSurvey.Split(from, reader.nextPosition(), firstLine));
      }
      return List.copyOf(splits);
    }

    private void start(RecordReader reader) {
      from = reader.nextPosition();
      firstLine = reader.nextLine();
    }
  }
}
