package sillet.sheets.csv;

import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/**
 * Something to be said of a file: why it is refused, or what is unusual in it.
 *
 * @param place where
 * @param message what was read, what was expected and what to do
 */
public record Remark(Place place, Message message) {

  /** The whole sentence, place first. */
  public String said(Texts texts) {
    return texts.say(place.before(texts.say(message)));
  }
}
