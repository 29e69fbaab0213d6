package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * What is new, worse, better and settled since an earlier day, found by reviewing the history as it
 * was known then.
 *
 * @param date the earlier day
 * @param items what differs, worst first
 */
public record Since(LocalDate date, List<Item> items) {

  /** How something differs from then. */
  public enum Change {
    NEW,
    WORSE,
    BETTER,
    SETTLED;

    /** The word shown. */
    public String label() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /**
   * One difference.
   *
   * @param change how it differs
   * @param finding the finding as it stands; as it stood then where it is settled
   * @param before its level then; empty where it is new
   */
  public record Item(Change change, Finding finding, Optional<Level> before) {}

  private static final Comparator<Item> ORDER =
      Comparator.comparing(Item::change)
          .thenComparing(item -> item.finding().level(), Comparator.reverseOrder())
          .thenComparing(Item::finding, Finding.ORDER);

  public Since {
    items = items.stream().sorted(ORDER).toList();
  }

  /** A finding is the same one as before if asset, bearing and kind are. */
  private record Key(String asset, String bearing, FindingKind kind) implements Comparable<Key> {
    private static final Comparator<Key> IN_ORDER =
        Comparator.comparing(Key::asset).thenComparing(Key::bearing).thenComparing(Key::kind);

    static Key of(Finding finding) {
      return new Key(finding.asset(), finding.bearing().orElse(""), family(finding.kind()));
    }

    /** Kinds that are one matter in two degrees. */
    private static FindingKind family(FindingKind kind) {
      return switch (kind) {
        case NEAR_FLOOR -> FindingKind.BELOW_FLOOR;
        case OIL_SHIFT -> FindingKind.OIL_DRIFT;
        default -> kind;
      };
    }

    @Override
    public int compareTo(Key other) {
      return IN_ORDER.compare(this, other);
    }
  }

  /** Compares two reviews. */
  static Since of(LocalDate date, List<AssetReview> before, List<AssetReview> now) {
    Map<Key, Finding> then = worst(before);
    Map<Key, Finding> today = worst(now);
    List<Item> items = new ArrayList<>();
    today.forEach(
        (key, finding) -> {
          Optional<Level> earlier = Optional.ofNullable(then.get(key)).map(Finding::level);
          change(earlier, finding.level())
              .ifPresent(change -> items.add(new Item(change, finding, earlier)));
        });
    then.forEach(
        (key, finding) -> {
          if (!today.containsKey(key)) {
            items.add(new Item(Change.SETTLED, finding, Optional.of(finding.level())));
          }
        });
    return new Since(date, items);
  }

  private static Optional<Change> change(Optional<Level> before, Level now) {
    if (before.isEmpty()) {
      return Optional.of(Change.NEW);
    }
    int order = now.compareTo(before.get());
    return order == 0 ? Optional.empty() : Optional.of(order > 0 ? Change.WORSE : Change.BETTER);
  }

  private static Map<Key, Finding> worst(List<AssetReview> assets) {
    Map<Key, Finding> found = new TreeMap<>();
    assets.stream()
        .flatMap(asset -> asset.findings().stream())
        .forEach(
            finding ->
                found.merge(
                    Key.of(finding),
                    finding,
                    (a, b) -> b.level().compareTo(a.level()) > 0 ? b : a));
    return found;
  }
}
