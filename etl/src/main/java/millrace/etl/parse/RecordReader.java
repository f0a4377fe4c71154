package millrace.etl.parse;

import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;

/**
 * Cuts a stream of CSV text (RFC 4180, UTF-8) into records and tells where each one starts. A quote
 * opens a quoted part only at the start of a field; inside it, line ends and commas are text and a
 * doubled quote is a quote. LF and CRLF both end a record; empty lines are passed over.
 *
 * <p>The common CSV readers give neither the raw text of a record with its byte position nor a
 * start in the middle of a file, and the quarantine and the splitting of large files need both.
 */
public final class RecordReader implements Closeable {
  private final InputStream in;
  private byte[] buffer;
  private int limit;
  private int next;
  private long discarded;
  private boolean endOfStream;
  private int from;
  private int to;
  private long line;
  private long nextLine;

  /**
   * @param in the bytes, the first of them starting a record
   * @param firstLine line number of that record
   * @param bufferBytes how much is read at a time; a longer record makes the buffer grow
   */
  public RecordReader(InputStream in, long firstLine, int bufferBytes) {
    this.in = in;
    this.buffer = new byte[bufferBytes];
    this.nextLine = firstLine;
  }

  /**
   * Moves to the next record that is not empty.
   *
   * @return false at the end
   * @throws UnclosedQuoteException if the text ends inside a quoted field
   */
  public boolean next() throws IOException {
    while (readRecord()) {
      if (to > from) {
        return true;
      }
    }
    return false;
  }

  /**
   * Bytes that hold the current record between {@link #from()} and {@link #to()}; valid until the
   * next call.
   */
  public byte[] buffer() {
    return buffer;
  }

  /** Start of the current record in {@link #buffer()}. */
  public int from() {
    return from;
  }

  /** End of the current record, without its line end. */
  public int to() {
    return to;
  }

  /** Line on which the current record starts. */
  public long line() {
    return line;
  }

  /** Position in the stream at which the next record starts. */
  public long nextPosition() {
    return discarded + next;
  }

  /** Line on which the next record starts. */
  public long nextLine() {
    return nextLine;
  }

  @Override
  public void close() throws IOException {
    in.close();
  }

  private boolean readRecord() throws IOException {
    int start = next;
    int at = start;
    long lines = 1;
    boolean quoted = false;
    while (true) {
      at = toQuoteOrLineEnd(at);
      if (at + 1 >= limit && !endOfStream) {
        // A closing quote is told from a doubled one by the byte after it.
        int moved = fill(start);
        start -= moved;
        at -= moved;
        continue;
      }
      if (at == limit) {
        if (quoted) {
          throw new UnclosedQuoteException(nextLine);
        }
        return finish(start, at, at, lines);
      }
      byte found = buffer[at++];
      if (found == '\n' && !quoted) {
        int end = at - 1;
        return finish(start, end > start && buffer[end - 1] == '\r' ? end - 1 : end, at, lines);
      }
      if (found == '\n') {
        lines++;
      } else if (quoted && at < limit && buffer[at] == '"') {
        at++;
      } else {
        quoted = !quoted && (at - 1 == start || buffer[at - 2] == ',');
      }
    }
  }

  /** Position of the next quote or line end, or the limit. */
  private int toQuoteOrLineEnd(int from) {
    byte[] bytes = buffer;
    int end = limit;
    int at = from;
    while (at < end && bytes[at] != '\n' && bytes[at] != '"') {
      at++;
    }
    return at;
  }

  private boolean finish(int start, int end, int after, long lines) {
    boolean any = after > start;
    from = start;
    to = end;
    next = after;
    line = nextLine;
    nextLine += any ? lines : 0;
    return any;
  }

  /** Reads more, moving what is kept to the front; returns by how much it moved. */
  private int fill(int keepFrom) throws IOException {
    if (endOfStream) {
      return 0;
    }
    int kept = limit - keepFrom;
    if (kept == buffer.length) {
      buffer = Arrays.copyOf(buffer, buffer.length * 2);
    } else if (keepFrom > 0) {
      System.arraycopy(buffer, keepFrom, buffer, 0, kept);
    }
    discarded += keepFrom;
    limit = kept;
    int got = in.read(buffer, limit, buffer.length - limit);
    if (got < 0) {
      endOfStream = true;
    } else {
      limit += got;
    }
    return keepFrom;
  }
}
