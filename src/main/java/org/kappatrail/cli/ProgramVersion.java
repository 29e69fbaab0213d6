package org.kappatrail.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine.IVersionProvider;

/** The program's version, as the build wrote it. */
final class ProgramVersion implements IVersionProvider {
  @Override
  public String[] getVersion() {
    return new String[] {"kappatrail " + number()};
  }

  static String number() {
    try (InputStream in = ProgramVersion.class.getResourceAsStream("program.properties")) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its version");
      }
      Properties properties = new Properties();
      properties.load(in);
      return properties.getProperty("version", "unknown");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
