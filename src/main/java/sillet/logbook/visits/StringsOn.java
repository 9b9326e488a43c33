package sillet.logbook.visits;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.strings.FittedString;

/**
 * The strings that are on the instrument during a visit.
 *
 * @param setName the set's name at that time, may be empty
 * @param fittedOn day the set went on, null if not known
 * @param tuningName the tuning's name at that time, may be empty
 * @param referenceHz what A4 is, hertz
 * @param strings the strings, string 1 first
 */
public record StringsOn(
    String setName,
    @Nullable LocalDate fittedOn,
    String tuningName,
    double referenceHz,
    List<FittedString> strings) {

  /** Copies the strings. */
  public StringsOn {
    strings = List.copyOf(strings);
  }
}
