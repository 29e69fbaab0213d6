package org.kappatrail.demo;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import java.util.zip.GZIPOutputStream;

/** Makes the sample history of the invented paper mill of Tarn Hollow, always the same. */
public final class TarnHollow {
  private TarnHollow() {}

  /** Writes the history into the folder given, {@code sample-history} where none is. */
  public static void main(String[] arguments) throws IOException {
    Path folder = Path.of(arguments.length > 0 ? arguments[0] : "sample-history");
    Map<String, byte[]> files = new TreeMap<>(tables());
    files.putAll(logs());
    for (Map.Entry<String, byte[]> file : files.entrySet()) {
      Path path = folder.resolve(file.getKey());
      Files.createDirectories(path.toAbsolutePath().getParent());
      Files.write(path, file.getValue());
    }
  }

  /** Settings, registers, events and samples by their paths within the history. */
  static Map<String, byte[]> tables() {
    Map<String, byte[]> files = new TreeMap<>();
    files.put("kappatrail.yaml", bytes(Register.SETTINGS));
    files.put("assets.csv", bytes(Register.ASSETS));
    files.put("bearings.csv", bytes(Register.BEARINGS));
    files.put("oils.csv", bytes(Register.OILS));
    files.put("events.csv", bytes(Register.EVENTS));
    new SampleSheets().files().forEach((name, text) -> files.put("samples/" + name, bytes(text)));
    return files;
  }

  /** Compressed logs by their paths within the history. */
  static Map<String, byte[]> logs() {
    Map<String, byte[]> files = new TreeMap<>();
    LogSheets.files()
        .forEach((name, text) -> files.put("temperatures/" + name + ".gz", gzip(bytes(text))));
    return files;
  }

  private static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  /** Compressed without name and time, which {@link GZIPOutputStream} leaves out. */
  private static byte[] gzip(byte[] content) {
    ByteArrayOutputStream packed = new ByteArrayOutputStream();
    try (GZIPOutputStream out = new GZIPOutputStream(packed)) {
      out.write(content);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return packed.toByteArray();
  }
}
