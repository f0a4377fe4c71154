package millrace.etl.contract;

import java.util.List;
import millrace.etl.record.Word;

/**
 * A column of the contract.
 *
 * @param name its name in the header
 * @param required whether the contract stars it
 * @param kind how its text is read
 * @param words the words allowed, in the order of their enum; empty unless the kind is {@link
 *     ColumnKind#WORD}
 */
public record Column(String name, boolean required, ColumnKind kind, List<Word> words) {
  static Column text(String name) {
    return new Column(name, false, ColumnKind.TEXT, List.of());
  }

  static Column of(String name, ColumnKind kind) {
    return new Column(name, false, kind, List.of());
  }

  static Column words(String name, Word... words) {
    return new Column(name, false, ColumnKind.WORD, List.of(words));
  }

  Column starred() {
    return new Column(name, true, kind, words);
  }
}
