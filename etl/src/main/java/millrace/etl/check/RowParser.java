package millrace.etl.check;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import millrace.etl.contract.Column;
import millrace.etl.contract.ColumnKind;
import millrace.etl.contract.ContractTable;
import millrace.etl.contract.FileLayout;
import millrace.etl.parse.BirthDateText;
import millrace.etl.parse.RawRow;
import millrace.etl.parse.TimeText;
import millrace.etl.parse.WallClock;
import millrace.etl.record.Seconds;

/**
 * Reads the rows of one table and applies the rules missing, unreadable and unknown-word. Not for
 * several threads.
 */
final class RowParser {
  private static final long NOON = 12 * Seconds.HOUR;
  private static final long LAST_SECOND = Seconds.DAY - 1;

  private final ContractTable table;
  private final List<Column> columns;
  private final byte[][][] words;
  private final WallClock clock;
  private final TimeText times;
  private final Findings findings;
  private final ParsedRow row;

  RowParser(ContractTable table, WallClock clock, Findings findings) {
    this.table = table;
    this.columns = table.columns();
    this.clock = clock;
    this.times = new TimeText(clock);
    this.findings = findings;
    this.row = new ParsedRow(table);
    this.words =
        columns.stream()
            .map(
                c ->
                    c.words().stream()
                        .map(w -> w.word().getBytes(StandardCharsets.UTF_8))
                        .toArray(byte[][]::new))
            .toArray(byte[][][]::new);
  }

  /** The values of the row read last. */
  ParsedRow row() {
    return row;
  }

  /** Splits a row into its fields, for comparing it as text. */
  void split(RawRow raw, FileLayout layout) {
    row.fields.split(raw, layout.columnOfField());
    row.source = raw.source();
  }

  /** Reads the fields split last; null when none of the three rules is broken. */
  Broken parse(FileLayout layout) {
    row.clear();
    if (row.fields.fieldsInRow() != layout.columnOfField().length) {
      findings.count(FindingKind.RAGGED_ROW, table, "");
    }
    for (int c = 0; c < columns.size(); c++) {
      if (columns.get(c).required() && row.fields.isEmpty(c)) {
        return new Broken(Rule.MISSING, columns.get(c).name());
      }
    }
    for (int c = 0; c < columns.size(); c++) {
      if (!row.fields.isEmpty(c) && !read(c)) {
        return new Broken(Rule.UNREADABLE, columns.get(c).name());
      }
    }
    for (int c = 0; c < columns.size(); c++) {
      if (columns.get(c).kind() == ColumnKind.WORD && !row.fields.isEmpty(c) && !readWord(c)) {
        return new Broken(Rule.UNKNOWN_WORD, columns.get(c).name());
      }
    }
    return null;
  }

  private boolean read(int c) {
    return switch (columns.get(c).kind()) {
      case TEXT, WORD -> true;
      case TIME -> readTime(c, -1);
      case TIME_OR_NOON -> readTime(c, NOON);
      case TIME_OR_END_OF_DAY -> readTime(c, LAST_SECOND);
      case BIRTH_DATE -> readBirthDate(c);
      case NUMBER -> row.numbers[c].read(row.fields.bytes(c), row.fields.from(c), row.fields.to(c));
      case MEASURED_NUMBER -> readMeasured(c);
    };
  }

  private boolean readTime(int c, long secondOfBareDate) {
    TimeText.Outcome outcome =
        times.read(row.fields.bytes(c), row.fields.from(c), row.fields.to(c));
    if (outcome == TimeText.Outcome.UNREADABLE) {
      return false;
    }
    WallClock.Meeting meeting = times.meeting();
    if (outcome == TimeText.Outcome.TIME) {
      row.seconds[c] = times.epochSecond();
    } else {
      if (secondOfBareDate < 0) {
        return false;
      }
      row.seconds[c] = clock.toEpochSecond(times.epochDay() * Seconds.DAY + secondOfBareDate);
      meeting = clock.meeting();
      findings.count(FindingKind.BARE_DATE, table, columns.get(c).name());
    }
    if (meeting != WallClock.Meeting.PLAIN) {
      findings.count(
          meeting == WallClock.Meeting.GAP ? FindingKind.CLOCK_GAP : FindingKind.CLOCK_OVERLAP,
          table,
          columns.get(c).name());
    }
    return true;
  }

  private boolean readBirthDate(int c) {
    Optional<LocalDate> date = BirthDateText.read(row.text(c));
    date.ifPresent(d -> row.birthDate = d);
    return date.isPresent();
  }

  private boolean readMeasured(int c) {
    byte[] bytes = row.fields.bytes(c);
    int from = row.fields.from(c);
    int to = row.fields.to(c);
    boolean bounded = bytes[from] == '<' || bytes[from] == '>';
    if (bounded) {
      from++;
      while (from < to && bytes[from] == ' ') {
        from++;
      }
    }
    if (from == to || !row.numbers[c].read(bytes, from, to)) {
      return false;
    }
    if (bounded) {
      findings.count(FindingKind.BOUNDED_VALUE, table, columns.get(c).name());
    }
    return true;
  }

  private boolean readWord(int c) {
    byte[] bytes = row.fields.bytes(c);
    int from = row.fields.from(c);
    int to = row.fields.to(c);
    byte[][] known = words[c];
    for (int i = 0; i < known.length; i++) {
      if (Arrays.equals(known[i], 0, known[i].length, bytes, from, to)) {
        row.words[c] = i;
        return true;
      }
    }
    return false;
  }
}
