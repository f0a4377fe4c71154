package millrace.sampledata.write;

import java.util.ArrayDeque;
import java.util.Deque;

/** Writes JSON, indented, without reading any object. */
public final class Json {
  private final StringBuilder text = new StringBuilder();
  private final Deque<Character> open = new ArrayDeque<>();
  private boolean first = true;
  private boolean afterKey;

  /**
   * Opens an object.
   *
   * @return this writer
   */
  public Json object() {
    return open('{', '}');
  }

  /**
   * Opens an array.
   *
   * @return this writer
   */
  public Json array() {
    return open('[', ']');
  }

  /**
   * Closes what was opened last.
   *
   * @return this writer
   */
  public Json close() {
    char end = open.pop();
    if (!first) {
      newLine();
    }
    text.append(end);
    first = false;
    if (open.isEmpty()) {
      text.append('\n');
    }
    return this;
  }

  /**
   * Writes a key.
   *
   * @param name the key
   * @return this writer
   */
  public Json key(String name) {
    next();
    quote(name);
    text.append(": ");
    afterKey = true;
    return this;
  }

  /**
   * Writes a string.
   *
   * @param value the string
   * @return this writer
   */
  public Json value(String value) {
    next();
    quote(value);
    return this;
  }

  /**
   * Writes a number or a truth value as it prints.
   *
   * @param value the value
   * @return this writer
   */
  public Json bare(Object value) {
    next();
    text.append(value);
    return this;
  }

  /**
   * Writes a key with a string.
   *
   * @param name the key
   * @param value the string
   * @return this writer
   */
  public Json field(String name, String value) {
    return key(name).value(value);
  }

  /**
   * Writes a key with a number or a truth value.
   *
   * @param name the key
   * @param value the value
   * @return this writer
   */
  public Json field(String name, Object value) {
    return key(name).bare(value);
  }

  /**
   * What was written.
   *
   * @return the JSON text
   */
  public String text() {
    return text.toString();
  }

  private Json open(char start, char end) {
    next();
    text.append(start);
    open.push(end);
    first = true;
    return this;
  }

  private void next() {
    if (afterKey) {
      afterKey = false;
      return;
    }
    if (!open.isEmpty()) {
      if (!first) {
        text.append(',');
      }
      newLine();
    }
    first = false;
  }

  private void newLine() {
    text.append('\n').append("  ".repeat(open.size()));
  }

  private void quote(String value) {
    text.append('"')
        .append(value.replace("\\", "\\\\").replace("\"", "\\\"").replace("\n", "\\n"))
        .append('"');
  }
}
