package millrace.ui.chart;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/** Building of options. */
public final class Json {
  private static final ObjectMapper MAPPER = new ObjectMapper();

  private Json() {}

  /** An object from text with single quotes, for the parts that never change. */
  public static ObjectNode object(String text) {
    try {
      return (ObjectNode) MAPPER.readTree(text.replace('\'', '"'));
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException("options that are no JSON: " + text, e);
    }
  }

  /** An empty object. */
  public static ObjectNode object() {
    return MAPPER.createObjectNode();
  }

  /** An empty list. */
  public static ArrayNode array() {
    return MAPPER.createArrayNode();
  }

  /** A list of texts, numbers or nodes. */
  public static ArrayNode array(List<?> values) {
    return MAPPER.valueToTree(values);
  }
}
