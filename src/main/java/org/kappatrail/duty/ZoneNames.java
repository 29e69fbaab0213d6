package org.kappatrail.duty;

import java.time.DateTimeException;
import java.time.ZoneId;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** The zone of local times of an export. */
final class ZoneNames {
  private ZoneNames() {}

  /** The block's own zone, else the site's. */
  static ZoneId of(ExportMapping mapping, Settings settings) {
    if (mapping.timezone().isEmpty()) {
      return settings.zone();
    }
    String name = mapping.timezone().get();
    try {
      return ZoneId.of(name);
    } catch (DateTimeException e) {
      throw new UnusableInputException(
          "kappatrail.yaml: temperatures: timezone '"
              + name
              + "' is not known; write it like Europe/London or UTC",
          e);
    }
  }
}
