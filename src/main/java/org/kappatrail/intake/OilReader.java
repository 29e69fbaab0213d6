package org.kappatrail.intake;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Oil;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.history.SourceLine;
import org.kappatrail.tribology.OilViscosity;

/** Reads {@code oils.csv}. */
final class OilReader {
  static final String FILE = "oils.csv";

  private static final List<String> COLUMNS =
      List.of(
          "oil",
          "grade_vg",
          "viscosity_40c_cst",
          "viscosity_100c_cst",
          "viscosity_index",
          "effective_ep",
          "vi_improved",
          "price_per_l");
  private static final Limit GRADE = new Limit(2, 10_000, "");
  private static final Limit INDEX = new Limit(-200, 500, "");
  private static final Limit PRICE = new Limit(0, 1e9, "");

  private final RegisterTable table;
  private final List<String> elements;
  private final Map<String, SourceLine> seen = new HashMap<>();
  private final Map<String, SourceLine> left = new HashMap<>();
  private final RegisterFolder folder;

  OilReader(RegisterFolder folder) {
    this.folder = folder;
    this.table =
        folder.table(
            FILE, FileAccount.Kind.OILS, COLUMNS, List.of("oil", SampleColumns.VISCOSITY_40C));
    this.elements =
        table.further().stream()
            .filter(name -> name.endsWith(SampleColumns.ELEMENT_SUFFIX))
            .distinct()
            .toList();
  }

  List<Oil> read() {
    List<String> unused =
        table.further().stream().filter(name -> !elements.contains(name)).toList();
    List<Oil> oils = table.read(this::oil, folder.accounts(), unused, oil -> Optional.empty());
    oils.forEach(oil -> left.remove(oil.id()));
    return oils;
  }

  /** Oils of the file that were left out, with their lines. */
  Map<String, SourceLine> left() {
    return Map.copyOf(left);
  }

  private Optional<Oil> oil(Row row) {
    Optional<String> id = row.requiredName("oil");
    id.ifPresent(name -> left.putIfAbsent(name, row.source()));
    OptionalDouble viscosity40 =
        row.requiredNumber(
            SampleColumns.VISCOSITY_40C, SampleLimits.of(SampleColumns.VISCOSITY_40C));
    OptionalDouble viscosity100 =
        row.number(SampleColumns.VISCOSITY_100C, SampleLimits.of(SampleColumns.VISCOSITY_100C));
    OptionalDouble index = row.number("viscosity_index", INDEX);
    if (row.isRejected() || id.isEmpty() || viscosity40.isEmpty()) {
      return Optional.empty();
    }
    if (viscosity100.isEmpty() && index.isEmpty()) {
      row.reject(
          SampleColumns.VISCOSITY_100C,
          "",
          "neither this nor viscosity_index is given; fill in one of them");
      return Optional.empty();
    }
    Optional<OilViscosity> viscosity = viscosity(row, viscosity40, viscosity100, index);
    if (viscosity.isEmpty() || folder.isRepeated(seen, "oil", id.get(), row)) {
      return Optional.empty();
    }
    Map<String, Double> values = new TreeMap<>();
    for (String element : elements) {
      row.number(element, SampleLimits.of(element)).ifPresent(ppm -> values.put(element, ppm));
    }
    return Optional.of(
        new Oil(
            id.get(),
            row.wholeNumber("grade_vg", GRADE),
            viscosity.get(),
            row.isYes("effective_ep"),
            row.isYes("vi_improved"),
            row.number("price_per_l", PRICE),
            values));
  }

  private static Optional<OilViscosity> viscosity(
      Row row, OptionalDouble at40, OptionalDouble at100, OptionalDouble index) {
    try {
      return Optional.of(OilViscosity.register(at40.getAsDouble(), at100, index));
    } catch (IllegalArgumentException e) {
      String column = at100.isPresent() ? SampleColumns.VISCOSITY_100C : "viscosity_index";
      row.reject(column, row.cell(column), e.getMessage() + "; correct one of the two");
      return Optional.empty();
    }
  }
}
