package org.kappatrail.duty;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.IllegalCharsetNameException;
import java.nio.charset.StandardCharsets;
import java.nio.charset.UnsupportedCharsetException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.zip.GZIPInputStream;
import org.kappatrail.history.UnusableInputException;

/** Opens a CSV file as text: unpacked, in its encoding, without a byte order mark. */
final class CsvText {
  private static final int BUFFER = 1 << 16;

  private CsvText() {}

  /** The file's characters; a byte that is none in the encoding is an error. */
  static BufferedReader open(LogFile file) throws IOException {
    return open(file.path(), charset(file));
  }

  static BufferedReader open(Path path, Charset charset) throws IOException {
    InputStream bytes = Files.newInputStream(path);
    try {
      InputStream unpacked =
          path.toString().toLowerCase(Locale.ROOT).endsWith(".gz")
              ? new GZIPInputStream(bytes, BUFFER)
              : bytes;
      Reader reader =
          new InputStreamReader(
              unpacked,
              charset
                  .newDecoder()
                  .onMalformedInput(CodingErrorAction.REPORT)
                  .onUnmappableCharacter(CodingErrorAction.REPORT));
      BufferedReader text = new BufferedReader(reader, BUFFER);
      skipByteOrderMark(text);
      return text;
    } catch (IOException | RuntimeException e) {
      bytes.close();
      throw e;
    }
  }

  /** The encoding that the settings name, else what the byte order mark tells, else UTF-8. */
  static Charset charset(LogFile file) {
    if (file.mapping().encoding().isEmpty()) {
      return beginsLikeUtf16(file.path()) ? StandardCharsets.UTF_16 : StandardCharsets.UTF_8;
    }
    String name = file.mapping().encoding().get();
    try {
      return Charset.forName(name);
    } catch (IllegalCharsetNameException | UnsupportedCharsetException e) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: encoding '"
              + name
              + "' is not known; common ones are UTF-8, windows-1252 and UTF-16",
          e);
    }
  }

  private static boolean beginsLikeUtf16(Path path) {
    try (InputStream bytes = Files.newInputStream(path)) {
      int first = bytes.read();
      int second = bytes.read();
      return (first == 0xFF && second == 0xFE) || (first == 0xFE && second == 0xFF);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static boolean isUtf8(LogFile file) {
    return charset(file).equals(StandardCharsets.UTF_8);
  }

  /** Records of a text, as forgiving as the scan of the engine. */
  static CsvReader<CsvRecord> records(Reader text, char delimiter) {
    return CsvReader.builder()
        .fieldSeparator(delimiter)
        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
        .allowUnclosedQuote(true)
        .ofCsvRecord(text);
  }

  private static void skipByteOrderMark(BufferedReader text) throws IOException {
    text.mark(1);
    if (text.read() != '\uFEFF') {
      text.reset();
    }
  }
}
