package org.kappatrail.report.workbook;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.Font;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.kappatrail.review.Level;

/** The few cell styles of the workbook; levels are told by shape, word and a quiet fill. */
final class Styles {
  private static final byte OPAQUE = (byte) 0xFF;
  private static final byte[] HEADER_FILL = {OPAQUE, (byte) 0xE3, (byte) 0xEA, (byte) 0xF2};
  private static final byte[] ALARM_FILL = {OPAQUE, (byte) 0xD9, (byte) 0xDC, (byte) 0xDF};
  private static final byte[] ALERT_FILL = {OPAQUE, (byte) 0xEE, (byte) 0xEF, (byte) 0xF1};
  private static final String DATE_TIME = "yyyy-mm-dd hh:mm";

  private final SXSSFWorkbook workbook;
  private final Map<CellKind, CellStyle> byKind = new EnumMap<>(CellKind.class);
  private final Map<Level, CellStyle> byLevel = new EnumMap<>(Level.class);
  private final CellStyle header;
  private final CellStyle numberHeader;
  private final CellStyle title;
  private final CellStyle dateTime;
  private final CellStyle quoted;

  Styles(SXSSFWorkbook workbook) {
    this.workbook = workbook;
    for (CellKind kind : CellKind.values()) {
      CellStyle style = style(kind.format());
      style.setWrapText(kind == CellKind.PROSE);
      byKind.put(kind, style);
    }
    byLevel.put(Level.ALARM, level("■", Optional.of(ALARM_FILL), true));
    byLevel.put(Level.ALERT, level("◈", Optional.of(ALERT_FILL), false));
    byLevel.put(Level.CLEAR, level("○", Optional.empty(), false));
    header = header(HorizontalAlignment.LEFT);
    numberHeader = header(HorizontalAlignment.RIGHT);
    title = style("@");
    title.setFont(bold(14));
    dateTime = style(DATE_TIME);
    quoted = style("@");
    quoted.setQuotePrefixed(true);
  }

  CellStyle of(CellKind kind) {
    return byKind.getOrDefault(kind, header);
  }

  CellStyle of(Level level) {
    return byLevel.getOrDefault(level, header);
  }

  CellStyle header(boolean overNumbers) {
    return overNumbers ? numberHeader : header;
  }

  CellStyle title() {
    return title;
  }

  CellStyle dateTime() {
    return dateTime;
  }

  /** Text that stays text also when the cell is edited. */
  CellStyle quoted() {
    return quoted;
  }

  /** The word keeps its value, so that it can be filtered; its shape comes with the format. */
  private CellStyle level(String mark, Optional<byte[]> fill, boolean strong) {
    CellStyle style = style("General;General;General;\"" + mark + " \"@");
    fill.ifPresent(colour -> fill(style, colour));
    if (strong) {
      style.setFont(bold(11));
    }
    return style;
  }

  private CellStyle header(HorizontalAlignment alignment) {
    CellStyle style = style("@");
    fill(style, HEADER_FILL);
    style.setFont(bold(11));
    style.setBorderBottom(BorderStyle.THIN);
    style.setVerticalAlignment(VerticalAlignment.BOTTOM);
    style.setAlignment(alignment);
    return style;
  }

  private CellStyle style(String format) {
    CellStyle style = workbook.createCellStyle();
    style.setDataFormat(workbook.createDataFormat().getFormat(format));
    style.setVerticalAlignment(VerticalAlignment.TOP);
    return style;
  }

  private Font bold(int points) {
    Font font = workbook.createFont();
    font.setBold(true);
    font.setFontHeightInPoints((short) points);
    return font;
  }

  private static void fill(CellStyle style, byte[] colour) {
    ((XSSFCellStyle) style).setFillForegroundColor(new XSSFColor(colour, null));
    style.setFillPattern(FillPatternType.SOLID_FOREGROUND);
  }
}
