package sillet.desktop.theme;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** A style sheet of the program, read as text. */
final class SheetFile {
  private static final Pattern TOKEN = Pattern.compile("-sillet-([a-z-]+): #([0-9A-Fa-f]{6});");

  private final String text;

  SheetFile(String name) throws IOException {
    try (InputStream file = SheetFile.class.getResourceAsStream("/sillet/desktop/" + name)) {
      text = new String(file.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  String text() {
    return text;
  }

  /** Tokens and their colours as 0xRRGGBB. */
  Map<String, Integer> tokens() {
    Map<String, Integer> tokens = new LinkedHashMap<>();
    Matcher found = TOKEN.matcher(text);
    while (found.find()) {
      tokens.put(found.group(1), Integer.parseInt(found.group(2), 16));
    }
    return tokens;
  }

  /** Contrast of two colours by WCAG 2.2 (W3C), from relative luminance. */
  static double contrast(int one, int other) {
    double a = luminance(one) + 0.05;
    double b = luminance(other) + 0.05;
    return Math.max(a, b) / Math.min(a, b);
  }

  private static double luminance(int colour) {
    return 0.2126 * linear(colour >> 16 & 255)
        + 0.7152 * linear(colour >> 8 & 255)
        + 0.0722 * linear(colour & 255);
  }

  private static double linear(int channel) {
    double share = channel / 255.0;
    return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }
}
