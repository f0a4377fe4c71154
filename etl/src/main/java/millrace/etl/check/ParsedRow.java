package millrace.etl.check;

import java.time.LocalDate;
import java.util.Arrays;
import millrace.etl.contract.ContractTable;
import millrace.etl.parse.DecimalText;
import millrace.etl.parse.RowFields;
import millrace.etl.record.Seconds;
import millrace.etl.record.SourceLine;

/**
 * The values of one row by the contract's columns. Reused from row to row by its {@link RowParser}.
 */
final class ParsedRow {
  static final int NO_WORD = -1;

  final RowFields fields;
  final long[] seconds;
  final DecimalText[] numbers;
  final int[] words;
  SourceLine source = new SourceLine(0, 0);
  LocalDate birthDate = LocalDate.EPOCH;

  ParsedRow(ContractTable table) {
    int columns = table.columns().size();
    fields = new RowFields(columns);
    seconds = new long[columns];
    words = new int[columns];
    numbers = new DecimalText[columns];
    for (int i = 0; i < columns; i++) {
      numbers[i] = new DecimalText();
    }
  }

  void clear() {
    Arrays.fill(seconds, Seconds.ABSENT);
    Arrays.fill(words, NO_WORD);
  }

  boolean has(int column) {
    return !fields.isEmpty(column);
  }

  String text(int column) {
    return fields.text(column);
  }

  <E> E word(int column, E[] words, E otherwise) {
    int at = this.words[column];
    return at == NO_WORD ? otherwise : words[at];
  }
}
