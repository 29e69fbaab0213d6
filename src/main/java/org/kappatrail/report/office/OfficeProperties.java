package org.kappatrail.report.office;

import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Date;
import java.util.Optional;
import org.apache.poi.ooxml.POIXMLProperties;
import org.kappatrail.review.Review;

/** Properties of an office file: its title, and the day reviewed in place of the clock. */
public final class OfficeProperties {
  private static final String PROGRAM = "Kappatrail";

  private OfficeProperties() {}

  /**
   * Sets the properties.
   *
   * @param kind what the file is, as its title begins
   */
  public static void set(POIXMLProperties properties, Review review, String kind) {
    Instant day = review.asOf().atStartOfDay(ZoneOffset.UTC).toInstant();
    String site = ShownText.of(review.settings().site());
    POIXMLProperties.CoreProperties core = properties.getCoreProperties();
    core.setCreator(PROGRAM);
    core.setLastModifiedByUser(PROGRAM);
    core.setTitle(kind + (site.isEmpty() ? "" : " of " + site) + ", state of " + review.asOf());
    core.setCreated(Optional.of(Date.from(day)));
    core.getUnderlyingProperties().setModifiedProperty(Optional.of(Date.from(day)));
    properties.getExtendedProperties().setApplication(PROGRAM);
  }
}
