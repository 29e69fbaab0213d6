package org.kappatrail.intake;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Random;

/** Damages the bytes of a file: changed, lost, doubled, and with what trips readers put in. */
final class Mutation {
  private static final String[] SPLINTERS = {
    "\"",
    ",",
    "\n",
    "\r",
    ";",
    "\0",
    "\uFEFF",
    "1e308",
    "-",
    "<",
    ">",
    "2024-02-31",
    "999999999999",
    "{",
    "}",
    "[",
    ": ",
    "- ",
    "\t",
    "é",
    "NaN",
    "%",
    "sample",
    "asset",
    "''",
    "&a",
    "*a",
    "|",
    "#"
  };

  private Mutation() {}

  static byte[] of(byte[] bytes, Random random) {
    byte[] mutated = bytes.clone();
    int changes = 1 + random.nextInt(4);
    for (int change = 0; change < changes && mutated.length > 0; change++) {
      int at = random.nextInt(mutated.length);
      switch (random.nextInt(4)) {
        case 0 -> mutated[at] = (byte) random.nextInt(256);
        case 1 -> {
          int end = Math.min(mutated.length, at + 1 + random.nextInt(12));
          mutated = splice(mutated, at, end, new byte[0]);
        }
        case 2 -> {
          String splinter = SPLINTERS[random.nextInt(SPLINTERS.length)];
          byte[] inserted = splinter.getBytes(StandardCharsets.UTF_8);
          mutated = splice(mutated, at, at, inserted);
        }
        default -> {
          int end = Math.min(mutated.length, at + 1 + random.nextInt(60));
          byte[] part = Arrays.copyOfRange(mutated, at, end);
          int to = random.nextInt(mutated.length);
          mutated = splice(mutated, to, to, part);
        }
      }
    }
    return mutated;
  }

  private static byte[] splice(byte[] whole, int from, int to, byte[] put) {
    byte[] result = new byte[whole.length - (to - from) + put.length];
    System.arraycopy(whole, 0, result, 0, from);
    System.arraycopy(put, 0, result, from, put.length);
    System.arraycopy(whole, to, result, from + put.length, whole.length - to);
    return result;
  }
}
