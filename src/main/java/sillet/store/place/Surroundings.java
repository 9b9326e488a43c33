package sillet.store.place;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * What a program finds around it.
 *
 * @param system name of the operating system, as Java gives it
 * @param home folder of the user
 * @param environment variables
 */
public record Surroundings(String system, Path home, Map<String, String> environment) {

  /** Copies the map. */
  public Surroundings {
    environment = Map.copyOf(environment);
  }

  /**
   * Those of this process.
   *
   * @return read once
   */
  public static Surroundings ofThisProcess() {
    return new Surroundings(
        System.getProperty("os.name", ""),
        Path.of(System.getProperty("user.home", "")),
        System.getenv());
  }

  boolean windows() {
    return system.toLowerCase(Locale.ROOT).startsWith("windows");
  }

  boolean mac() {
    return system.toLowerCase(Locale.ROOT).startsWith("mac");
  }

  /** A variable that says something. */
  @Nullable String variable(String name) {
    String value = environment.get(name);
    return value == null || value.isBlank() ? null : value;
  }
}
