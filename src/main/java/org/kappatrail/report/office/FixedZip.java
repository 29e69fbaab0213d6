package org.kappatrail.report.office;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.time.LocalDateTime;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/**
 * Rewrites an office file, which is a ZIP, so that its bytes follow from its content alone: every
 * entry, also those of the workbooks within, carries one fixed time.
 */
public final class FixedZip {
  /** The earliest time that a ZIP can hold, in 1980, would be written with the zone's own too. */
  private static final LocalDateTime FIXED = LocalDateTime.of(1981, 1, 1, 0, 0);

  private static final String WORKBOOK = ".xlsx";

  private FixedZip() {}

  public static void write(byte[] office, OutputStream out) throws IOException {
    ZipOutputStream zip = new ZipOutputStream(out);
    copy(new ByteArrayInputStream(office), zip);
    zip.finish();
  }

  private static void copy(InputStream office, ZipOutputStream zip) throws IOException {
    ZipInputStream entries = new ZipInputStream(office);
    for (ZipEntry entry = entries.getNextEntry(); entry != null; entry = entries.getNextEntry()) {
      ZipEntry fixed = new ZipEntry(entry.getName());
      fixed.setTimeLocal(FIXED);
      zip.putNextEntry(fixed);
      if (entry.getName().endsWith(WORKBOOK)) {
        zip.write(of(entries.readAllBytes()));
      } else {
        entries.transferTo(zip);
      }
      zip.closeEntry();
    }
  }

  private static byte[] of(byte[] office) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    write(office, bytes);
    return bytes.toByteArray();
  }
}
