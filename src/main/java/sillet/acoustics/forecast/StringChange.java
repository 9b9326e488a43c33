package sillet.acoustics.forecast;

import java.util.OptionalDouble;
import java.util.TreeMap;
import sillet.acoustics.estimate.StringSituation;
import sillet.acoustics.readings.Reference;

/**
 * What is to change about one string.
 *
 * @param now the string and its pitch as they are
 * @param then as they will be, at the same scale
 * @param actionThen clearance over fret 12 as it will be, m; empty = it stays
 * @param against what fret 12 is to be true to
 */
public record StringChange(
    Stringing now, Stringing then, OptionalDouble actionThen, Reference against) {

  /**
   * Checks the values.
   *
   * @throws IllegalArgumentException if the scale changes or the action is not finite
   */
  public StringChange {
    if (now.scale() != then.scale()) {
      throw new IllegalArgumentException("another scale is another instrument");
    }
    if (!Double.isFinite(actionThen.orElse(0))) {
      throw new IllegalArgumentException("action is " + actionThen);
    }
  }

  /** Whether the piece of string itself stays on. */
  public boolean keepsTheString() {
    return now.spec().equals(then.spec());
  }

  /**
   * The string in its situation then, with saddle and nut where they stand now.
   *
   * @param now most likely situation
   */
  public StringSituation situation(StringSituation now) {
    return new NotesThen(this, new TreeMap<>(), against).then(now);
  }
}
