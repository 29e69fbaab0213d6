package org.kappatrail.intake;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.List;

/**
 * What an input file was when it was read.
 *
 * @param file path within the history folder, with forward slashes
 * @param bytes its size
 * @param sha256 SHA-256 in hexadecimal digits
 */
public record Fingerprint(String file, long bytes, String sha256) {
  private static final int BUFFER = 1 << 16;

  /** Fingerprints of files, in the order of their names; read piecewise, whatever their size. */
  public static List<Fingerprint> of(Path folder, List<Path> files) throws IOException {
    List<Fingerprint> fingerprints = new ArrayList<>();
    for (Path file : files) {
      fingerprints.add(of(folder, file));
    }
    fingerprints.sort(Comparator.comparing(Fingerprint::file));
    return List.copyOf(fingerprints);
  }

  private static Fingerprint of(Path folder, Path file) throws IOException {
    MessageDigest digest;
    try {
      digest = MessageDigest.getInstance("SHA-256");
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
    long bytes = 0;
    byte[] buffer = new byte[BUFFER];
    try (InputStream in = Files.newInputStream(file)) {
      for (int count = in.read(buffer); count > 0; count = in.read(buffer)) {
        digest.update(buffer, 0, count);
        bytes += count;
      }
    }
    Path name =
        file.startsWith(folder)
            ? folder.relativize(file)
            : folder.toAbsolutePath().relativize(file.toAbsolutePath());
    return new Fingerprint(
        name.toString().replace('\\', '/'), bytes, HexFormat.of().formatHex(digest.digest()));
  }
}
