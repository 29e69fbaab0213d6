package org.kappatrail.duty;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.kappatrail.history.Bearing;

/** The register's names as rows of a statement: bearing (its key), asset, name. */
final class RegisterNames {
  private RegisterNames() {}

  /** Rows for VALUES; one that matches nothing where the register is empty. */
  static String rows(List<Bearing> bearings) {
    if (bearings.isEmpty()) {
      return "(0, NULL, NULL)";
    }
    return IntStream.range(0, bearings.size())
        .mapToObj(
            index ->
                "("
                    + (index + 1)
                    + ", "
                    + SqlText.literal(bearings.get(index).asset())
                    + ", "
                    + SqlText.literal(bearings.get(index).id())
                    + ")")
        .collect(Collectors.joining(", "));
  }
}
