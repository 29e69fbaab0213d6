package org.kappatrail.intake;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.poi.openxml4j.exceptions.OpenXML4JException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.openxml4j.opc.PackageAccess;
import org.apache.poi.util.XMLHelper;
import org.apache.poi.xssf.eventusermodel.ReadOnlySharedStringsTable;
import org.apache.poi.xssf.eventusermodel.XSSFReader;
import org.apache.poi.xssf.model.StylesTable;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;
import org.xml.sax.Attributes;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;
import org.xml.sax.XMLReader;
import org.xml.sax.helpers.DefaultHandler;

/** Reads a sheet of a workbook, streaming and within limits that no table of samples reaches. */
final class WorkbookFile {
  private static final long LARGEST_BYTES = 64L << 20;
  private static final long LARGEST_PART_BYTES = 512L << 20;
  private static final long LARGEST_TEXTS_BYTES = 128L << 20;

  private WorkbookFile() {}

  /**
   * The table of a workbook.
   *
   * @throws UnusableInputException where it is no workbook, lacks the sheet or has no header
   */
  static RawTable read(Path path, String file, ExportMapping mapping) {
    Sheet sheet = sheet(path, file, mapping.sheet());
    List<RawRow> rows =
        sheet.rows().stream().filter(row -> row.line() > mapping.skipLines()).toList();
    int headerRows = Math.min(mapping.headerRows(), rows.size());
    if (headerRows == 0) {
      throw new UnusableInputException(
          file
              + ": sheet '"
              + sheet.name()
              + "' is empty; its first row must name the columns, or set sheet: to one of "
              + String.join(", ", sheet.all()));
    }
    List<RawRow> body = new ArrayList<>();
    for (RawRow row : rows.subList(headerRows, rows.size())) {
      if (CsvFile.isFooter(row, mapping)) {
        break;
      }
      body.add(row);
    }
    List<String> notes = new ArrayList<>(sheet.notes());
    if (mapping.sheet().isEmpty() && sheet.all().size() > 1) {
      notes.add(
          "sheet '"
              + sheet.name()
              + "' is read, of "
              + String.join(", ", sheet.all())
              + "; set sheet: for another");
    }
    return new RawTable(
        file,
        Headers.of(rows.subList(0, headerRows)),
        rows.get(0).line(),
        body,
        notes,
        sheet.use1904());
  }

  /**
   * A sheet as it was found.
   *
   * @param name its name
   * @param all names of all sheets
   * @param rows its rows that hold something
   * @param notes what is worth saying
   * @param use1904 true where the workbook counts days from 1904
   */
  record Sheet(
      String name, List<String> all, List<RawRow> rows, List<String> notes, boolean use1904) {
    Sheet {
      all = List.copyOf(all);
      rows = List.copyOf(rows);
      notes = List.copyOf(notes);
    }
  }

  /** A sheet by its name, else the first one. */
  static Sheet sheet(Path path, String file, Optional<String> wanted) {
    try {
      if (Files.size(path) > LARGEST_BYTES) {
        throw new UnusableInputException(
            file + ": is larger than " + LARGEST_BYTES + " bytes; save the one sheet as CSV");
      }
      try (OPCPackage opened = OPCPackage.open(path.toFile(), PackageAccess.READ)) {
        return sheet(opened, file, wanted);
      }
    } catch (UnusableInputException e) {
      throw e;
    } catch (IOException
        | OpenXML4JException
        | SAXException
        | ParserConfigurationException
        | RuntimeException e) {
      // The library throws many kinds of unchecked exceptions at files that are no workbooks.
      throw new UnusableInputException(
          file
              + ": cannot be read as a workbook ("
              + firstLine(e)
              + "); open it in a spreadsheet program and save it as .xlsx or CSV",
          e);
    }
  }

  private static Sheet sheet(OPCPackage opened, String file, Optional<String> wanted)
      throws IOException, OpenXML4JException, SAXException, ParserConfigurationException {
    XSSFReader reader = new XSSFReader(opened);
    StylesTable styles = reader.getStylesTable();
    boolean use1904 = use1904(reader);
    List<String> all = new ArrayList<>();
    XSSFReader.SheetIterator names = reader.getSheetIterator();
    while (names.hasNext()) {
      names.next().close();
      all.add(names.getSheetName());
    }
    int chosen = 0;
    if (wanted.isPresent()) {
      String key = Texts.key(wanted.get());
      chosen = all.stream().map(Texts::key).toList().indexOf(key);
    }
    if (all.isEmpty() || chosen < 0) {
      throw new UnusableInputException(
          file
              + ": has no sheet '"
              + wanted.orElse("")
              + "'; it has "
              + String.join(", ", all)
              + "; correct sheet: in "
              + SettingsReader.FILE);
    }
    SheetHandler handler = new SheetHandler(strings(reader), styles, use1904);
    XSSFReader.SheetIterator sheets = reader.getSheetIterator();
    for (int index = 0; sheets.hasNext(); index++) {
      try (InputStream sheet = sheets.next()) {
        if (index == chosen) {
          parse(sheet, handler);
        }
      }
    }
    return new Sheet(
        all.get(chosen),
        all,
        handler.rows(),
        handler.formulaNote().map(List::of).orElse(List.of()),
        use1904);
  }

  private static ReadOnlySharedStringsTable strings(XSSFReader reader)
      throws IOException, OpenXML4JException, SAXException {
    InputStream data = reader.getSharedStringsData();
    if (data == null) {
      byte[] none = "<sst/>".getBytes(java.nio.charset.StandardCharsets.UTF_8);
      return new ReadOnlySharedStringsTable(new java.io.ByteArrayInputStream(none));
    }
    try (InputStream bounded = new BoundedStream(data, LARGEST_TEXTS_BYTES)) {
      return new ReadOnlySharedStringsTable(bounded);
    }
  }

  private static boolean use1904(XSSFReader reader)
      throws IOException, OpenXML4JException, SAXException, ParserConfigurationException {
    boolean[] found = {false};
    try (InputStream workbook = reader.getWorkbookData()) {
      parse(
          workbook,
          new DefaultHandler() {
            @Override
            public void startElement(String uri, String local, String name, Attributes given) {
              String flag = given.getValue("date1904");
              if (local.equals("workbookPr") && flag != null) {
                found[0] = flag.equals("1") || flag.equals("true");
              }
            }
          });
    }
    return found[0];
  }

  private static void parse(InputStream part, DefaultHandler handler)
      throws IOException, SAXException, ParserConfigurationException {
    XMLReader xml = XMLHelper.newXMLReader();
    xml.setContentHandler(handler);
    xml.setErrorHandler(handler);
    xml.parse(new InputSource(new BoundedStream(part, LARGEST_PART_BYTES)));
  }

  private static String firstLine(Exception e) {
    String message = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
    return message.lines().findFirst().orElse("");
  }
}
