package sillet.logbook.text;

/**
 * What was typed or asked for cannot be taken; says which rule and what was read, and leaves
 * everything as it was.
 */
public final class Rejection extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Message message;

  /**
   * Refuses with a sentence.
   *
   * @param message why, with what was read
   */
  public Rejection(Message message) {
    super(message.key() + message.values());
    this.message = message;
  }

  /**
   * Refuses with a key and its values.
   *
   * @param key a key of the text bundle
   * @param values the values in the order of the bundle's places
   * @return the refusal, to be thrown
   */
  public static Rejection of(String key, String... values) {
    return new Rejection(Message.of(key, values));
  }

  /**
   * The sentence to show.
   *
   * @return why, with what was read
   */
  public Message reason() {
    return message;
  }
}
