package org.kappatrail.review;

/**
 * The order of numbers, ascending and stable: equal ones keep their places. Sorts places rather
 * than values and keeps its room, because it runs for every bearing and day.
 */
final class StableOrder {
  private static final int SHORT_RUN = 12;

  private int[] places = new int[0];
  private int[] room = new int[0];

  /** Sorts the first {@code size} keys. */
  void sort(double[] keys, int size) {
    if (places.length < size) {
      places = new int[keys.length];
      room = new int[keys.length];
    }
    for (int from = 0; from < size; from += SHORT_RUN) {
      insert(keys, from, Math.min(from + SHORT_RUN, size));
    }
    for (int width = SHORT_RUN; width < size; width *= 2) {
      for (int from = 0; from + width < size; from += 2 * width) {
        merge(keys, from, from + width, Math.min(from + 2 * width, size));
      }
    }
  }

  /** Place of the key that comes at a rank. */
  int place(int rank) {
    return places[rank];
  }

  private void insert(double[] keys, int from, int to) {
    for (int next = from; next < to; next++) {
      int at = next;
      while (at > from && keys[places[at - 1]] > keys[next]) {
        places[at] = places[at - 1];
        at--;
      }
      places[at] = next;
    }
  }

  private void merge(double[] keys, int from, int middle, int to) {
    if (keys[places[middle - 1]] <= keys[places[middle]]) {
      return;
    }
    System.arraycopy(places, from, room, from, middle - from);
    int left = from;
    int right = middle;
    int at = from;
    while (left < middle && right < to) {
      boolean rightIsLess = keys[places[right]] < keys[room[left]];
      places[at++] = rightIsLess ? places[right++] : room[left++];
    }
    System.arraycopy(room, left, places, at, middle - left);
  }
}
