package millrace.etl.parse;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;

/**
 * A legal CSV text (RFC 4180) and what was written into it.
 *
 * @param text the text
 * @param records its records
 */
record CsvText(String text, List<Written> records) {
  /**
   * A record as written.
   *
   * @param raw its text without the line end
   * @param line line on which it starts
   */
  record Written(String raw, long line) {}

  /** A record with the line end after it and the empty lines after that. */
  private record Piece(List<String> fields, String lineEnd, List<String> emptyLines) {}

  byte[] bytes() {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /** The same text after that many lines of something else. */
  CsvText below(String before) {
    long lines = before.chars().filter(c -> c == '\n').count();
    return new CsvText(
        before + text, records.stream().map(r -> new Written(r.raw(), r.line() + lines)).toList());
  }

  /** Texts with quotes, commas and line ends in quotes, both line ends, and empty lines. */
  static Arbitrary<CsvText> any() {
    // Characters of one to four bytes.
    Arbitrary<String> value =
        Arbitraries.strings()
            .withChars("ab7.\u00B5\u20AC \t,\"\r\n")
            .ofMaxLength(7)
            .map(text -> text.replace("7", "\uD83D\uDE00"));
    Arbitrary<String> field =
        Combinators.combine(value, Arbitraries.of(true, false)).as(CsvText::encoded);
    Arbitrary<String> lineEnd = Arbitraries.of("\n", "\r\n");
    Arbitrary<Piece> piece =
        Combinators.combine(
                field.list().ofMinSize(1).ofMaxSize(5), lineEnd, lineEnd.list().ofMaxSize(2))
            .as(Piece::new);
    return Combinators.combine(
            lineEnd.list().ofMaxSize(1), piece.list().ofMaxSize(8), Arbitraries.of(true, false))
        .as(CsvText::of);
  }

  private static String encoded(String value, boolean quoteAnyway) {
    boolean quote = quoteAnyway || value.chars().anyMatch(c -> ",\"\r\n".indexOf(c) >= 0);
    return quote ? '"' + value.replace("\"", "\"\"") + '"' : value;
  }

  private static CsvText of(List<String> before, List<Piece> pieces, boolean endsWithLineEnd) {
    StringBuilder text = new StringBuilder(String.join("", before));
    List<Written> records = new ArrayList<>();
    for (int i = 0; i < pieces.size(); i++) {
      Piece piece = pieces.get(i);
      String joined = String.join(",", piece.fields());
      String raw = joined.isEmpty() ? "\"\"" : joined;
      records.add(new Written(raw, 1 + text.chars().filter(c -> c == '\n').count()));
      text.append(raw);
      if (i + 1 < pieces.size() || endsWithLineEnd) {
        text.append(piece.lineEnd()).append(String.join("", piece.emptyLines()));
      }
    }
    return new CsvText(text.toString(), records);
  }
}
