package org.kappatrail.review.trend;

/**
 * What moved κ up to a sample.
 *
 * @param sample the sample
 * @param from a sample's id, {@link #CHARGE_START} or {@link #FRESH_OIL}
 * @param parts the parts
 */
public record SampleAttribution(String sample, String from, Attribution parts) {
  /** From the first sample of the charge that has a κ. */
  public static final String CHARGE_START = "charge-start";

  /** From the registered oil when fresh, at the operating point of that first sample. */
  public static final String FRESH_OIL = "fresh-oil";
}
