package sillet.store.columns;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.CheckMethod;
import sillet.logbook.visits.Moment;
import sillet.logbook.visits.NoteKind;

/**
 * The words one enumeration is stored under, both ways. Never the place in the enumeration and
 * never the name in the code, so that both can change.
 *
 * @param <E> the enumeration
 */
public final class Words<E extends Enum<E>> {
  private static final List<Words<?>> ALL =
      List.of(
          new Words<>(InstrumentKind.class, InstrumentKind::word),
          new Words<>(SaddleKind.class, SaddleKind::word),
          new Words<>(ScrewSense.class, ScrewSense::word),
          new Words<>(NutMovable.class, NutMovable::word),
          new Words<>(LengthUnit.class, LengthUnit::word),
          new Words<>(Construction.class, ConstructionWords::of),
          new Words<>(CheckKind.class, CheckKind::word),
          new Words<>(CheckMethod.class, CheckMethod::word),
          new Words<>(Moment.class, Moment::word),
          new Words<>(NoteKind.class, NoteKind::word),
          new Words<>(Reference.class, reference -> reference.name().toLowerCase(Locale.ROOT)));

  private final Class<E> type;
  private final Function<E, String> word;
  private final Map<String, E> byWord = new HashMap<>();

  private Words(Class<E> type, Function<E, String> word) {
    this.type = type;
    this.word = word;
    for (E one : type.getEnumConstants()) {
      if (byWord.put(word.apply(one), one) != null) {
        throw new IllegalArgumentException(type + " uses a word twice");
      }
    }
  }

  /**
   * Every enumeration that is stored.
   *
   * @return their words
   */
  public static List<Words<?>> all() {
    return ALL;
  }

  /**
   * The words of one enumeration.
   *
   * @param type the enumeration
   * @return its words
   * @throws IllegalArgumentException if it is not one that is stored
   */
  public static <E extends Enum<E>> Words<E> of(Class<E> type) {
    for (Words<?> words : ALL) {
      if (words.type == type) {
        @SuppressWarnings("unchecked") // its type is the one asked for
        Words<E> found = (Words<E>) words;
        return found;
      }
    }
    throw new IllegalArgumentException(type + " has no words to be stored under");
  }

  public Class<E> type() {
    return type;
  }

  public String write(E value) {
    return word.apply(value);
  }

  /**
   * Reads a word.
   *
   * @param text as written
   * @return what it stands for
   * @throws IllegalArgumentException if this program knows no such word
   */
  public E read(String text) {
    E found = byWord.get(text);
    if (found == null) {
      throw new IllegalArgumentException(type.getSimpleName() + " has no word " + text);
    }
    return found;
  }
}
