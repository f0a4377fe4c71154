package millrace.etl.contract;

import java.io.Serializable;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Which contract column each field of a file holds, from its header.
 *
 * @param columnOfField for each field the position in {@link ContractTable#columns()}, or -1 for a
 *     column that the contract does not have
 * @param unknownColumns names of those columns
 */
public record FileLayout(int[] columnOfField, List<String> unknownColumns) implements Serializable {
  /**
   * Reads a header.
   *
   * @param table table of the file
   * @param header names of its fields
   * @param file path of the file, for the message
   * @throws ContractException if a required column is missing or a name stands twice
   */
  public static FileLayout of(ContractTable table, List<String> header, String file) {
    int[] columnOfField = new int[header.size()];
    Arrays.fill(columnOfField, -1);
    List<String> unknown = new ArrayList<>();
    List<Column> columns = table.columns();
    for (int f = 0; f < columnOfField.length; f++) {
      String name = header.get(f).strip();
      for (int c = 0; c < columns.size(); c++) {
        if (columns.get(c).name().equals(name)) {
          columnOfField[f] = c;
        }
      }
      if (columnOfField[f] < 0) {
        unknown.add(name);
      }
    }
    refuseRepeated(columns, columnOfField, file);
    refuseMissing(table, columnOfField, file, header);
    return new FileLayout(columnOfField, unknown);
  }

  private static void refuseRepeated(List<Column> columns, int[] columnOfField, String file) {
    for (int c = 0; c < columns.size(); c++) {
      int column = c;
      if (Arrays.stream(columnOfField).filter(f -> f == column).count() > 1) {
        throw new ContractException(
            file
                + ", line 1: the column "
                + columns.get(c).name()
                + " stands twice in the header; keep one of them");
      }
    }
  }

  private static void refuseMissing(
      ContractTable table, int[] columnOfField, String file, List<String> header) {
    List<Column> columns = table.columns();
    for (int c = 0; c < columns.size(); c++) {
      int column = c;
      if (columns.get(c).required() && Arrays.stream(columnOfField).noneMatch(f -> f == column)) {
        String name = columns.get(c).name();
        Optional<String> alike =
            header.stream().map(String::strip).filter(name::equalsIgnoreCase).findFirst();
        throw new ContractException(
            file
                + ", line 1: the table "
                + table.tableName()
                + " needs the column "
                + name
                + (alike.isPresent()
                    ? "; rename " + alike.get() + " (letter case counts)"
                    : "; add it to the header and to every row"));
      }
    }
  }
}
