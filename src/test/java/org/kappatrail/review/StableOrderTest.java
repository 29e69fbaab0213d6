package org.kappatrail.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Comparator;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class StableOrderTest {
  @Test
  void ordersAsTheLibrarySortsWhateverTheSizeAndKeepsTiesInPlace() {
    StableOrder order = new StableOrder();
    Random random = new Random(3);
    for (int size = 0; size < 400; size++) {
      int distinct = 1 + random.nextInt(60);
      double[] keys = random.doubles(size + 3).map(key -> Math.floor(key * distinct)).toArray();

      order.sort(keys, size);

      int[] found = IntStream.range(0, size).map(order::place).toArray();
      int[] expected =
          IntStream.range(0, size)
              .boxed()
              .sorted(Comparator.comparingDouble(place -> keys[place]))
              .mapToInt(Integer::intValue)
              .toArray();
      assertThat(found).isEqualTo(expected);
    }
  }

  @Test
  void ordersWhatIsOrderedOrReversedAlready() {
    StableOrder order = new StableOrder();
    double[] falling = IntStream.range(0, 100).mapToDouble(i -> -i).toArray();

    order.sort(falling, 100);

    assertThat(IntStream.range(0, 100).map(order::place).toArray())
        .isEqualTo(IntStream.range(0, 100).map(i -> 99 - i).toArray());
  }
}
