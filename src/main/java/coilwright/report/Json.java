package coilwright.report;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;

/**
 * Writes JSON: two spaces of indent, LF, numbers in full double precision with the same digits on
 * every Java version. Numbers that are not finite are not written.
 */
final class Json {

  private static final JsonFactory FACTORY =
      JsonFactory.builder().enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER).build();

  private final JsonGenerator generator;

  private Json(JsonGenerator generator) {
    this.generator = generator;
  }

  /** What writes a document or a part of one. */
  @FunctionalInterface
  interface Part {
    /** Writes it. */
    void writeTo(Json json) throws IOException;
  }

  /** One object as a document, ended by a line feed. */
  static String document(Part body) {
    StringWriter text = new StringWriter();
    try (JsonGenerator generator = FACTORY.createGenerator(text)) {
      generator.setPrettyPrinter(printer());
      new Json(generator).braces(body);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return text.append('\n').toString();
  }

  private static DefaultPrettyPrinter printer() {
    DefaultIndenter lines = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter(
            Separators.createDefaultInstance()
                .withObjectFieldValueSpacing(Separators.Spacing.AFTER));
    printer.indentArraysWith(lines);
    printer.indentObjectsWith(lines);
    return printer;
  }

  /** An object as an element of an array. */
  void braces(Part body) throws IOException {
    generator.writeStartObject();
    body.writeTo(this);
    generator.writeEndObject();
  }

  /** A key with an object. */
  void object(String key, Part body) throws IOException {
    generator.writeFieldName(key);
    braces(body);
  }

  /** A key with an array. */
  void array(String key, Part body) throws IOException {
    generator.writeArrayFieldStart(key);
    body.writeTo(this);
    generator.writeEndArray();
  }

  /** A key with an array of strings. */
  void strings(String key, List<String> values) throws IOException {
    array(
        key,
        json -> {
          for (String value : values) {
            generator.writeString(value);
          }
        });
  }

  /** An array of numbers as an element of an array; infinity is null. */
  void numbers(double... values) throws IOException {
    generator.writeStartArray();
    for (double value : values) {
      if (Double.isInfinite(value)) {
        generator.writeNull();
      } else {
        generator.writeNumber(value);
      }
    }
    generator.writeEndArray();
  }

  /** A key with a string. */
  void string(String key, String value) throws IOException {
    generator.writeStringField(key, value);
  }

  /** A key with a number; left out where the number is not finite. */
  void number(String key, double value) throws IOException {
    if (Double.isFinite(value)) {
      generator.writeNumberField(key, value);
    }
  }

  /** A key with a whole number. */
  void count(String key, int value) throws IOException {
    generator.writeNumberField(key, value);
  }

  /** A key with true or false. */
  void flag(String key, boolean value) throws IOException {
    generator.writeBooleanField(key, value);
  }

  /** Every field of a subject, under its own key. */
  <T> void fields(List<? extends Field<? super T>> fields, T subject) throws IOException {
    for (Field<? super T> field : fields) {
      field.writeTo(this, subject);
    }
  }

  /** A key with null. */
  void nothing(String key) throws IOException {
    generator.writeNullField(key);
  }
}
