package org.kappatrail.intake;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.IllegalCharsetNameException;
import java.nio.charset.StandardCharsets;
import java.nio.charset.UnsupportedCharsetException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/** Opens text files in their encoding. */
final class Encodings {
  private Encodings() {}

  /** The encoding of a name; empty where there is none of that name. */
  static Optional<Charset> find(String name) {
    try {
      return Optional.of(Charset.forName(name.strip()));
    } catch (IllegalCharsetNameException | UnsupportedCharsetException e) {
      return Optional.empty();
    }
  }

  /**
   * Opens a file. Bytes that are none in the encoding become {@link Texts#REPLACEMENT}, so that
   * they cost the cells they stand in and not the file. A UTF-16 byte order mark is heeded whatever
   * the encoding.
   */
  static Reader open(Path path, Charset charset) throws IOException {
    InputStream bytes = Files.newInputStream(path);
    try {
      return new InputStreamReader(
          bytes,
          marked(path)
              .orElse(charset)
              .newDecoder()
              .onMalformedInput(CodingErrorAction.REPLACE)
              .onUnmappableCharacter(CodingErrorAction.REPLACE));
    } catch (IOException | RuntimeException e) {
      bytes.close();
      throw e;
    }
  }

  /** The encoding that a byte order mark tells. */
  static Optional<Charset> marked(Path path) throws IOException {
    try (InputStream bytes = Files.newInputStream(path)) {
      int first = bytes.read();
      int second = bytes.read();
      if (first == 0xEF && second == 0xBB && bytes.read() == 0xBF) {
        return Optional.of(StandardCharsets.UTF_8);
      }
      boolean utf16 = (first == 0xFF && second == 0xFE) || (first == 0xFE && second == 0xFF);
      return utf16 ? Optional.of(StandardCharsets.UTF_16) : Optional.empty();
    }
  }
}
