package org.kappatrail.value;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Four hundred machines of known truth over five years: expected cost a year under the program's
 * own verdicts, under rules of thumb (common practice, no source) and under perfect knowledge.
 */
@Tag("slow")
class ValueOfVerdictsTest {
  private static final int MACHINES = Integer.getInteger("value.machines", 400);
  private static final long SEED = 20261201;

  @Test
  void theVerdictsCostLessThanTheRulesOfThumb() throws IOException {
    Map<String, Policy> policies = new LinkedHashMap<>();
    policies.put("plus or minus 10 percent", Rules.offFresh(0.10));
    policies.put("plus or minus 5 percent", Rules.offFresh(0.05));
    policies.put("change below kappa 1", Rules.belowOne());
    policies.put("yearly", Rules.yearly());
    policies.put("never", Rules.never());
    policies.put("program, costs known", new ProgramVerdicts(true));
    policies.put("program, ratio only", new ProgramVerdicts(false));
    policies.put("perfect knowledge", new PerfectKnowledge());
    Map<String, Double> means = new LinkedHashMap<>();
    StringBuilder table = new StringBuilder("policy, cost a year, changes, coolings in 5 years\n");
    policies.forEach(
        (name, policy) -> {
          List<Simulation.Cost> costs = costs(policy);
          double mean =
              costs.stream().mapToDouble(Simulation.Cost::perYear).average().orElseThrow();
          means.put(name, mean);
          table.append(
              String.format(
                  Locale.ROOT,
                  "%s, %.0f, %.2f, %.2f%n",
                  name,
                  mean,
                  costs.stream().mapToInt(Simulation.Cost::changes).average().orElseThrow(),
                  costs.stream().mapToInt(Simulation.Cost::coolings).average().orElseThrow()));
        });
    Files.writeString(Path.of("target", "value-of-verdicts.txt"), table.toString());
    double rule = mean(means, "plus or minus 10 percent");
    assertThat(mean(means, "program, costs known")).isLessThanOrEqualTo(0.60 * rule);
    assertThat(mean(means, "program, ratio only")).isLessThanOrEqualTo(0.65 * rule);
    assertThat(mean(means, "program, costs known"))
        .isLessThanOrEqualTo(1.15 * mean(means, "perfect knowledge"));
  }

  private static double mean(Map<String, Double> means, String policy) {
    Double found = means.get(policy);
    if (found == null) {
      throw new IllegalArgumentException("no policy " + policy);
    }
    return found;
  }

  private static List<Simulation.Cost> costs(Policy policy) {
    return IntStream.range(0, MACHINES)
        .parallel()
        .mapToObj(number -> Simulation.run(new Machine(SEED, number), policy, SEED))
        .toList();
  }
}
