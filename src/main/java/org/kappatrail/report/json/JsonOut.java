package org.kappatrail.report.json;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.core.util.Separators;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import org.kappatrail.report.table.SixDigits;

/** Writes JSON field by field: numbers with six significant digits, the unknown as null. */
final class JsonOut implements AutoCloseable {
  /** Depth to which lines are broken; what lies deeper stands on one line. */
  private static final int BROKEN_DEPTH = 5;

  private final JsonGenerator json;

  JsonOut(OutputStream out) throws IOException {
    json =
        new JsonFactory()
            .createGenerator(new OutputStreamWriter(out, StandardCharsets.UTF_8))
            .setPrettyPrinter(printer())
            .configure(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN.mappedFeature(), true);
  }

  /** Something that is written for each item of a list. */
  interface Each<T> {
    void write(T item) throws IOException;
  }

  /** What stands between an object's braces. */
  interface Body {
    void write() throws IOException;
  }

  JsonOut text(String name, String value) throws IOException {
    json.writeStringField(name, value);
    return this;
  }

  JsonOut text(String name, Optional<String> value) throws IOException {
    return value.isPresent() ? text(name, value.get()) : unknown(name);
  }

  JsonOut number(String name, double value) throws IOException {
    json.writeFieldName(name);
    json.writeNumber(new BigDecimal(SixDigits.text(value)));
    return this;
  }

  JsonOut number(String name, OptionalDouble value) throws IOException {
    return value.isPresent() ? number(name, value.getAsDouble()) : unknown(name);
  }

  JsonOut whole(String name, long value) throws IOException {
    json.writeNumberField(name, value);
    return this;
  }

  JsonOut whole(String name, OptionalLong value) throws IOException {
    return value.isPresent() ? whole(name, value.getAsLong()) : unknown(name);
  }

  JsonOut flag(String name, boolean value) throws IOException {
    json.writeBooleanField(name, value);
    return this;
  }

  JsonOut unknown(String name) throws IOException {
    json.writeNullField(name);
    return this;
  }

  JsonOut texts(String name, List<String> values) throws IOException {
    json.writeArrayFieldStart(name);
    for (String value : values) {
      json.writeString(value);
    }
    json.writeEndArray();
    return this;
  }

  /** An array of objects. */
  <T> JsonOut objects(String name, List<T> items, Each<T> body) throws IOException {
    json.writeArrayFieldStart(name);
    for (T item : items) {
      json.writeStartObject();
      body.write(item);
      json.writeEndObject();
    }
    json.writeEndArray();
    return this;
  }

  JsonOut object(String name, Body body) throws IOException {
    json.writeObjectFieldStart(name);
    body.write();
    json.writeEndObject();
    return this;
  }

  /** An object, or null where there is nothing. */
  <T> JsonOut object(String name, Optional<T> item, Each<T> body) throws IOException {
    return item.isPresent() ? object(name, () -> body.write(item.get())) : unknown(name);
  }

  /** The outermost object. */
  void root(Body body) throws IOException {
    json.writeStartObject();
    body.write();
    json.writeEndObject();
    json.writeRaw('\n');
  }

  @Override
  public void close() throws IOException {
    json.close();
  }

  private static DefaultPrettyPrinter printer() {
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter(
            Separators.createDefaultInstance()
                .withObjectFieldValueSpacing(Separators.Spacing.AFTER));
    Lines lines = new Lines();
    printer.indentArraysWith(lines);
    printer.indentObjectsWith(lines);
    return printer;
  }

  /** Breaks lines down to a depth. */
  private static final class Lines implements DefaultPrettyPrinter.Indenter {
    private static final DefaultIndenter BREAK = new DefaultIndenter(" ", "\n");

    @Override
    public void writeIndentation(JsonGenerator out, int level) throws IOException {
      if (level <= BROKEN_DEPTH) {
        BREAK.writeIndentation(out, level);
      } else {
        out.writeRaw(' ');
      }
    }

    @Override
    public boolean isInline() {
      return false;
    }
  }
}
