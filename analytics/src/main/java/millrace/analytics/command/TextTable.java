package millrace.analytics.command;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;

/**
 * A table of words and numbers in columns of even width; the first column is aligned left, the
 * others right.
 */
final class TextTable {
  private final List<String[]> rows = new ArrayList<>();

  TextTable row(Object... cells) {
    String[] texts = new String[cells.length];
    for (int i = 0; i < cells.length; i++) {
      texts[i] =
          cells[i] instanceof Long || cells[i] instanceof Integer
              ? String.format("%,d", cells[i])
              : String.valueOf(cells[i]);
    }
    rows.add(texts);
    return this;
  }

  void print(PrintStream out) {
    int columns = rows.stream().mapToInt(r -> r.length).max().orElse(0);
    int[] widths = new int[columns];
    for (String[] row : rows) {
      for (int i = 0; i < row.length; i++) {
        widths[i] = Math.max(widths[i], row[i].length());
      }
    }
    for (String[] row : rows) {
      StringBuilder line = new StringBuilder("  ");
      for (int i = 0; i < row.length; i++) {
        String pad = " ".repeat(widths[i] - row[i].length());
        line.append(i == 0 ? row[i] + pad : "  " + pad + row[i]);
      }
      out.println(line.toString().stripTrailing());
    }
  }
}
