package millrace.sampledata.contract;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A small reader of RFC 4180, written for these tests and from the contract alone. */
final class CsvText {
  private final String text;
  private int at;

  private CsvText(String text) {
    this.text = text.startsWith("\uFEFF") ? text.substring(1) : text;
  }

  /** The rows below the header, by column; blanks around fields are cut. */
  static List<Map<String, String>> rows(String text) {
    CsvText csv = new CsvText(text);
    List<String> header = csv.record();
    List<Map<String, String>> rows = new ArrayList<>();
    while (csv.at < csv.text.length()) {
      List<String> fields = csv.record();
      if (fields.size() != header.size()) {
        throw new IllegalArgumentException(
            fields.size() + " fields under " + header + ": " + fields);
      }
      Map<String, String> row = new LinkedHashMap<>();
      for (int index = 0; index < fields.size(); index++) {
        row.put(header.get(index), fields.get(index).strip());
      }
      rows.add(row);
    }
    return rows;
  }

  private List<String> record() {
    List<String> fields = new ArrayList<>();
    while (true) {
      fields.add(text.charAt(at) == '"' ? quoted() : plain());
      char end = text.charAt(at++);
      if (end == '\r') {
        end = text.charAt(at++);
      }
      if (end == '\n') {
        return fields;
      }
    }
  }

  private String plain() {
    int from = at;
    while (",\r\n".indexOf(text.charAt(at)) < 0) {
      at++;
    }
    return text.substring(from, at);
  }

  private String quoted() {
    StringBuilder field = new StringBuilder();
    at++;
    while (true) {
      char letter = text.charAt(at++);
      if (letter != '"') {
        field.append(letter);
      } else if (text.charAt(at) == '"') {
        field.append('"');
        at++;
      } else {
        return field + plain();
      }
    }
  }
}
