package org.kappatrail.review.correlation;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * The variables of one asset over its samples.
 *
 * @param asset name of the asset
 * @param days days of sampling, from any epoch, in time
 * @param variables a place per day each; of a pair the earlier one is x
 */
public record AssetSeries(String asset, List<Double> days, List<Variable> variables) {

  public AssetSeries {
    days = List.copyOf(days);
    variables = List.copyOf(variables);
    Set<String> names = new HashSet<>();
    for (Variable variable : variables) {
      if (variable.size() != days.size()) {
        throw new IllegalArgumentException(
            variable.name()
                + " has "
                + variable.size()
                + " places for "
                + days.size()
                + " samples");
      }
      if (!names.add(variable.name())) {
        throw new IllegalArgumentException("two variables are named " + variable.name());
      }
    }
    for (int i = 0; i < days.size(); i++) {
      if (!Double.isFinite(days.get(i)) || (i > 0 && days.get(i) < days.get(i - 1))) {
        throw new IllegalArgumentException("day " + days.get(i) + " is out of order");
      }
    }
  }
}
