package connate.record;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Reads JSON into maps, lists, texts, numbers as they are written, and truth values. */
final class Json {

  private static final int DEEPEST = 12;
  private static final JsonFactory FACTORY = new JsonFactory();

  private Json() {}

  /**
   * Reads one JSON object.
   *
   * @throws IllegalArgumentException if the text is no JSON object
   */
  static Map<String, Object> object(String text) {
    try (JsonParser parser = FACTORY.createParser(text)) {
      parser.nextToken();
      Object value = value(parser, 0);
      if (parser.nextToken() != null || !(value instanceof Map)) {
        throw new IllegalArgumentException("one JSON object was expected");
      }
      return map(value);
    } catch (IOException e) {
      throw new IllegalArgumentException("no JSON: " + e.getMessage(), e);
    }
  }

  @SuppressWarnings("unchecked")
  static Map<String, Object> map(Object value) {
    if (!(value instanceof Map)) {
      throw new IllegalArgumentException("a JSON object was expected");
    }
    return (Map<String, Object>) value;
  }

  @SuppressWarnings("unchecked")
  static List<Object> list(Object value) {
    if (!(value instanceof List)) {
      throw new IllegalArgumentException("a JSON array was expected");
    }
    return (List<Object>) value;
  }

  static String text(Map<String, Object> object, String name) {
    if (object.get(name) instanceof String text) {
      return text;
    }
    throw new IllegalArgumentException("the member «" + name + "» is missing or no text");
  }

  /** Returns a member as it is written, whatever it is; empty where it is null or missing. */
  static String written(Map<String, Object> object, String name) {
    Object value = object.get(name);
    return value == null ? "" : value.toString();
  }

  private static Object value(JsonParser parser, int depth) throws IOException {
    if (depth > DEEPEST) {
      throw new IllegalArgumentException("JSON nested too deeply");
    }
    JsonToken token = parser.currentToken();
    if (token == null) {
      throw new IllegalArgumentException("the JSON ends too early");
    }
    return switch (token) {
      case START_OBJECT -> objectOf(parser, depth);
      case START_ARRAY -> arrayOf(parser, depth);
      case VALUE_STRING -> parser.getText();
      case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Number(parser.getText());
      case VALUE_TRUE -> Boolean.TRUE;
      case VALUE_FALSE -> Boolean.FALSE;
      case VALUE_NULL -> null;
      default -> throw new IllegalArgumentException("unexpected JSON " + token);
    };
  }

  /** A number as it is written. */
  record Number(String written) {

    @Override
    public String toString() {
      return written;
    }
  }

  private static Map<String, Object> objectOf(JsonParser parser, int depth) throws IOException {
    Map<String, Object> out = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      parser.nextToken();
      if (out.put(name, value(parser, depth + 1)) != null) {
        throw new IllegalArgumentException("the member «" + name + "» stands twice");
      }
    }
    return out;
  }

  private static List<Object> arrayOf(JsonParser parser, int depth) throws IOException {
    List<Object> out = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      out.add(value(parser, depth + 1));
    }
    return out;
  }
}
