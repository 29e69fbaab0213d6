package org.kappatrail.duty;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.util.List;
import java.util.zip.GZIPInputStream;

/**
 * How many readings files hold, as far as their size and their first rows tell: for a progress bar
 * alone. Parquet files carry the number.
 */
final class RowEstimate {
  private static final int LOOK_AT_BYTES = 1 << 17;
  private static final int GZIP_BUFFER = 1 << 9;

  private RowEstimate() {}

  static long of(List<LogTable> tables, DuckEngine engine) {
    double rows = 0;
    for (LogTable table : tables) {
      rows +=
          table.file().format() == LogFile.Format.PARQUET
              ? engine.number(
                  "SELECT SUM(num_rows) FROM parquet_file_metadata("
                      + SqlText.literal(table.path().toString())
                      + ")")
              : ofText(table);
    }
    return Math.round(rows);
  }

  private static double ofText(LogTable table) {
    try (Counted bytes = new Counted(Files.newInputStream(table.path()));
        InputStream text = text(table, bytes)) {
      byte[] head = text.readNBytes(LOOK_AT_BYTES);
      long lines = 0;
      for (byte each : head) {
        lines += each == '\n' ? 1 : 0;
      }
      long size = Files.size(table.path());
      boolean whole = bytes.count >= size && head.length < LOOK_AT_BYTES;
      return whole ? lines : (double) lines * size / Math.max(1, bytes.count);
    } catch (IOException e) {
      // The scan will say what is wrong with the file.
      return 0;
    }
  }

  private static InputStream text(LogTable table, InputStream bytes) throws IOException {
    return table.path().toString().endsWith(".gz")
        ? new GZIPInputStream(bytes, GZIP_BUFFER)
        : bytes;
  }

  /** Counts what is taken from a stream. */
  private static final class Counted extends FilterInputStream {
    private long count;

    Counted(InputStream in) {
      super(in);
    }

    @Override
    public int read() throws IOException {
      int read = super.read();
      count += read < 0 ? 0 : 1;
      return read;
    }

    @Override
    public int read(byte[] target, int offset, int length) throws IOException {
      int read = super.read(target, offset, length);
      count += Math.max(0, read);
      return read;
    }
  }
}
