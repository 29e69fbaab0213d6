package org.kappatrail.intake;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** Stops reading an unpacked part of a workbook where it is larger than any honest one. */
final class BoundedStream extends FilterInputStream {
  private long left;

  BoundedStream(InputStream in, long most) {
    super(in);
    this.left = most;
  }

  @Override
  public int read() throws IOException {
    int value = super.read();
    if (value >= 0) {
      count(1);
    }
    return value;
  }

  @Override
  public int read(byte[] bytes, int offset, int length) throws IOException {
    int got = super.read(bytes, offset, length);
    if (got > 0) {
      count(got);
    }
    return got;
  }

  private void count(int got) throws IOException {
    left -= got;
    if (left < 0) {
      throw new IOException("a part of it unpacks to more than any table of samples needs");
    }
  }
}
