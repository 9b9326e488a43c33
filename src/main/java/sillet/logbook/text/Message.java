package sillet.logbook.text;

import java.util.List;

/**
 * A sentence before it is spoken: a text key and the values that belong into it. Problems and notes
 * travel as messages, so that the same one reads well in a window, on a terminal and in a test.
 *
 * @param key a key of the text bundle
 * @param values what the sentence names, already written as text, in the order of the bundle's
 *     places
 */
public record Message(String key, List<String> values) {

  /** Copies the values, so that a message never changes. */
  public Message {
    values = List.copyOf(values);
  }

  /**
   * Makes a message.
   *
   * @param key a key of the text bundle
   * @param values the values in the order of the bundle's places
   * @return the message
   */
  public static Message of(String key, String... values) {
    return new Message(key, List.of(values));
  }
}
