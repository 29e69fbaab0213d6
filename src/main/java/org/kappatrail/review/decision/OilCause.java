package org.kappatrail.review.decision;

import java.util.List;

/**
 * One thing that may have happened to the oil; never certain.
 *
 * @param name in words, with the fraction it would take
 * @param support evidence for it
 * @param objections evidence against it
 * @param weight pieces of evidence for less those against; the more, the likelier
 */
public record OilCause(String name, List<String> support, List<String> objections, int weight) {
  public OilCause {
    support = List.copyOf(support);
    objections = List.copyOf(objections);
  }
}
