package org.kappatrail.duty;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Properties;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.UnusableInputException;

/**
 * User and password of a database. They come from the environment, never from the settings, and go
 * into no message: {@link #scrub} takes them out of whatever a driver says.
 */
final class DatabaseLogin {
  private static final String USER = "KAPPATRAIL_DB_USER";
  private static final String PASSWORD = "KAPPATRAIL_DB_PASSWORD";
  private static final String FILE = "KAPPATRAIL_DB_CREDENTIALS";

  private static final Pattern IN_ADDRESS =
      Pattern.compile("(?<=//)[^@\\n]*@|(?<=:)[^/:@\\s]+/[^@\\s]*@");
  private static final Pattern PARAMETERS = Pattern.compile("(jdbc:[^\\s?;]*)[?;]\\S*");

  private final Optional<String> user;
  private final Optional<String> password;

  DatabaseLogin(Optional<String> user, Optional<String> password) {
    this.user = user;
    this.password = password;
  }

  static DatabaseLogin ofEnvironment() {
    return of(System::getenv);
  }

  /**
   * The login that an environment names.
   *
   * @param environment gives a variable's value, or null
   */
  static DatabaseLogin of(Function<String, @Nullable String> environment) {
    String file = environment.apply(FILE);
    if (file == null) {
      return new DatabaseLogin(
          Optional.ofNullable(environment.apply(USER)),
          Optional.ofNullable(environment.apply(PASSWORD)));
    }
    Properties lines = new Properties();
    try (Reader reader = Files.newBufferedReader(Path.of(file))) {
      lines.load(reader);
    } catch (IOException | IllegalArgumentException e) {
      throw new UnusableInputException(
          FILE + ": the file that it names cannot be read; it holds the lines user= and password=",
          e);
    }
    return new DatabaseLogin(
        Optional.ofNullable(lines.getProperty("user")),
        Optional.ofNullable(lines.getProperty("password")));
  }

  /** Properties for a driver. */
  Properties properties() {
    Properties properties = new Properties();
    user.ifPresent(name -> properties.setProperty("user", name));
    password.ifPresent(secret -> properties.setProperty("password", secret));
    return properties;
  }

  /** The text without user, password and the parameters of an address. */
  String scrub(String text) {
    String clean = PARAMETERS.matcher(text).replaceAll("$1");
    clean = IN_ADDRESS.matcher(clean).replaceAll("");
    clean = password.filter(secret -> !secret.isEmpty()).map(without(clean)).orElse(clean);
    return user.filter(name -> !name.isEmpty()).map(without(clean)).orElse(clean);
  }

  private static Function<String, String> without(String text) {
    return secret -> text.replace(secret, "…");
  }
}
