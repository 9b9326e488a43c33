package sillet;

import java.util.Locale;
import java.util.Map;

/** Whether a window can be shown here; asked before the toolkit is, which cannot be asked twice. */
final class Display {
  private Display() {}

  /**
   * Looks around.
   *
   * @param system name of the operating system, as Java gives it
   * @param headless whether Java was told to do without
   * @param environment variables of the process
   */
  static boolean isThere(String system, boolean headless, Map<String, String> environment) {
    String name = system.toLowerCase(Locale.ROOT);
    if (headless) {
      return false;
    }
    boolean drawsByItself = name.startsWith("windows") || name.startsWith("mac");
    // elsewhere the toolkit draws through X, also where another server stands behind it
    return drawsByItself || !environment.getOrDefault("DISPLAY", "").isBlank();
  }
}
