package org.kappatrail.history;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * How one kind of export (a laboratory's or a historian's) is read; a block of the settings.
 *
 * @param files glob of paths within the history folder; empty for a database
 * @param jdbc JDBC address of a database; only for readings
 * @param table table or view in that database
 * @param columns header name to canonical column
 * @param units canonical column to the unit it is given in
 * @param dateFormat pattern of dates, as of {@link java.time.format.DateTimeFormatter}
 * @param decimalComma true where the comma is the decimal sign
 * @param thousands thousands separator that is to be taken out
 * @param delimiter column delimiter; found from the header where not given
 * @param encoding name of the character encoding
 * @param skipLines lines before the header
 * @param headerRows rows of the header, joined with a blank
 * @param footer a row whose first cell starts with this ends the table
 * @param constants canonical column to a text that holds for every row
 * @param sheet sheet of a workbook
 * @param timezone zone of local times, where it differs from the site's
 * @param tags wide form: header or tag name to what it measures
 * @param missing texts that stand for a missing value, beside the usual ones
 */
public record ExportMapping(
    String files,
    Optional<String> jdbc,
    Optional<String> table,
    Map<String, String> columns,
    Map<String, String> units,
    Optional<String> dateFormat,
    boolean decimalComma,
    Optional<String> thousands,
    Optional<String> delimiter,
    Optional<String> encoding,
    int skipLines,
    int headerRows,
    Optional<String> footer,
    Map<String, String> constants,
    Optional<String> sheet,
    Optional<String> timezone,
    Map<String, Tag> tags,
    List<String> missing) {

  /**
   * What a historian's tag measures.
   *
   * @param asset asset it is mounted on; empty where a column of the file names it
   * @param bearing bearing within the asset
   * @param quantity what it carries
   */
  public record Tag(Optional<String> asset, String bearing, Quantity quantity) {
    public Tag {
      asset.ifPresent(name -> Names.require("asset", name));
      Names.require("bearing", bearing);
    }

    /** A tag of one bearing. */
    public Tag(BearingKey key, Quantity quantity) {
      this(Optional.of(key.asset()), key.bearing(), quantity);
    }

    /** Quantities a tag can carry. */
    public enum Quantity {
      TEMPERATURE("temperature_c"),
      SPEED("speed_rpm"),
      QUALITY("quality");

      private final String label;

      Quantity(String label) {
        this.label = label;
      }

      /** The canonical column of the quantity. */
      public String label() {
        return label;
      }
    }
  }

  public ExportMapping {
    columns = Collections.unmodifiableMap(new LinkedHashMap<>(columns));
    units = Collections.unmodifiableMap(new LinkedHashMap<>(units));
    constants = Collections.unmodifiableMap(new LinkedHashMap<>(constants));
    tags = Collections.unmodifiableMap(new LinkedHashMap<>(tags));
    missing = List.copyOf(missing);
  }

  /** A block without missing markers of its own. */
  public ExportMapping(
      String files,
      Optional<String> jdbc,
      Optional<String> table,
      Map<String, String> columns,
      Map<String, String> units,
      Optional<String> dateFormat,
      boolean decimalComma,
      Optional<String> thousands,
      Optional<String> delimiter,
      Optional<String> encoding,
      int skipLines,
      int headerRows,
      Optional<String> footer,
      Map<String, String> constants,
      Optional<String> sheet,
      Optional<String> timezone,
      Map<String, Tag> tags) {
    this(
        files,
        jdbc,
        table,
        columns,
        units,
        dateFormat,
        decimalComma,
        thousands,
        delimiter,
        encoding,
        skipLines,
        headerRows,
        footer,
        constants,
        sheet,
        timezone,
        tags,
        List.of());
  }

  /** Canonical columns, everything else by default, for the files of a glob. */
  public static ExportMapping canonical(String files) {
    return new ExportMapping(
        files,
        Optional.empty(),
        Optional.empty(),
        Map.of(),
        Map.of(),
        Optional.empty(),
        false,
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        0,
        1,
        Optional.empty(),
        Map.of(),
        Optional.empty(),
        Optional.empty(),
        Map.of(),
        List.of());
  }
}
