package sillet.logbook.text;

import java.text.MessageFormat;
import java.util.List;
import java.util.Locale;
import java.util.ResourceBundle;

/**
 * The one bundle of texts. Figures are handed in as text, so that a number reads the same wherever
 * its sentence is spoken; the bundle holds words only.
 */
public final class Texts {
  private static final String BUNDLE = "sillet.texts";

  private final ResourceBundle bundle;
  private final Locale locale;

  private Texts(Locale locale) {
    this.locale = locale;
    this.bundle =
        ResourceBundle.getBundle(
            BUNDLE,
            locale,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_DEFAULT));
  }

  /**
   * English, the language of files and of the command line.
   *
   * @return the English texts
   */
  public static Texts english() {
    return new Texts(Locale.ROOT);
  }

  /**
   * Says a text.
   *
   * @param key a key of the bundle
   * @param values the values for its places
   * @return the sentence
   * @throws java.util.MissingResourceException if the bundle has no such key
   */
  public String say(String key, String... values) {
    return say(key, List.of(values));
  }

  /**
   * Says a message.
   *
   * @param message the key and its values
   * @return the sentence
   * @throws java.util.MissingResourceException if the bundle has no such key
   */
  public String say(Message message) {
    return say(message.key(), message.values());
  }

  private String say(String key, List<String> values) {
    String pattern = bundle.getString(key);
    return new MessageFormat(pattern, locale).format(values.toArray());
  }
}
